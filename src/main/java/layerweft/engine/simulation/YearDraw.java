package layerweft.engine.simulation;

import java.util.List;
import layerweft.model.copula.Independence;
import layerweft.model.copula.ScoreSampler;
import layerweft.model.frequency.CountTable;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.random.KeyedStream;

/**
 * Draws the years of a block for all perils under the portfolio's dependence. Each block has streams of its own, keyed by (seed, block)
 * and then by purpose and peril, and each year a slot in them: a year's losses of a peril are the same whatever the copula or the
 * programme, only how many of them occur differs (common random numbers).
 */
final class YearDraw {
    private static final int COPULA = 0;
    private static final int OWN_COUNTS = 1;
    private static final int TIES = 2;
    private static final int TIMES = 3;
    private static final int FIRST_PERIL = 16;

    private final long seed;
    private final int perils;
    private final boolean rearranges;
    private final ScoreSampler copula;
    private final ScoreSampler countScores;
    private final CountThresholds[] thresholds;
    private final PerilDraw[] draws;
    private final double[] means;

    YearDraw(Portfolio portfolio, long seed) {
        this.seed = seed;
        List<Peril> list = portfolio.perils();
        perils = list.size();
        rearranges = portfolio.dependence().links() == Dependence.Links.ANNUAL_TOTALS;
        copula = portfolio.dependence().copula().sampler(perils);
        countScores = rearranges ? new Independence().sampler(perils) : copula;
        thresholds = new CountThresholds[perils];
        draws = new PerilDraw[perils];
        means = new double[perils];
        for (int i = 0; i < perils; i++) {
            thresholds[i] = new CountThresholds(CountTable.of(list.get(i).frequency()), countScores, i);
            draws[i] = new PerilDraw(list.get(i));
            means[i] = list.get(i).frequency().mean();
        }
    }

    int perils() {
        return perils;
    }

    /** Whether years inside a block are rearranged and so depend on each other. */
    boolean rearranges() {
        return rearranges;
    }

    /** Workspaces for blocks of up to {@code years} years. */
    PerilYears[] workspace(int years) {
        PerilYears[] work = new PerilYears[perils];
        for (int i = 0; i < perils; i++) {
            work[i] = new PerilYears(years, draws[i].parts(), (int) Math.min(1 << 22, Math.ceil(means[i] * years)));
        }
        return work;
    }

    /**
     * Draws a block.
     *
     * @param scores workspace, perils × years
     */
    void draw(long block, int years, PerilYears[] work, double[][] scores) {
        long blockKey = KeyedStream.key(seed, block);
        countScores.draw(new KeyedStream(KeyedStream.key(blockKey, rearranges ? OWN_COUNTS : COPULA)), 0, years, scores);
        for (int i = 0; i < perils; i++) {
            work[i].reserve(thresholds[i].counts(scores[i], years, work[i].counts));
            draws[i].losses(KeyedStream.key(blockKey, FIRST_PERIL + i), years, work[i]);
        }
        if (rearranges) {
            copula.draw(new KeyedStream(KeyedStream.key(blockKey, COPULA)), 0, years, scores);
            for (int i = 0; i < perils; i++) {
                RankOrder.rearrange(work[i], years, scores[i], new KeyedStream(KeyedStream.key(KeyedStream.key(blockKey, TIES), i)));
            }
        }
    }

    /** The stream of event times of a peril in a block: slot = year. */
    KeyedStream times(long block, int peril) {
        return new KeyedStream(KeyedStream.key(KeyedStream.key(KeyedStream.key(seed, block), TIMES), peril));
    }
}
