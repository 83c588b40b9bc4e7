package layerweft.engine.simulation;

import java.util.Arrays;
import layerweft.model.random.KeyedStream;
import layerweft.model.treaty.Cover;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * Applies a programme to the years of a block event by event, in order of time: needed where recoveries inure to other layers or
 * reinstatement premium depends on the time of the loss.
 *
 * <p>Event k of a layer recovers C_k − C_{k−1}, C_k the annual loss of the occurrence losses so far; the layers named in {@code inuring}
 * have their recoveries from that event, at their placed shares, taken off the subject loss first.
 */
final class TermsInOrder implements TermsApplied {
    private static final int TIME_BITS = 38;
    private static final int EVENT_BITS = 63 - TIME_BITS;

    private final int layers;
    private final LayerTerms[] terms;
    private final Cover[] covers;
    private final int[] order;
    private final int[][] inuring;
    private final double[] share;
    private final boolean[] timed;
    private final int perils;

    // workspaces of one year
    private final double[] soFar;
    private final double[] recovered;
    private final double[] alone;
    private long[] byTime = new long[64];
    private int[] perilOf = new int[64];
    private int[] eventOf = new int[64];

    TermsInOrder(Treaty treaty) {
        layers = treaty.layers();
        terms = new LayerTerms[layers];
        covers = new Cover[layers];
        share = new double[layers];
        timed = new boolean[layers];
        inuring = new int[layers][];
        for (int j = 0; j < layers; j++) {
            Layer layer = treaty.layer(j);
            terms[j] = layer.terms();
            covers[j] = treaty.cover(j);
            share[j] = layer.share();
            timed[j] = layer.proRataTime();
            inuring[j] = layer.inuring().stream().mapToInt(treaty.programme()::indexOf).toArray();
        }
        order = treaty.programme().inuringOrder().stream().mapToInt(Integer::intValue).toArray();
        perils = treaty.portfolio().perils().size();
        soFar = new double[layers];
        recovered = new double[layers];
        alone = new double[layers];
    }

    @Override
    public void apply(PerilYears[] work, int years, YearDraw draw, long block, YearAmounts out) {
        EventsByYear events = new EventsByYear(work, years);
        KeyedStream[] times = new KeyedStream[perils];
        for (int i = 0; i < perils; i++) {
            times[i] = draw.times(block, i);
        }
        for (int y = 0; y < years; y++) {
            int n = events.ofYear(y);
            if (n == 0) {
                continue;
            }
            sortByTime(events, y, n, times);
            Arrays.fill(soFar, 0);
            for (int k = 0; k < n; k++) {
                int at = (int) (byTime[k] & ((1L << EVENT_BITS) - 1));
                double time = (byTime[k] >>> EVENT_BITS) * 0x1.0p-38;
                event(work[perilOf[at]], perilOf[at], eventOf[at], time, y, out);
            }
        }
    }

    /** One event through all layers, those that inure first. */
    private void event(PerilYears work, int peril, int e, double time, int y, YearAmounts out) {
        double groundUp = work.groundUp(e);
        double ceded = 0;
        for (int j : order) {
            recovered[j] = 0;
            alone[j] = 0;
            if (!covers[j].covers(peril)) {
                continue;
            }
            double subject = 0;
            for (int k = 0; k < work.parts.length; k++) {
                subject += covers[j].covers(peril, k) ? work.parts[k][e] : 0;
            }
            double subjectAlone = subject;
            for (int i : inuring[j]) {
                subject -= share[i] * recovered[i];
                subjectAlone -= share[i] * alone[i];
            }
            double o = terms[j].occurrenceLoss(Math.max(subject, 0));
            alone[j] = terms[j].annualLoss(terms[j].occurrenceLoss(Math.max(subjectAlone, 0)));
            ceded += share[j] * alone[j];
            if (o > 0 || alone[j] > 0) {
                out.list(j, y);
            }
            out.largest[j][y] = Math.max(out.largest[j][y], alone[j]);
            if (o > 0) {
                double before = terms[j].annualLoss(soFar[j]);
                soFar[j] += o;
                double after = terms[j].annualLoss(soFar[j]);
                recovered[j] = after - before;
                out.sum[j][y] = soFar[j];
                if (out.sumOf != null) {
                    out.sumOf[j][peril][y] += o;
                }
                out.hits[j][y]++;
                if (timed[j]) {
                    double piece = terms[j].reinstatementFactor(after) - terms[j].reinstatementFactor(before);
                    out.timedFactor[j][y] += piece * (1 - time);
                }
            }
        }
        out.gross[y] += groundUp;
        if (out.grossOf != null) {
            out.grossOf[peril][y] += groundUp;
        }
        out.grossLargest[y] = Math.max(out.grossLargest[y], groundUp);
        out.cededLargest[y] = Math.max(out.cededLargest[y], ceded);
        out.netLargest[y] = Math.max(out.netLargest[y], groundUp - ceded);
    }

    /** Times are uniform in the year and keyed by the year as drawn, so that they do not change with other perils. */
    private void sortByTime(EventsByYear events, int y, int n, KeyedStream[] times) {
        if (byTime.length < n) {
            byTime = new long[2 * n];
            perilOf = new int[2 * n];
            eventOf = new int[2 * n];
        }
        int at = 0;
        for (int i = 0; i < perils; i++) {
            int source = events.source(i, y);
            int first = events.first(i, source);
            int last = events.first(i, source + 1);
            if (first < last) {
                times[i].seek(source);
            }
            for (int e = first; e < last; e++) {
                perilOf[at] = i;
                eventOf[at] = e;
                byTime[at] = (times[i].nextLong() >>> (64 - TIME_BITS) << EVENT_BITS) | at;
                at++;
            }
        }
        Arrays.sort(byTime, 0, n);
    }
}
