package layerweft.model.copula;

import java.util.Locale;

/** The families of Archimedean copulas, each with one strength θ; formulas in Nelsen (2006) and Joe (2014). */
public enum ArchimedeanFamily {
    /** Dependence in the small values; its survival copula has it in the large ones. */
    CLAYTON(0),
    /** Dependence in the large values; the one Archimedean extreme-value copula. */
    GUMBEL(1),
    /** No dependence in either tail. */
    FRANK(0),
    /** Dependence in the large values, stronger there than Gumbel's at the same τ. */
    JOE(1);

    private final double independentTheta;

    ArchimedeanFamily(double independentTheta) {
        this.independentTheta = independentTheta;
    }

    /** The name in files, e.g. {@code gumbel}. */
    public String label() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The θ at which the family is independence; dependence grows with θ from there. */
    public double independentTheta() {
        return independentTheta;
    }

    /** The smallest θ for so many variables; −∞ for Frank's pairs. */
    public double leastTheta(int dimension) {
        if (dimension > 2) {
            return independentTheta;
        }
        return switch (this) {
            case CLAYTON -> -1;
            case FRANK -> Double.NEGATIVE_INFINITY;
            case GUMBEL, JOE -> independentTheta;
        };
    }

    /** Kendall's τ at θ. */
    public double tauOf(double theta) {
        return switch (this) {
            case CLAYTON -> theta / (theta + 2);
            case GUMBEL -> (theta - 1) / theta;
            case FRANK -> ArchimedeanTau.frank(theta);
            case JOE -> ArchimedeanTau.joe(theta);
        };
    }

    /** The θ that has Kendall's τ, tau below 1 and admissible in the family. */
    public double thetaOf(double tau) {
        return switch (this) {
            case CLAYTON -> 2 * tau / (1 - tau);
            case GUMBEL -> 1 / (1 - tau);
            case FRANK -> ArchimedeanTau.frankTheta(tau);
            case JOE -> ArchimedeanTau.joeTheta(tau);
        };
    }

    /** Lower tail dependence of a pair at θ. */
    double lowerTail(double theta) {
        return this == CLAYTON && theta > 0 ? Math.pow(2, -1 / theta) : 0;
    }

    /** Upper tail dependence of a pair at θ: 2 − 2^(1/θ) for Gumbel and Joe. */
    double upperTail(double theta) {
        return this == GUMBEL || this == JOE ? -2 * Math.expm1(Math.log(2) * (1 - theta) / theta) : 0;
    }

    /** The generator at θ of at least {@link #independentTheta}. */
    Generator generator(double theta) {
        if (theta == independentTheta) {
            return new IndependenceGenerator();
        }
        return switch (this) {
            case CLAYTON -> new ClaytonGenerator(theta);
            case GUMBEL -> new GumbelGenerator(theta);
            case FRANK -> new FrankGenerator(theta);
            case JOE -> new JoeGenerator(theta);
        };
    }
}
