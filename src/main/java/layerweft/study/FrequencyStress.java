package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.EmpiricalCounts;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;

/** More events of the same kind. */
final class FrequencyStress {

    private FrequencyStress() {}

    /**
     * The model with its mean times a factor: Poisson by its mean; negative binomial by its mean at the same variance to mean; binomial by
     * the chance of each trial; a table of counts by scaling the chance of a year with events, whose counts stay as they are.
     *
     * @return empty where the kind does not admit it, because a chance would exceed 1
     */
    static Optional<FrequencyModel> meanTimes(FrequencyModel model, double factor) {
        if (model instanceof Poisson poisson) {
            return Optional.of(new Poisson(poisson.mean() * factor));
        }
        if (model instanceof NegativeBinomial negative) {
            return Optional.of(new NegativeBinomial(negative.mean() * factor, negative.varianceToMean()));
        }
        if (model instanceof Binomial binomial) {
            return binomial.chance() * factor <= 1 ? Optional.of(new Binomial(binomial.trials(), binomial.chance() * factor)) : Optional.empty();
        }
        return meanTimes((EmpiricalCounts) model, factor);
    }

    private static Optional<FrequencyModel> meanTimes(EmpiricalCounts table, double factor) {
        double without = 1 - factor * table.survival(0);
        if (without < 0) {
            return Optional.empty();
        }
        List<Double> probabilities = new ArrayList<>(List.of(without));
        for (int n = 1; n <= table.largest(); n++) {
            probabilities.add(factor * table.probability(n));
        }
        return Optional.of(new EmpiricalCounts(probabilities));
    }
}
