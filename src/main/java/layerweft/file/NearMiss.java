package layerweft.file;

import java.util.Collection;
import java.util.Locale;

/** What a misspelt name may have been meant for. */
final class NearMiss {
    private static final int LONGEST = 40;

    private NearMiss() {}

    /** The nearest of the names, by insertions, deletions, changes and swaps of letters; null if none is near. */
    static String of(String name, Collection<String> names) {
        String nearest = null;
        int least = Integer.MAX_VALUE;
        for (String candidate : names) {
            int distance = name.length() > LONGEST ? Integer.MAX_VALUE
                    : distance(name.toLowerCase(Locale.ROOT), candidate.toLowerCase(Locale.ROOT));
            boolean near = distance <= Math.max(1, (candidate.length() + 1) / 3) && distance < candidate.length();
            if (near && distance < least) {
                nearest = candidate;
                least = distance;
            }
        }
        return nearest;
    }

    /** Optimal string alignment distance (Damerau 1964, Levenshtein 1966). */
    private static int distance(String a, String b) {
        int[][] d = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    d[i][j] = i + j;
                    continue;
                }
                int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
                d[i][j] = Math.min(d[i - 1][j - 1] + change, Math.min(d[i - 1][j], d[i][j - 1]) + 1);
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    d[i][j] = Math.min(d[i][j], d[i - 2][j - 2] + 1);
                }
            }
        }
        return d[a.length()][b.length()];
    }
}
