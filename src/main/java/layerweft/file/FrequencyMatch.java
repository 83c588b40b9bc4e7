package layerweft.file;

import java.util.ArrayList;
import java.util.List;
import layerweft.file.KindTable.Match;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.EmpiricalCounts;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;

/** Counts of another kind with the same mean and, where the kind can have it, the same variance. */
final class FrequencyMatch {
    /** Where the variance is not above the mean and something above 1 is needed. */
    private static final double USUAL_RATIO = 1.2;
    /** Chances a year where the variance does not say how many. */
    private static final int FEWEST_TRIALS = 10;
    /** Counts above this are not listed one by one. */
    private static final int LONGEST_LIST = 2_000;
    private static final double UNLISTED = 1e-10;

    private FrequencyMatch() {}

    static Match<FrequencyModel> to(FrequencyModel from, String kind) {
        double mean = from.mean();
        double ratio = from.variance() / mean;
        FrequencyModel model = switch (kind) {
            case "negativeBinomial" -> new NegativeBinomial(mean, ratio > 1 + 1e-9 ? Shown.tidy(ratio) : USUAL_RATIO);
            case "binomial" -> binomial(mean, ratio);
            case "empirical" -> listed(from);
            default -> new Poisson(mean);
        };
        return new Match<>(model, Shown.kept("mean", mean, model.mean()) + " " + Shown.kept("variance", from.variance(), model.variance()));
    }

    /** Variance over mean is 1 less the chance; the number of chances is whole, so only the mean is kept to the last digit. */
    private static FrequencyModel binomial(double mean, double ratio) {
        double trials = ratio < 1 ? Math.rint(mean / (1 - ratio)) : Math.ceil(4 * mean);
        int whole = (int) Math.min(FrequencyModel.MOST_EVENTS, Math.max(trials, ratio < 1 ? Math.ceil(mean) : FEWEST_TRIALS));
        return new Binomial(whole, Math.min(1, mean / whole));
    }

    /** Its own probabilities as a list; what is too rare to list, or too many, is taken for the last count. */
    private static FrequencyModel listed(FrequencyModel from) {
        int last = Math.min(LONGEST_LIST, from.quantile(1 - UNLISTED));
        List<Double> probabilities = new ArrayList<>();
        for (int n = 0; n < last; n++) {
            probabilities.add(from.probability(n));
        }
        probabilities.add(from.survival(last - 1));
        return new EmpiricalCounts(probabilities);
    }
}
