package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * The threads of a tower: one for each peril, or the largest five and one for the others where there are too many. A tower of one peril has none.
 *
 * @param threads from left to right
 */
record TowerThreads(List<Strand> threads) {
    /** Up to so many perils have a thread each in any picture. */
    static final int MANY = 6;
    /** Up to so many have one each, close together under slanting names, where the picture is wide. */
    static final int MOST = 8;
    private static final double WIDE = 840;
    private static final int LARGEST = 5;
    /** The grey of the eight categories. */
    private static final int GREY = 7;

    /**
     * One thread.
     *
     * @param colour position in the palette
     * @param perils positions in the portfolio
     */
    record Strand(String name, int colour, List<Integer> perils) {

        /** Share of the layer's expected loss, NaN where nothing of the thread is covered. */
        double share(Tower.Layer layer) {
            return perils.stream().filter(layer::covers).mapToDouble(layer.shares()::get).reduce(Double::sum).orElse(Double.NaN);
        }
    }

    static TowerThreads of(Tower tower, double width) {
        int n = tower.perils().size();
        if (n <= 1) {
            return new TowerThreads(List.of());
        }
        List<Integer> all = IntStream.range(0, n).boxed().toList();
        if (n <= MANY || n <= MOST && width >= WIDE) {
            return new TowerThreads(all.stream().map(i -> new Strand(tower.perils().get(i), i, List.of(i))).toList());
        }
        List<Integer> byLoss = all.stream().sorted(Comparator.comparingDouble((Integer i) -> -loss(tower, i))).toList();
        List<Integer> largest = byLoss.subList(0, LARGEST).stream().sorted().toList();
        List<Strand> threads = new ArrayList<>();
        Set<Integer> taken = new HashSet<>();
        for (int i : largest) {
            int colour = i % GREY;
            while (!taken.add(colour)) {
                colour = (colour + 1) % GREY;
            }
            threads.add(new Strand(tower.perils().get(i), colour, List.of(i)));
        }
        threads.add(new Strand("others", GREY, all.stream().filter(i -> !largest.contains(i)).toList()));
        return new TowerThreads(threads);
    }

    /** What the peril costs the layers in a year, as far as known. */
    private static double loss(Tower tower, int peril) {
        double loss = 0;
        for (Tower.Layer layer : tower.layers()) {
            double part = layer.covers(peril) ? layer.shares().get(peril) * layer.lossOnLine() * layer.limit() : 0;
            loss += Double.isFinite(part) ? part : 0;
        }
        return loss;
    }

    int size() {
        return threads.size();
    }

    boolean slanting() {
        return threads.size() > MANY;
    }

    double apart() {
        return threads.size() <= 4 ? 46 : slanting() ? 30 : 38;
    }

    double width() {
        return threads.isEmpty() ? 0 : threads.size() * apart() + 4;
    }
}
