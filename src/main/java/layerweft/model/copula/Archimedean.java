package layerweft.model.copula;

import java.util.Arrays;
import java.util.Locale;
import layerweft.model.Check;

/**
 * An Archimedean copula C(u) = ψ(Σψ⁻¹(u_i)), or its survival version (the law of 1 − U). At the family's
 * {@link ArchimedeanFamily#independentTheta} it is independence; below it, where the family allows, a pair with negative dependence.
 *
 * @param family the generator's family
 * @param theta its parameter θ; admissible for at least two variables
 * @param survival whether U is replaced by 1 − U
 */
public record Archimedean(ArchimedeanFamily family, double theta, boolean survival) implements Copula {

    public Archimedean {
        double least = family.leastTheta(2);
        new Check().that(theta >= least && theta < Double.POSITIVE_INFINITY && theta > Double.NEGATIVE_INFINITY, "theta", theta,
                least == Double.NEGATIVE_INFINITY ? "a finite number"
                        : String.format(Locale.ROOT, "a finite number of at least %.0f", least)).orThrow();
    }

    public static Archimedean ofTheta(ArchimedeanFamily family, boolean survival, double theta) {
        return new Archimedean(family, theta, survival);
    }

    /** @throws layerweft.model.InadmissibleException if no pair of the family has this τ */
    public static Archimedean ofKendallTau(ArchimedeanFamily family, boolean survival, double tau) {
        TauRange.of(family, 2).check(tau);
        return new Archimedean(family, family.thetaOf(tau), survival);
    }

    @Override
    public String label() {
        return survival ? "survival-" + family.label() : family.label();
    }

    @Override
    public void requireDimension(int dimension) {
        new Check().that(theta >= family.leastTheta(dimension), "kendallTau",
                String.format(Locale.ROOT, "%.6g (theta %.6g)", family.tauOf(theta), theta),
                TauRange.of(family, dimension) + " for " + dimension + " perils").orThrow();
    }

    /** Whether the copula has a frailty, and so a {@link #generator}: not at negative dependence. */
    public boolean hasFrailty() {
        return theta >= family.independentTheta();
    }

    /**
     * The generator of the copula itself, or, for a survival copula, of the copula of 1 − U.
     *
     * @throws IllegalStateException at negative dependence
     */
    public Generator generator() {
        if (!hasFrailty()) {
            throw new IllegalStateException("no frailty at theta " + theta);
        }
        return family.generator(theta);
    }

    /** {@inheritDoc} The survival version takes at most 20 coordinates below 1 (others throw UnsupportedOperationException). */
    @Override
    public double cdf(double... u) {
        requireDimension(u.length);
        if (u.length == 1) {
            return u[0];
        }
        if (!hasFrailty()) {
            NegativePair pair = new NegativePair(family, -theta);
            return survival ? pair.survival(u[0], u[1]) : pair.cdf(u[0], u[1]);
        }
        Generator generator = generator();
        if (survival) {
            return SurvivalSum.cdf(u, (p, q) -> generator.complementOfLog(logSum(generator, p, q)));
        }
        double[] q = new double[u.length];
        for (int i = 0; i < u.length; i++) {
            q[i] = 1 - u[i];
        }
        return generator.psiOfLog(logSum(generator, u, q));
    }

    private static double logSum(Generator generator, double[] p, double[] q) {
        double lnT = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < p.length; i++) {
            lnT = LogScale.logAdd(lnT, generator.logInverse(p[i], q[i]));
        }
        return lnT;
    }

    @Override
    public double kendallTau(int i, int j) {
        return family.tauOf(theta);
    }

    @Override
    public double upperTail(int i, int j) {
        return survival ? family.lowerTail(theta) : family.upperTail(theta);
    }

    @Override
    public double lowerTail(int i, int j) {
        return survival ? family.upperTail(theta) : family.lowerTail(theta);
    }

    /** The survival version has the same ρ, and is the slower to integrate. */
    @Override
    public double spearmanRho(int i, int j) {
        if (theta == family.independentTheta()) {
            return 0;
        }
        return switch (family) {
            case FRANK -> SpearmanRho.frank(theta);
            case GUMBEL -> SpearmanRho.gumbel(theta);
            case CLAYTON, JOE -> SpearmanRho.of(new Archimedean(family, theta, false));
        };
    }

    @Override
    public Copula pair(int i, int j) {
        return this;
    }

    @Override
    public ScoreSampler sampler(int dimension) {
        requireDimension(dimension);
        if (dimension == 1) {
            return new Independence().sampler(1);
        }
        boolean[] flipped = new boolean[dimension];
        Arrays.fill(flipped, survival);
        if (hasFrailty()) {
            return new SharedFrailtySampler(generator(), flipped);
        }
        if (family == ArchimedeanFamily.CLAYTON) {
            return new NegativeClaytonSampler(-theta, survival);
        }
        // Frank at −θ is the law of (U, 1 − V) at θ
        flipped[1] = !flipped[1];
        return new SharedFrailtySampler(family.generator(-theta), flipped);
    }
}
