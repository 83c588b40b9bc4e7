package layerweft.engine.simulation;

import java.util.Arrays;
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
    private double[] occurrence = new double[0];
    private double[] covered = new double[0];
    private int[] hit = new int[0];

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
            Arrays.fill(ceded, 0, reaching, 0);
            for (int j = 0; j < terms.length; j++) {
                if (covers[j].covers(i)) {
                    layer(j, subject(work[i], i, j, reaching), reaching, out);
                }
            }
            double[] cededLargest = out.cededLargest;
            double[] netLargest = out.netLargest;
            for (int k = 0; k < reaching; k++) {
                int y = year[k];
                double kept = loss[k] - ceded[k];
                cededLargest[y] = ceded[k] > cededLargest[y] ? ceded[k] : cededLargest[y];
                netLargest[y] = kept > netLargest[y] ? kept : netLargest[y];
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
                largest = x > largest ? x : largest;
                // written in any case, kept only if it reaches: no branch to guess wrong
                loss[reaching] = x;
                year[reaching] = y;
                event[reaching] = e;
                boolean reaches = x > threshold;
                reaching += reaches ? 1 : 0;
                double kept = reaches ? 0 : x;
                largestKept = kept > largestKept ? kept : largestKept;
            }
            gross[y] += total;
            grossLargest[y] = largest > grossLargest[y] ? largest : grossLargest[y];
            netLargest[y] = largestKept > netLargest[y] ? largestKept : netLargest[y];
        }
        return reaching;
    }

    /** Subject losses of the events set aside, for layer j: the whole loss, or the sum of the covered parts. */
    private double[] subject(PerilYears work, int peril, int j, int reaching) {
        if (covers[j].coversWhole(peril)) {
            return loss;
        }
        Arrays.fill(covered, 0, reaching, 0);
        for (int k = 0; k < work.parts.length; k++) {
            if (covers[j].covers(peril, k)) {
                for (int r = 0; r < reaching; r++) {
                    covered[r] += work.parts[k][event[r]];
                }
            }
        }
        return covered;
    }

    private void layer(int j, double[] subject, int reaching, YearAmounts out) {
        LayerTerms t = terms[j];
        t.occurrenceLosses(subject, reaching, occurrence);
        int hitting = 0;
        for (int k = 0; k < reaching; k++) {
            hit[hitting] = k;
            hitting += occurrence[k] > 0 ? 1 : 0;
        }
        boolean full = t.firstEventInFull();
        double s = share[j];
        double[] sum = out.sum[j];
        int[] hits = out.hits[j];
        double[] largest = out.largest[j];
        for (int h = 0; h < hitting; h++) {
            int k = hit[h];
            int y = year[k];
            double o = occurrence[k];
            double alone = full ? o : t.annualLoss(o);
            out.list(j, y);
            sum[y] += o;
            hits[y]++;
            largest[y] = alone > largest[y] ? alone : largest[y];
            ceded[k] += s * alone;
        }
    }

    private void reserve(int events) {
        if (loss.length <= events) {
            int room = events + events / 4 + 1;
            loss = new double[room];
            year = new int[room];
            ceded = new double[room];
            event = new int[room];
            occurrence = new double[room];
            covered = new double[room];
            hit = new int[room];
        }
    }
}
