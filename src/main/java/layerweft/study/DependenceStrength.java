package layerweft.study;

import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.model.copula.TauRange;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * A copula between perils as one strength that can be turned up and down. One τ for all pairs is turned itself. Where the pairs differ, all
 * are scaled together by a factor: correlations of a matrix, τ of groups, each component of a mixture; the strength is then the mean of
 * the pairs' τ. Copulas without a strength (independence, comonotonic) are left for {@link #STARTING_FAMILY} at the first turn.
 */
public final class DependenceStrength {
    /** The family that a turn away from a copula without a strength takes up. */
    public static final CopulaFamily STARTING_FAMILY = CopulaFamily.parse("gumbel");
    /** How far from an end that no family reaches, or at which all of them are one, a turn stops. */
    private static final double SHORT_OF_END = 0.01;
    /** Smallest mean τ to which pairs are scaled together: at 0 they would forget their proportions. */
    private static final double LEAST_MEAN = 0.01;
    private static final double TOLERANCE = 1e-10;
    private static final int MOST_STEPS = 200;

    /** What a turn does. */
    public enum Kind {
        /** Nothing: with one peril there is no copula. */
        ONE_PERIL,
        /** The perils are independent; takes up the starting family. */
        INDEPENDENT,
        /** Changes the τ that all pairs share. */
        ONE_TAU,
        /** Scales pairs that differ. */
        PAIRS,
        /** The copula has no strength: takes up the starting family. */
        FIXED
    }

    private final PairScaling pairs;
    private final Kind kind;
    private final CopulaFamily family;

    private DependenceStrength(PairScaling pairs, Kind kind, CopulaFamily family) {
        this.pairs = pairs;
        this.kind = kind;
        this.family = family;
    }

    /** @param perils number of perils joined, at least 1 */
    public static DependenceStrength of(Copula copula, int perils) {
        if (perils < 2) {
            return new DependenceStrength(null, Kind.ONE_PERIL, null);
        }
        PairScaling pairs = new PairScaling(copula, perils);
        if (copula instanceof Independence) {
            return new DependenceStrength(pairs, Kind.INDEPENDENT, STARTING_FAMILY);
        }
        CopulaFamily one = Families.ofOneTau(copula, perils);
        if (one != null) {
            return new DependenceStrength(pairs, Kind.ONE_TAU, one);
        }
        boolean scales = pairs.mostFactor() < Double.POSITIVE_INFINITY && pairs.mean() > 0;
        return new DependenceStrength(pairs, scales ? Kind.PAIRS : Kind.FIXED, scales ? null : STARTING_FAMILY);
    }

    public Kind kind() {
        return kind;
    }

    /** The family of the copulas that turning gives; null where pairs are scaled together or there is one peril. */
    public CopulaFamily family() {
        return family;
    }

    /** Kendall's τ, the mean of the pairs where they differ; 0 for one peril. */
    public double tau() {
        return kind == Kind.ONE_PERIL ? 0 : pairs.mean();
    }

    /** The smallest τ of a pair; 0 for one peril. */
    public double lowestPair() {
        return kind == Kind.ONE_PERIL ? 0 : pairs.lowest();
    }

    /** The largest τ of a pair; 0 for one peril. */
    public double highestPair() {
        return kind == Kind.ONE_PERIL ? 0 : pairs.highest();
    }

    /** The smallest τ to which it can be turned. */
    public double least() {
        return switch (kind) {
            case ONE_PERIL -> 0;
            case PAIRS -> Math.min(LEAST_MEAN, tau());
            default -> {
                TauRange range = family.tauRange(pairs.perils());
                yield range.low() == -1 ? -1 + SHORT_OF_END : range.low();
            }
        };
    }

    /** The largest τ to which it can be turned. */
    public double most() {
        return switch (kind) {
            case ONE_PERIL -> 0;
            case PAIRS -> Math.max(tau(), pairs.by(pairs.mostFactor()).mean());
            default -> Math.min(1 - SHORT_OF_END, family.tauRange(pairs.perils()).high());
        };
    }

    /**
     * The copula turned to a strength.
     *
     * @param tau from {@link #least} to {@link #most}
     * @throws layerweft.model.InadmissibleException if the perils cannot have it
     * @throws IllegalStateException with one peril
     */
    public Copula at(double tau) {
        if (kind == Kind.ONE_PERIL) {
            throw new IllegalStateException("one peril has no copula");
        }
        return kind == Kind.PAIRS ? pairs.by(factor(tau)).copula() : family.at(tau);
    }

    /**
     * The factor that brings pairs which differ to a mean τ.
     *
     * @throws IllegalStateException where pairs do not differ
     */
    public double factor(double tau) {
        if (kind != Kind.PAIRS) {
            throw new IllegalStateException("no pairs to scale");
        }
        double most = Math.max(1, pairs.mostFactor());
        return pairs.by(most).mean() <= tau ? most : new BrentSolver(TOLERANCE).solve(MOST_STEPS, f -> pairs.by(f).mean() - tau, 0, most);
    }
}
