package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Burr;
import layerweft.model.severity.Capped;
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
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The same losses with a heavier tail: the parameter that governs the tail is moved by a factor, and the mean held where it is finite before
 * and after (elsewhere the other parameters stay).
 *
 * <table>
 * <caption>What is moved, and what holds the mean</caption>
 * <tr><td>lognormal</td><td>σ·f</td><td>μ</td></tr>
 * <tr><td>pareto</td><td>α/f</td><td>threshold</td></tr>
 * <tr><td>generalizedPareto</td><td>ξ + (f − 1)·|ξ|</td><td>scale; none at ξ = 0, which is exponential</td></tr>
 * <tr><td>gamma</td><td>coefficient of variation·f</td><td>scale</td></tr>
 * <tr><td>weibull, loglogistic</td><td>shape/f</td><td>scale</td></tr>
 * <tr><td>burr</td><td>α/f</td><td>θ</td></tr>
 * <tr><td>inverseGaussian</td><td>coefficient of variation·f</td><td>nothing has to</td></tr>
 * <tr><td>beta</td><td>coefficient of variation·f</td><td>a/(a + b); the exposed value stays</td></tr>
 * <tr><td>mbbefd</td><td>chance of a total loss 1/g·f</td><td>b; the exposed value stays</td></tr>
 * <tr><td>exponential, discrete, empirical</td><td colspan="2">have no tail parameter</td></tr>
 * </table>
 *
 * <p>A cap stays where it is, and the mean held is that of the law before the cap. Of a spliced law the tail is changed, its weight and the
 * body are not. Of a mixture every component that has a tail parameter is changed.
 */
final class TailStress {
    private static final double WIDEST_LN_B = 60;

    private TailStress() {}

    /**
     * The law with a heavier tail.
     *
     * @param factor f, above 1 for heavier
     * @return empty where the law has no tail parameter or cannot be heavier at the same mean
     */
    static Optional<SeverityModel> heavier(SeverityModel model, double factor) {
        if (model instanceof Capped m) {
            return heavier(m.model(), factor).map(changed -> new Capped(changed, m.cap()));
        }
        if (model instanceof Spliced m) {
            return heavier(m.tail(), factor).map(changed -> new Spliced(m.body(), m.threshold(), changed, m.tailWeight()));
        }
        if (model instanceof Mixture m) {
            List<SeverityModel> components = new ArrayList<>();
            m.components().forEach(c -> components.add(heavier(c, factor).orElse(c)));
            return components.equals(m.components()) ? Optional.empty() : Optional.of(new Mixture(m.weights(), components));
        }
        if (model instanceof GeneralizedPareto m) {
            return heavier(m, factor);
        }
        if (model instanceof Beta m) {
            double sum = (m.a() + m.b() + 1) / (factor * factor) - 1;
            double part = m.a() / (m.a() + m.b());
            return sum > 0 ? Optional.of(new Beta(part * sum, (1 - part) * sum, m.exposedValue())) : Optional.empty();
        }
        if (model instanceof Mbbefd m) {
            return heavier(m, factor);
        }
        return Optional.ofNullable(reshaped(model, factor)).map(changed -> atMean(changed, model.mean()));
    }

    /** With the shape changed and the mean not yet held; null for laws without a tail parameter. */
    private static SeverityModel reshaped(SeverityModel model, double factor) {
        if (model instanceof Lognormal m) {
            return new Lognormal(m.mu(), m.sigma() * factor);
        }
        if (model instanceof Pareto m) {
            return new Pareto(m.threshold(), m.alpha() / factor);
        }
        if (model instanceof Gamma m) {
            return new Gamma(m.shape() / (factor * factor), m.scale());
        }
        if (model instanceof Weibull m) {
            return new Weibull(m.shape() / factor, m.scale());
        }
        if (model instanceof Burr m) {
            return new Burr(m.alpha() / factor, m.gamma(), m.theta());
        }
        if (model instanceof Loglogistic m) {
            return new Loglogistic(m.shape() / factor, m.scale());
        }
        return model instanceof InverseGaussian m ? new InverseGaussian(m.mean(), m.shape() / (factor * factor)) : null;
    }

    private static SeverityModel atMean(SeverityModel changed, double mean) {
        boolean finite = mean < Double.POSITIVE_INFINITY && changed.mean() < Double.POSITIVE_INFINITY;
        return finite ? SeverityScale.scaled(changed, mean / changed.mean()) : changed;
    }

    /** E[X] = u + σ/(1 − ξ) for ξ below 1: the smallest loss u stays. */
    private static Optional<SeverityModel> heavier(GeneralizedPareto m, double factor) {
        double shape = m.shape() + (factor - 1) * Math.abs(m.shape());
        double scale = m.shape() < 1 && shape < 1 ? m.scale() * (1 - shape) / (1 - m.shape()) : m.scale();
        return m.shape() == 0 ? Optional.empty() : Optional.of(new GeneralizedPareto(m.threshold(), scale, shape));
    }

    private static Optional<SeverityModel> heavier(Mbbefd m, double factor) {
        double g = m.g() / factor;
        if (g < 1) {
            return Optional.empty();
        }
        DoubleFunction<Mbbefd> law = lnB -> new Mbbefd(Math.exp(lnB), g, m.exposedValue());
        double lowest = law.apply(WIDEST_LN_B).mean();
        double highest = law.apply(-WIDEST_LN_B).mean();
        if (!(lowest < m.mean() && m.mean() < highest)) {
            return Optional.empty();
        }
        double lnB = new BrentSolver(1e-14, 1e-13).solve(200, x -> law.apply(x).mean() - m.mean(), -WIDEST_LN_B, WIDEST_LN_B);
        return Optional.of(law.apply(lnB));
    }
}
