package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/**
 * Draws from a copula on a scale of its own choosing. A <em>score</em> is a strictly increasing function of the uniform U that keeps
 * full precision at both ends (for an Archimedean copula ln V − ln E, for a normal one the normal score). Counts are found by
 * comparing scores with tabulated thresholds, so that no uniform, exponential or power need ever be formed in the simulation's loop.
 */
public interface ScoreSampler {

    /** Number d of variables. */
    int dimension();

    /**
     * Draws the scores of consecutive years. Year y draws from slot {@code firstSlot + y} of the stream and from nothing else.
     *
     * @param scores receives the scores: {@code scores[i][y]}, d × at least {@code years}
     */
    void draw(KeyedStream stream, long firstSlot, int years, double[][] scores);

    /**
     * Draws several vectors in each of consecutive years, e.g. one for each event. Year y draws from slot {@code firstSlot + y} of the
     * stream, so that its first k vectors do not depend on how many follow.
     *
     * @param counts vectors in each year, length at least {@code years}
     * @param scores receives the scores year by year: {@code scores[i][k]}, d × at least Σ counts
     */
    void fill(KeyedStream stream, long firstSlot, int[] counts, int years, double[][] scores);

    /**
     * The score of variable i at U_i = p: U_i &gt; p exactly when the score drawn is above it.
     *
     * @param p in [0, 1]
     * @param q 1 − p, given apart so that neither end loses digits
     * @return −∞ at p = 0, +∞ at q = 0
     */
    double score(int i, double p, double q);

    /** U_i of a score: the inverse of {@link #score}. */
    double uniform(int i, double score);

    /** 1 − U_i of a score, exact where U_i is near 1. */
    double complement(int i, double score);
}
