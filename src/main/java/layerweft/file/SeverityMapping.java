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
    private static final TwoWay<List<Double>> NUMBERS = Lists.of(Scalars.NUMBER, Limits.LOSSES);

    static final Tagged<SeverityModel> SEVERITY = Tagged.of("severity", "model", List.of(
            Kind.of("lognormal", "Lognormal", Lognormal.class,
                    Variant.of(number("mu").of(Lognormal::mu), number("sigma").of(Lognormal::sigma), Lognormal::new),
                    Variant.of(number("mean").of(Lognormal::mean), number("cv").of(SeverityMapping::cv), Lognormal::ofMeanAndCv)),
            Kind.of("pareto", "Pareto", Pareto.class,
                    Variant.of(number("threshold").of(Pareto::threshold), number("alpha").of(Pareto::alpha), Pareto::new)),
            Kind.of("generalizedPareto", "Generalised Pareto", GeneralizedPareto.class,
                    Variant.of(number("threshold").of(GeneralizedPareto::threshold), number("scale").of(GeneralizedPareto::scale),
                            number("shape").of(GeneralizedPareto::shape), GeneralizedPareto::new)),
            Kind.of("gamma", "Gamma", Gamma.class,
                    Variant.of(number("shape").of(Gamma::shape), number("scale").of(Gamma::scale), Gamma::new),
                    Variant.of(number("mean").of(Gamma::mean), number("cv").of(SeverityMapping::cv), Gamma::ofMeanAndCv)),
            Kind.of("weibull", "Weibull", Weibull.class,
                    Variant.of(number("shape").of(Weibull::shape), number("scale").of(Weibull::scale), Weibull::new)),
            Kind.of("burr", "Burr", Burr.class,
                    Variant.of(number("alpha").of(Burr::alpha), number("gamma").of(Burr::gamma), number("theta").of(Burr::theta), Burr::new)),
            Kind.of("loglogistic", "Loglogistic", Loglogistic.class,
                    Variant.of(number("shape").of(Loglogistic::shape), number("scale").of(Loglogistic::scale), Loglogistic::new)),
            Kind.of("exponential", "Exponential", Exponential.class, Variant.of(number("mean").of(Exponential::mean), Exponential::new)),
            Kind.of("inverseGaussian", "Inverse Gaussian", InverseGaussian.class,
                    Variant.of(number("mean").of(InverseGaussian::mean), number("shape").of(InverseGaussian::shape), InverseGaussian::new)),
            Kind.of("beta", "Beta", Beta.class,
                    Variant.of(number("a").of(Beta::a), number("b").of(Beta::b), number("exposedValue").of(Beta::exposedValue), Beta::new)),
            Kind.of("mbbefd", "MBBEFD exposure curve", Mbbefd.class,
                    Variant.of(number("c").of(SeverityMapping::c), number("exposedValue").of(Mbbefd::exposedValue), Mbbefd::ofC),
                    Variant.of(number("b").of(Mbbefd::b), number("g").of(Mbbefd::g), number("exposedValue").of(Mbbefd::exposedValue), Mbbefd::new)),
            Kind.of("discrete", "Discrete losses", DiscreteLosses.class,
                    Variant.of(required("losses", NUMBERS).of(DiscreteLosses::losses),
                            required("probabilities", NUMBERS).of(DiscreteLosses::probabilities), DiscreteLosses::new)),
            Kind.of("empirical", "Losses equally likely", DiscreteLosses.class,
                    Variant.of(required("losses", NUMBERS).of(DiscreteLosses::losses), DiscreteLosses::ofEquallyLikely)),
            Kind.of("spliced", "Body and tail", Spliced.class,
                    Variant.of(part("body").of(Spliced::body), number("threshold").of(Spliced::threshold), part("tail").of(Spliced::tail),
                            number("tailWeight").of(Spliced::tailWeight), Spliced::new)),
            Kind.of("mixture", "Mixture", Mixture.class,
                    Variant.of(required("weights", NUMBERS).of(Mixture::weights),
                            required("components", Lists.of(part(), Limits.LIST)).of(Mixture::components), Mixture::new))),
            kind -> kind.with(number("cap", null), (model, cap) -> cap == null ? model : new Capped(model, cap), SeverityMapping::uncapped,
                    SeverityMapping::cap));

    private SeverityMapping() {}

    /** A severity inside another: the table is not complete yet when its lines are written. */
    private static TwoWay<SeverityModel> part() {
        return TwoWay.of(FieldType.SEVERITY, (node, path, faults) -> SEVERITY.read(node, path, faults), model -> SEVERITY.write(model));
    }

    private static Field<SeverityModel> part(String name) {
        return required(name, part());
    }

    /** The model below its caps. */
    static SeverityModel uncapped(SeverityModel model) {
        return model instanceof Capped capped ? uncapped(capped.model()) : model;
    }

    /** The least cap, null where there is none. */
    static Double cap(SeverityModel model) {
        Double inner = model instanceof Capped capped ? cap(capped.model()) : null;
        return model instanceof Capped capped ? (Double) Math.min(capped.cap(), inner == null ? capped.cap() : inner) : null;
    }

    /** σ = √ln(1 + cv²). */
    private static double cv(Lognormal model) {
        return Math.sqrt(Math.expm1(model.sigma() * model.sigma()));
    }

    private static double cv(Gamma model) {
        return 1 / Math.sqrt(model.shape());
    }

    /** The c of Bernegger's subclass with the same chance of a total loss: ln g = (0.78 + 0.12·c)·c. */
    private static double c(Mbbefd model) {
        return (Math.sqrt(0.78 * 0.78 + 4 * 0.12 * Math.log(model.g())) - 0.78) / (2 * 0.12);
    }
}
