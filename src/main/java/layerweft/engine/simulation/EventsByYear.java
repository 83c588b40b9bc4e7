package layerweft.engine.simulation;

/** Where the events of each year of a block stand in the perils' workspaces. */
final class EventsByYear {
    private final int[][] first;
    private final int[][] source;

    EventsByYear(PerilYears[] work, int years) {
        first = new int[work.length][years + 1];
        source = new int[work.length][];
        for (int i = 0; i < work.length; i++) {
            for (int y = 0; y < years; y++) {
                first[i][y + 1] = first[i][y] + work[i].counts[y];
            }
            if (work[i].target != null) {
                source[i] = new int[years];
                for (int y = 0; y < years; y++) {
                    source[i][work[i].target[y]] = y;
                }
            }
        }
    }

    /** The drawn year of peril i that stands in year y of the block. */
    int source(int i, int y) {
        return source[i] == null ? y : source[i][y];
    }

    /** Position of the first event of a drawn year of peril i. */
    int first(int i, int drawnYear) {
        return first[i][drawnYear];
    }

    /** Events of all perils in year y of the block. */
    int ofYear(int y) {
        int n = 0;
        for (int i = 0; i < first.length; i++) {
            int s = source(i, y);
            n += first[i][s + 1] - first[i][s];
        }
        return n;
    }
}
