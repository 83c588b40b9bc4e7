package layerweft.engine.simulation;

import java.util.List;
import layerweft.model.copula.ScoreSampler;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.random.KeyedStream;
import layerweft.model.severity.SeverityModel;
import layerweft.model.severity.SeveritySampler;

/** Draws the losses of one peril's events. Immutable; the workspace is passed in. */
final class PerilDraw {
    private final SeveritySampler single;
    private final SubPeril[] subPerils;
    private final ScoreSampler scores;

    PerilDraw(Peril peril) {
        if (peril.eventLoss() instanceof EventLoss.Split split) {
            List<SubPeril> list = split.subPerils();
            single = null;
            subPerils = list.toArray(SubPeril[]::new);
            scores = split.copula().sampler(list.size());
        } else {
            single = ((EventLoss.Single) peril.eventLoss()).severity().sampler();
            subPerils = new SubPeril[0];
            scores = null;
        }
    }

    /** Number of parts of an event loss. */
    int parts() {
        return single != null ? 1 : subPerils.length;
    }

    /**
     * Fills in the losses of all events whose counts are already there.
     *
     * @param key of this peril in this block
     */
    void losses(long key, int years, PerilYears work) {
        if (single != null) {
            single.fill(new KeyedStream(KeyedStream.key(key, 0)), 0, work.counts, years, work.parts[0]);
        } else {
            split(key, years, work);
        }
    }

    /** Event by event: sizes joined by the sub-perils' copula, occurrence independent of them and of each other. */
    private void split(long key, int years, PerilYears work) {
        // scores first, then turned into losses in place
        scores.fill(new KeyedStream(KeyedStream.key(key, 0)), 0, work.counts, years, work.parts);
        KeyedStream occurrence = new KeyedStream(KeyedStream.key(key, 1));
        int e = 0;
        for (int y = 0; y < years; y++) {
            occurrence.seek(y);
            for (int j = work.counts[y]; j > 0; j--, e++) {
                for (int k = 0; k < subPerils.length; k++) {
                    boolean occurs = occurrence.nextDouble() < subPerils[k].chance();
                    work.parts[k][e] = occurs ? loss(k, work.parts[k][e]) : 0;
                }
            }
        }
    }

    private double loss(int k, double score) {
        SeverityModel severity = subPerils[k].severity();
        double p = scores.uniform(k, score);
        return p < 0.5 ? severity.quantile(p) : severity.survivalQuantile(scores.complement(k, score));
    }
}
