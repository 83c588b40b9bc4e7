package layerweft.file;

import static layerweft.file.Field.number;
import static layerweft.file.Field.required;

import java.util.List;
import layerweft.file.Tagged.Kind;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Burr;
import layerweft.model.severity.Capped;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Gamma;
import layerweft.model.severity.GeneralizedPareto;
import layerweft.model.severity.InverseGaussian;
import layerweft.model.severity.Loglogistic;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Mbbefd;
import layerweft.model.severity.Mixture;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.severity.Spliced;
import layerweft.model.severity.Weibull;

/** The kinds of severity models in a portfolio file, one line each. Any of them may carry a cap, parts of others too. */
final class SeverityMapping {
    private static final Reading<List<Double>> NUMBERS = Lists.of(Scalars.NUMBER, Limits.LOSSES);

    static final Tagged<SeverityModel> SEVERITY = Tagged.of("severity", "model", List.of(
            Kind.of("lognormal", Variant.of(number("mu"), number("sigma"), Lognormal::new),
                    Variant.of(number("mean"), number("cv"), Lognormal::ofMeanAndCv)),
            Kind.of("pareto", Variant.of(number("threshold"), number("alpha"), Pareto::new)),
            Kind.of("generalizedPareto", Variant.of(number("threshold"), number("scale"), number("shape"), GeneralizedPareto::new)),
            Kind.of("gamma", Variant.of(number("shape"), number("scale"), Gamma::new),
                    Variant.of(number("mean"), number("cv"), Gamma::ofMeanAndCv)),
            Kind.of("weibull", Variant.of(number("shape"), number("scale"), Weibull::new)),
            Kind.of("burr", Variant.of(number("alpha"), number("gamma"), number("theta"), Burr::new)),
            Kind.of("loglogistic", Variant.of(number("shape"), number("scale"), Loglogistic::new)),
            Kind.of("exponential", Variant.of(number("mean"), Exponential::new)),
            Kind.of("inverseGaussian", Variant.of(number("mean"), number("shape"), InverseGaussian::new)),
            Kind.of("beta", Variant.of(number("a"), number("b"), number("exposedValue"), Beta::new)),
            Kind.of("mbbefd", Variant.of(number("c"), number("exposedValue"), Mbbefd::ofC),
                    Variant.of(number("b"), number("g"), number("exposedValue"), Mbbefd::new)),
            Kind.of("discrete", Variant.of(required("losses", NUMBERS), required("probabilities", NUMBERS), DiscreteLosses::new)),
            Kind.of("empirical", Variant.of(required("losses", NUMBERS), DiscreteLosses::ofEquallyLikely)),
            Kind.of("spliced", Variant.of(part("body"), number("threshold"), part("tail"), number("tailWeight"), Spliced::new)),
            Kind.of("mixture", Variant.of(required("weights", NUMBERS), required("components", Lists.of(part(), Limits.LIST)), Mixture::new))),
            kind -> kind.with(number("cap", null), (model, cap) -> cap == null ? model : new Capped(model, cap)));

    private SeverityMapping() {}

    /** A severity inside another: the table is not complete yet when its lines are written. */
    private static Reading<SeverityModel> part() {
        return (node, path, faults) -> SEVERITY.read(node, path, faults);
    }

    private static Field<SeverityModel> part(String name) {
        return required(name, part());
    }
}
