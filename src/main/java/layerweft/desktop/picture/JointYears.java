package layerweft.desktop.picture;

import layerweft.model.Check;
import layerweft.model.copula.Copula;
import layerweft.model.copula.ScoreSampler;
import layerweft.model.random.KeyedStream;

/**
 * Simulated years of two perils, each year by how bad it is for the peril.
 *
 * @param first name of the peril across
 * @param second name of the peril upward
 * @param u part of all years that are better for the first peril, in (0, 1), by year
 * @param v the same for the second
 */
public record JointYears(String first, String second, double[] u, double[] v) {

    public JointYears {
        new Check().that(u.length == v.length, "v", v.length + " years", "as many as u, " + u.length).orThrow();
    }

    /**
     * Years drawn from a copula; the same seed gives the same years, and as far as the copula draws alike, similar ones at another strength.
     *
     * @param pair of two variables
     */
    public static JointYears drawn(String first, String second, Copula pair, int years, long seed) {
        ScoreSampler sampler = pair.sampler(2);
        double[][] scores = new double[2][years];
        sampler.draw(new KeyedStream(seed), 0, years, scores);
        for (int i = 0; i < 2; i++) {
            for (int y = 0; y < years; y++) {
                scores[i][y] = sampler.uniform(i, scores[i][y]);
            }
        }
        return new JointYears(first, second, scores[0], scores[1]);
    }

    /** Years that are at least as bad as 1 in so many for both. */
    public int bothBeyond(double years) {
        double level = 1 - 1 / years;
        int count = 0;
        for (int k = 0; k < u.length; k++) {
            count += u[k] >= level && v[k] >= level ? 1 : 0;
        }
        return count;
    }
}
