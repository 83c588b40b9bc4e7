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
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.analysis.solvers.UnivariateSolverUtils;

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
 * <p>A cap stays where it is, and for the laws of the upper rows down to inverseGaussian the mean held is that of the capped loss. Of a
 * spliced law the tail's law is changed, its weight and the body are not, so that the mean moves. Of a mixture every component that has a
 * tail parameter is changed.
 */
final class TailStress {
    private static final double WIDEST = 60;
    private static final int MOST_STEPS = 300;

    private TailStress() {}

    /**
     * The law with a heavier tail.
     *
     * @param factor f, above 1 for heavier
     * @return empty where the law has no tail parameter or cannot be heavier at the same mean
     */
    static Optional<SeverityModel> heavier(SeverityModel model, double factor) {
        if (model instanceof Capped m) {
            return heavierBelowCap(m, factor);
        }
        if (model instanceof Spliced m) {
            return heavier(m.tail(), factor).map(changed -> new Spliced(m.body(), m.threshold(), changed, m.tailWeight()));
        }
        if (model instanceof Mixture m) {
            List<SeverityModel> components = new ArrayList<>();
            m.components().forEach(c -> components.add(heavier(c, factor).orElse(c)));
            return components.equals(m.components()) ? Optional.empty() : Optional.of(new Mixture(m.weights(), components));
        }
        if (model instanceof Beta m) {
            double sum = (m.a() + m.b() + 1) / (factor * factor) - 1;
            double part = m.a() / (m.a() + m.b());
            return sum > 0 ? Optional.of(new Beta(part * sum, (1 - part) * sum, m.exposedValue())) : Optional.empty();
        }
        if (model instanceof Mbbefd m) {
            return heavier(m, factor);
        }
        return reshaped(model, factor).map(changed -> atMean(changed, model.mean(), Double.POSITIVE_INFINITY));
    }

    /** The mean of the capped loss is held, which is finite whatever the tail. */
    private static Optional<SeverityModel> heavierBelowCap(Capped m, double factor) {
        return reshaped(m.model(), factor).map(changed -> atMean(changed, m.mean(), m.cap())).or(() -> heavier(m.model(), factor))
                .map(changed -> new Capped(changed, m.cap()));
    }

    /** With the shape changed and the mean not yet held; empty for laws without a tail parameter and for those that hold theirs otherwise. */
    private static Optional<SeverityModel> reshaped(SeverityModel model, double factor) {
        if (model instanceof Lognormal m) {
            return Optional.of(new Lognormal(m.mu(), m.sigma() * factor));
        }
        if (model instanceof Pareto m) {
            return Optional.of(new Pareto(m.threshold(), m.alpha() / factor));
        }
        if (model instanceof GeneralizedPareto m) {
            double shape = m.shape() + (factor - 1) * Math.abs(m.shape());
            return m.shape() == 0 ? Optional.empty() : Optional.of(new GeneralizedPareto(m.threshold(), m.scale(), shape));
        }
        if (model instanceof Gamma m) {
            return Optional.of(new Gamma(m.shape() / (factor * factor), m.scale()));
        }
        if (model instanceof Weibull m) {
            return Optional.of(new Weibull(m.shape() / factor, m.scale()));
        }
        if (model instanceof Burr m) {
            return Optional.of(new Burr(m.alpha() / factor, m.gamma(), m.theta()));
        }
        if (model instanceof Loglogistic m) {
            return Optional.of(new Loglogistic(m.shape() / factor, m.scale()));
        }
        return model instanceof InverseGaussian m ? Optional.of(new InverseGaussian(m.mean(), m.shape() / (factor * factor))) : Optional.empty();
    }

    /** The law stretched until E[min(X, cap)] is as wanted; as it is where a mean is infinite. */
    private static SeverityModel atMean(SeverityModel changed, double mean, double cap) {
        if (mean == Double.POSITIVE_INFINITY || changed.limitedMean(cap) == Double.POSITIVE_INFINITY) {
            return changed;
        }
        UnivariateFunction excess = lnFactor -> stretched(changed, Math.exp(lnFactor)).limitedMean(cap) / mean - 1;
        if (excess.value(0) == 0) {
            return changed;
        }
        double[] ends = UnivariateSolverUtils.bracket(excess, 0, -WIDEST, WIDEST);
        return stretched(changed, Math.exp(new BrentSolver(1e-14, 1e-14).solve(MOST_STEPS, excess, ends[0], ends[1])));
    }

    /** All amounts times a factor, but for the smallest loss of a generalized Pareto law, which is a reporting threshold more than a size. */
    private static SeverityModel stretched(SeverityModel model, double factor) {
        return model instanceof GeneralizedPareto m ? new GeneralizedPareto(m.threshold(), m.scale() * factor, m.shape())
                : SeverityScale.scaled(model, factor);
    }

    private static Optional<SeverityModel> heavier(Mbbefd m, double factor) {
        double g = m.g() / factor;
        if (g < 1) {
            return Optional.empty();
        }
        DoubleFunction<Mbbefd> law = lnB -> new Mbbefd(Math.exp(lnB), g, m.exposedValue());
        double lowest = law.apply(WIDEST).mean();
        double highest = law.apply(-WIDEST).mean();
        if (!(lowest < m.mean() && m.mean() < highest)) {
            return Optional.empty();
        }
        double lnB = new BrentSolver(1e-14, 1e-13).solve(MOST_STEPS, x -> law.apply(x).mean() - m.mean(), -WIDEST, WIDEST);
        return Optional.of(law.apply(lnB));
    }
}
