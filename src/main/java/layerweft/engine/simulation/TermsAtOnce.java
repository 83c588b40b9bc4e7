package layerweft.engine.simulation;

import layerweft.model.treaty.Cover;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * Applies a programme whose layers do not inure to each other: the order of events does not matter, so each peril's events go through
 * each layer in one tight loop. Events too small for any layer are set aside in the first pass; most are.
 */
final class TermsAtOnce implements TermsApplied {
    private final LayerTerms[] terms;
    private final Cover[] covers;
    private final double[] share;

    // the events of one peril that can reach a layer: loss by layer's cover, year, and recoveries of all layers so far
    private double[] loss = new double[0];
    private int[] year = new int[0];
    private double[] ceded = new double[0];
    private int[] event = new int[0];

    TermsAtOnce(Treaty treaty) {
        int layers = treaty.layers();
        terms = new LayerTerms[layers];
        covers = new Cover[layers];
        share = new double[layers];
        for (int j = 0; j < layers; j++) {
            terms[j] = treaty.layer(j).terms();
            covers[j] = treaty.cover(j);
            share[j] = treaty.layer(j).share();
        }
    }

    @Override
    public void apply(PerilYears[] work, int years, YearDraw draw, long block, YearAmounts out) {
        for (int i = 0; i < work.length; i++) {
            reserve(work[i].events);
            int reaching = firstPass(work[i], years, threshold(i), out);
            for (int j = 0; j < terms.length; j++) {
                if (covers[j].covers(i)) {
                    layer(j, subject(work[i], i, j, reaching), reaching, out);
                }
            }
            double[] cededLargest = out.cededLargest;
            double[] netLargest = out.netLargest;
            for (int k = 0; k < reaching; k++) {
                int y = year[k];
                cededLargest[y] = Math.max(cededLargest[y], ceded[k]);
                netLargest[y] = Math.max(netLargest[y], loss[k] - ceded[k]);
            }
        }
    }

    /** The smallest ground-up loss of peril i that any layer pays for is above this. */
    private double threshold(int i) {
        double least = Double.POSITIVE_INFINITY;
        for (int j = 0; j < terms.length; j++) {
            if (covers[j].covers(i)) {
                double from = terms[j].hasFranchise() ? terms[j].franchise() : terms[j].retention();
                least = Math.min(least, from / terms[j].quotaShare());
            }
        }
        return least;
    }

    /** Gross amounts of all events; sets aside those above the threshold and returns their number. */
    private int firstPass(PerilYears work, int years, double threshold, YearAmounts out) {
        double[] gross = out.gross;
        double[] grossLargest = out.grossLargest;
        double[] netLargest = out.netLargest;
        double[] single = work.parts.length == 1 ? work.parts[0] : null;
        int e = 0;
        int reaching = 0;
        for (int drawn = 0; drawn < years; drawn++) {
            int n = work.counts[drawn];
            if (n == 0) {
                continue;
            }
            int y = work.year(drawn);
            double total = 0;
            double largest = 0;
            double largestKept = 0;
            for (int last = e + n; e < last; e++) {
                double x = single != null ? single[e] : work.groundUp(e);
                total += x;
                largest = Math.max(largest, x);
                if (x > threshold) {
                    loss[reaching] = x;
                    year[reaching] = y;
                    ceded[reaching] = 0;
                    event[reaching++] = e;
                } else {
                    largestKept = Math.max(largestKept, x);
                }
            }
            gross[y] += total;
            grossLargest[y] = Math.max(grossLargest[y], largest);
            netLargest[y] = Math.max(netLargest[y], largestKept);
        }
        return reaching;
    }

    /** Subject losses of the events set aside, for layer j: the whole loss, or the sum of the covered parts. */
    private double[] subject(PerilYears work, int peril, int j, int reaching) {
        if (covers[j].coversWhole(peril)) {
            return loss;
        }
        double[] subject = new double[reaching];
        for (int k = 0; k < work.parts.length; k++) {
            if (covers[j].covers(peril, k)) {
                for (int r = 0; r < reaching; r++) {
                    subject[r] += work.parts[k][event[r]];
                }
            }
        }
        return subject;
    }

    private void layer(int j, double[] subject, int reaching, YearAmounts out) {
        LayerTerms t = terms[j];
        double s = share[j];
        double[] sum = out.sum[j];
        int[] hits = out.hits[j];
        double[] largest = out.largest[j];
        for (int k = 0; k < reaching; k++) {
            double o = t.occurrenceLoss(subject[k]);
            if (o > 0) {
                int y = year[k];
                double alone = t.annualLoss(o);
                sum[y] += o;
                hits[y]++;
                largest[y] = Math.max(largest[y], alone);
                ceded[k] += s * alone;
            }
        }
    }

    private void reserve(int events) {
        if (loss.length < events) {
            int room = events + events / 4;
            loss = new double[room];
            year = new int[room];
            ceded = new double[room];
            event = new int[room];
        }
    }
}
