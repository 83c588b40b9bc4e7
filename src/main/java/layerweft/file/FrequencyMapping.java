package layerweft.file;

import static layerweft.file.Field.number;
import static layerweft.file.Field.required;

import java.util.List;
import layerweft.file.Tagged.Kind;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.EmpiricalCounts;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;

/** The kinds of frequency models in a portfolio file, one line each. */
final class FrequencyMapping {
    static final Tagged<FrequencyModel> FREQUENCY = Tagged.of("frequency", "model", List.of(
            Kind.of("poisson", "Poisson", Poisson.class, Variant.of(number("mean").of(Poisson::mean), Poisson::new)),
            Kind.of("negativeBinomial", "Negative binomial", NegativeBinomial.class,
                    Variant.of(number("mean").of(NegativeBinomial::mean), number("varianceToMean").of(NegativeBinomial::varianceToMean), NegativeBinomial::new)),
            Kind.of("binomial", "Binomial", Binomial.class,
                    Variant.of(required("trials", Scalars.INTEGER).of(Binomial::trials), number("chance").of(Binomial::chance), Binomial::new)),
            Kind.of("empirical", "Empirical", EmpiricalCounts.class,
                    Variant.of(required("probabilities", Lists.of(Scalars.NUMBER, Limits.LOSSES)).of(EmpiricalCounts::probabilities), EmpiricalCounts::new))));

    private FrequencyMapping() {}
}
