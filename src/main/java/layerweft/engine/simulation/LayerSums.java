package layerweft.engine.simulation;

import layerweft.model.treaty.LayerTerms;

/**
 * Sums over years for one layer, at 100 %: A the annual sum of occurrence losses, Y the layer loss, r the reinstatement premium as a
 * multiple of the upfront premium. Sums are kept for each block and added up in the order of the blocks, so that their rounding does
 * not depend on the number of threads.
 */
final class LayerSums {
    long years;
    double a;
    double aa;
    double y;
    double yy;
    double ya;
    double r;
    double rr;
    double ra;
    double hits;
    double hitsSquared;
    long attached;
    long exhausted;

    /** The sums of one block. */
    static LayerSums of(LayerTerms terms, YearAmounts amounts, int layer, int years) {
        LayerSums s = new LayerSums();
        s.years = years;
        double[] sum = amounts.sum[layer];
        int[] hits = amounts.hits[layer];
        double[] timed = amounts.timedFactor[layer];
        boolean reinstates = terms.hasPaidReinstatements();
        int[] listed = amounts.hitYear[layer];
        for (int k = 0; k < amounts.hitYears[layer]; k++) {
            int i = listed[k];
            double a = sum[i];
            double y = terms.annualLoss(a);
            s.a += a;
            s.aa += a * a;
            s.hits += hits[i];
            s.hitsSquared += (double) hits[i] * hits[i];
            if (y > 0) {
                s.y += y;
                s.yy += y * y;
                s.ya += y * a;
                s.attached++;
                s.exhausted += y == terms.annualLimit() ? 1 : 0;
                if (reinstates) {
                    double r = timed != null ? timed[i] : terms.reinstatementFactor(y);
                    s.r += r;
                    s.rr += r * r;
                    s.ra += r * a;
                }
            }
        }
        return s;
    }

    void add(LayerSums o) {
        years += o.years;
        a += o.a;
        aa += o.aa;
        y += o.y;
        yy += o.yy;
        ya += o.ya;
        r += o.r;
        rr += o.rr;
        ra += o.ra;
        hits += o.hits;
        hitsSquared += o.hitsSquared;
        attached += o.attached;
        exhausted += o.exhausted;
    }
}
