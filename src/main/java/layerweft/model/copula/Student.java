package layerweft.model.copula;

import java.util.OptionalDouble;
import layerweft.model.Check;
import org.apache.commons.numbers.gamma.LogGamma;
import org.apache.commons.statistics.distribution.GammaDistribution;

/**
 * The t copula. At τ = 0 it is not independence: all variables share one mixing variable.
 *
 * @param correlation of the underlying normal scores
 * @param degreesOfFreedom ν of at least 0.1 (below, the variates themselves leave the range of a double)
 */
public record Student(Correlation correlation, double degreesOfFreedom) implements Copula {

    public Student {
        new Check().that(degreesOfFreedom >= 0.1 && degreesOfFreedom < Double.POSITIVE_INFINITY, "degreesOfFreedom", degreesOfFreedom,
                "a finite number of at least 0.1").orThrow();
    }

    /** The same ρ = sin(πτ/2) in every pair. */
    public static Student ofKendallTau(double tau, double degreesOfFreedom) {
        return new Student(EqualCorrelation.ofKendallTau(tau), degreesOfFreedom);
    }

    public static Student ofCorrelation(double[][] matrix, double degreesOfFreedom) {
        return new Student(CorrelationMatrix.of(matrix), degreesOfFreedom);
    }

    @Override
    public String label() {
        return label(degreesOfFreedom);
    }

    /** A whole number of degrees of freedom is written without a fraction. */
    static String label(double degreesOfFreedom) {
        boolean whole = degreesOfFreedom == Math.rint(degreesOfFreedom) && degreesOfFreedom < 1e15;
        return "student:" + (whole ? String.valueOf((long) degreesOfFreedom) : String.valueOf(degreesOfFreedom));
    }

    @Override
    public void requireDimension(int dimension) {
        correlation.requireDimension(dimension);
    }

    /**
     * {@inheritDoc} To 1e-11 for two or three variables and where all pairs have one ρ ≥ 0; otherwise to about 1e-5.
     */
    @Override
    public double cdf(double... u) {
        requireDimension(u.length);
        OpenCoordinates open = OpenCoordinates.of(u);
        if (open.impossible()) {
            return 0;
        }
        double[] x = open.quantiles(new StudentScale(degreesOfFreedom)::quantile);
        int[] at = open.indices();
        if (x.length < 2) {
            return x.length == 0 ? 1 : u[at[0]];
        }
        if (x.length == 2) {
            return EllipticalPair.cdf(x[0], x[1], u[at[0]], u[at[1]], correlation.rho(at[0], at[1]), degreesOfFreedom);
        }
        OptionalDouble common = open.common(correlation);
        NormalProbability normal = NormalProbability.of(open.correlation(correlation), common);
        if (normal instanceof SeparatedNormal separated) {
            GammaDistribution mixing = GammaDistribution.of(degreesOfFreedom / 2, 2 / degreesOfFreedom);
            return separated.mean(x, p -> Math.sqrt(mixing.inverseCumulativeProbability(p)));
        }
        return overMixing(x, normal);
    }

    /** E[P(Z_i ≤ x_i √w)] over s = ln w, w = W/ν, whose density is proportional to exp(ν(s − e^s)/2). */
    private double overMixing(double[] x, NormalProbability normal) {
        double half = degreesOfFreedom / 2;
        double logConstant = half * Math.log(half) - LogGamma.value(half);
        double spread = 1 / Math.sqrt(half);
        // below `low` the density is under e^-35 of its mass, above `high` likewise
        double low = -Math.max(9 * spread, 36 / half + 1);
        double high = Math.min(9 * spread, Math.log(9 + 80 / half));
        int pieces = 24;
        double sum = 0;
        double[] scaled = new double[x.length];
        for (int k = 0; k < pieces; k++) {
            double from = low + (high - low) * k / pieces;
            double to = low + (high - low) * (k + 1) / pieces;
            sum += AdaptiveQuadrature.integrate(s -> {
                double root = Math.exp(s / 2);
                for (int i = 0; i < x.length; i++) {
                    scaled[i] = x[i] * root;
                }
                double density = Math.exp(logConstant + half * (s - Math.exp(s)));
                return density < 1e-18 ? 0 : density * normal.at(scaled);
            }, from, to, 1e-12, 1e-10);
        }
        return sum;
    }

    @Override
    public double kendallTau(int i, int j) {
        return 2 / Math.PI * Math.asin(correlation.rho(i, j));
    }

    /** λ = 2t_{ν+1}(−√((ν+1)(1−ρ)/(1+ρ))) (Embrechts, McNeil &amp; Straumann 2002). */
    @Override
    public double upperTail(int i, int j) {
        double rho = correlation.rho(i, j);
        return rho <= -1 ? 0 : 2 * new StudentScale(degreesOfFreedom + 1).survival(Math.sqrt((degreesOfFreedom + 1) * (1 - rho) / (1 + rho)));
    }

    @Override
    public double lowerTail(int i, int j) {
        return upperTail(i, j);
    }

    @Override
    public Copula pair(int i, int j) {
        return new Student(new EqualCorrelation(correlation.rho(i, j)), degreesOfFreedom);
    }

    @Override
    public ScoreSampler sampler(int dimension) {
        requireDimension(dimension);
        return new StudentSampler(correlation, degreesOfFreedom, dimension);
    }
}
