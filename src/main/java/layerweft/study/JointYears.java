package layerweft.study;

import layerweft.model.copula.Copula;
import layerweft.model.copula.ScoreSampler;
import layerweft.model.random.KeyedStream;

/**
 * Drawn years of two perils as chances: how likely a year at least as bad is for each peril by itself.
 *
 * @param first 1 − U of the first peril, by year
 * @param second of the second
 */
public record JointYears(double[] first, double[] second) {

    /** Years drawn under a copula of two variables; the same seed gives the same years. */
    public static JointYears of(Copula pair, int years, long seed) {
        ScoreSampler sampler = pair.sampler(2);
        double[][] scores = new double[2][years];
        sampler.draw(new KeyedStream(seed), 0, years, scores);
        double[] first = new double[years];
        double[] second = new double[years];
        for (int y = 0; y < years; y++) {
            first[y] = sampler.complement(0, scores[0][y]);
            second[y] = sampler.complement(1, scores[1][y]);
        }
        return new JointYears(first, second);
    }

    /** Years in which both are at least as bad as their own 1-in-so-many year. */
    public int bothBeyond(double returnPeriod) {
        int count = 0;
        for (int y = 0; y < first.length; y++) {
            count += first[y] <= 1 / returnPeriod && second[y] <= 1 / returnPeriod ? 1 : 0;
        }
        return count;
    }
}
