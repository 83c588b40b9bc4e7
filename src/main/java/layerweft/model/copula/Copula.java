package layerweft.model.copula;

/**
 * The dependence between d ≥ 1 uniform variables U_1..U_d: family and strength, for any number of perils that the kind admits.
 * Kinds are immutable records, valid by construction except for the dimension, which {@link #requireDimension} checks.
 */
public sealed interface Copula
        permits Independence, Comonotonic, Countermonotonic, Gaussian, Student, Archimedean, GroupedArchimedean, MixtureCopula {

    /** How the family is written in files and on the command line, e.g. {@code gumbel}, {@code survival-clayton}, {@code student:4}. */
    String label();

    /**
     * @param dimension number of perils joined
     * @throws layerweft.model.InadmissibleException if the copula, at its strength, does not exist for so many, naming the field and
     *     the admissible range
     */
    void requireDimension(int dimension);

    /**
     * C(u) = P(U_1 ≤ u_1, …, U_d ≤ u_d).
     *
     * @param u length d, each in [0, 1]
     */
    double cdf(double... u);

    /** Kendall's τ of the pair (i, j), i ≠ j. */
    double kendallTau(int i, int j);

    /** Upper tail dependence λ_U = lim P(U_j > u | U_i > u) as u → 1 of the pair (i, j), i ≠ j. */
    double upperTail(int i, int j);

    /** Lower tail dependence λ_L = lim P(U_j ≤ u | U_i ≤ u) as u → 0 of the pair (i, j), i ≠ j. */
    double lowerTail(int i, int j);

    /** Spearman's ρ = 12∫∫C − 3 of the pair (i, j), i ≠ j; to 1e-7 where no closed form is known. */
    default double spearmanRho(int i, int j) {
        return SpearmanRho.of(pair(i, j));
    }

    /** The copula of the pair (i, j), i ≠ j, alone. */
    Copula pair(int i, int j);

    /** A sampler of d variables; immutable, may be shared between threads. */
    ScoreSampler sampler(int dimension);
}
