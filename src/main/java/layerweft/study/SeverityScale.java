package layerweft.study;

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

/** The same losses in a dearer currency. */
final class SeverityScale {

    private SeverityScale() {}

    /** The law of factor·X: every amount is multiplied, thresholds, exposed values and caps too. */
    static SeverityModel scaled(SeverityModel model, double factor) {
        if (model instanceof Capped m) {
            return new Capped(scaled(m.model(), factor), m.cap() * factor);
        }
        if (model instanceof Spliced m) {
            return new Spliced(scaled(m.body(), factor), m.threshold() * factor, scaled(m.tail(), factor), m.tailWeight());
        }
        if (model instanceof Mixture m) {
            return new Mixture(m.weights(), m.components().stream().map(c -> scaled(c, factor)).toList());
        }
        if (model instanceof DiscreteLosses m) {
            return new DiscreteLosses(m.losses().stream().map(x -> x * factor).toList(), m.probabilities());
        }
        return scaledLaw(model, factor);
    }

    private static SeverityModel scaledLaw(SeverityModel model, double factor) {
        if (model instanceof Lognormal m) {
            return new Lognormal(m.mu() + Math.log(factor), m.sigma());
        }
        if (model instanceof Pareto m) {
            return new Pareto(m.threshold() * factor, m.alpha());
        }
        if (model instanceof GeneralizedPareto m) {
            return new GeneralizedPareto(m.threshold() * factor, m.scale() * factor, m.shape());
        }
        if (model instanceof Gamma m) {
            return new Gamma(m.shape(), m.scale() * factor);
        }
        if (model instanceof Weibull m) {
            return new Weibull(m.shape(), m.scale() * factor);
        }
        if (model instanceof Burr m) {
            return new Burr(m.alpha(), m.gamma(), m.theta() * factor);
        }
        if (model instanceof Loglogistic m) {
            return new Loglogistic(m.shape(), m.scale() * factor);
        }
        if (model instanceof InverseGaussian m) {
            return new InverseGaussian(m.mean() * factor, m.shape() * factor);
        }
        if (model instanceof Beta m) {
            return new Beta(m.a(), m.b(), m.exposedValue() * factor);
        }
        if (model instanceof Mbbefd m) {
            return new Mbbefd(m.b(), m.g(), m.exposedValue() * factor);
        }
        return new Exponential(((Exponential) model).mean() * factor);
    }
}
