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

    /** Years of events written before their number is looked at. */
    private static final int WRITTEN_AHEAD = 4;

    // all events of one peril: year, ground-up loss
    private int[] yearOf = new int[WRITTEN_AHEAD];
    private double[] total = new double[0];
    // those that can reach a layer: loss, year, recoveries of all layers so far, and place among all
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
            years(work[i], years);
            int reaching = firstPass(work[i], threshold(i), out);
            if (out.grossOf != null) {
                add(groundUp(work[i]), yearOf, work[i].events, out.grossOf[i]);
            }
            Arrays.fill(ceded, 0, reaching, 0);
            for (int j = 0; j < terms.length; j++) {
                if (covers[j].covers(i)) {
                    layer(j, subject(work[i], i, j, reaching), reaching, out);
                    if (out.sumOf != null) {
                        add(occurrence, year, reaching, out.sumOf[j][i]);
                    }
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

    /** The year of every event, into {@link #yearOf}. */
    private void years(PerilYears work, int years) {
        int e = 0;
        for (int drawn = 0; drawn < years; drawn++) {
            int n = work.counts[drawn];
            int y = work.year(drawn);
            // most years have at most this many events: written in any case, no branch to guess wrong
            yearOf[e] = y;
            yearOf[e + 1] = y;
            yearOf[e + 2] = y;
            yearOf[e + 3] = y;
            for (int j = WRITTEN_AHEAD; j < n; j++) {
                yearOf[e + j] = y;
            }
            e += n;
        }
    }

    /** Gross amounts of all events; sets aside those above the threshold and returns their number. */
    private int firstPass(PerilYears work, double threshold, YearAmounts out) {
        double[] gross = out.gross;
        double[] grossLargest = out.grossLargest;
        double[] netLargest = out.netLargest;
        double[] all = groundUp(work);
        int reaching = 0;
        for (int e = 0; e < work.events; e++) {
            double x = all[e];
            int y = yearOf[e];
            gross[y] += x;
            grossLargest[y] = x > grossLargest[y] ? x : grossLargest[y];
            // written in any case, kept only if it reaches
            loss[reaching] = x;
            year[reaching] = y;
            event[reaching] = e;
            boolean reaches = x > threshold;
            reaching += reaches ? 1 : 0;
            double kept = reaches ? 0 : x;
            netLargest[y] = kept > netLargest[y] ? kept : netLargest[y];
        }
        return reaching;
    }

    /** Ground-up loss of each event: the only part, or the sum of the parts. */
    private double[] groundUp(PerilYears work) {
        if (work.parts.length == 1) {
            return work.parts[0];
        }
        System.arraycopy(work.parts[0], 0, total, 0, work.events);
        for (int k = 1; k < work.parts.length; k++) {
            double[] part = work.parts[k];
            for (int e = 0; e < work.events; e++) {
                total[e] += part[e];
            }
        }
        return total;
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

    private static void add(double[] amounts, int[] years, int events, double[] out) {
        for (int e = 0; e < events; e++) {
            out[years[e]] += amounts[e];
        }
    }

    private void reserve(int events) {
        if (loss.length < events + WRITTEN_AHEAD) {
            int room = events + events / 4 + WRITTEN_AHEAD;
            yearOf = new int[room];
            total = new double[room];
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
