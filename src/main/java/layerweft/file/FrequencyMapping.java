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
            Kind.of("poisson", Variant.of(number("mean"), Poisson::new)),
            Kind.of("negativeBinomial", Variant.of(number("mean"), number("varianceToMean"), NegativeBinomial::new)),
            Kind.of("binomial", Variant.of(required("trials", Scalars.INTEGER), number("chance"), Binomial::new)),
            Kind.of("empirical", Variant.of(required("probabilities", Lists.of(Scalars.NUMBER, Limits.LOSSES)), EmpiricalCounts::new))));

    private FrequencyMapping() {}
}
