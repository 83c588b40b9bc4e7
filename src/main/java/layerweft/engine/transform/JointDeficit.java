package layerweft.engine.transform;

/**
 * 1 − E[Π_i φ_i^{N_i}] for counts joined by {@link LatentNodes}, at many frequencies at once, from the deficits w_i = 1 − φ_i of the
 * perils' event laws. At a node 1 − E[φ^N] = w·Σ_n P(N &gt; n) φ^n (Horner's rule), and deficits of independent perils join as
 * r + s − rs: nothing is ever subtracted from 1, so rare layers keep their digits.
 */
final class JointDeficit {
    /** Frequencies handled together: the working arrays stay in the nearest cache. */
    private static final int BLOCK = 128;

    private JointDeficit() {
    }

    /**
     * @param deficits peril × {real, imaginary} × frequency
     * @param negligible high counts of this probability in all may be left out; 0 where the transforms are tilted upwards
     * @return {real, imaginary} × frequency
     */
    static double[][] of(LatentNodes nodes, double[][][] deficits, double negligible) {
        int perils = deficits.length;
        int count = perils == 0 ? 0 : deficits[0][0].length;
        int[][] lengths = lengths(nodes, negligible);
        double[][] out = new double[2][count];
        double[][][] phi = new double[perils][2][BLOCK];
        double[][] h = new double[2][BLOCK];
        double[][] r = new double[2][BLOCK];
        for (int from = 0; from < count; from += BLOCK) {
            int size = Math.min(BLOCK, count - from);
            for (int i = 0; i < perils; i++) {
                for (int f = 0; f < size; f++) {
                    phi[i][0][f] = 1 - deficits[i][0][from + f];
                    phi[i][1][f] = -deficits[i][1][from + f];
                }
            }
            for (int k = 0; k < nodes.size(); k++) {
                boolean first = true;
                for (int i = 0; i < perils; i++) {
                    int length = lengths[i][k];
                    if (length > 0) {
                        horner(nodes.survival()[i][k], length, phi[i][0], phi[i][1], h[0], h[1], size);
                        join(deficits[i][0], deficits[i][1], from, h[0], h[1], r[0], r[1], size, first);
                        first = false;
                    }
                }
                if (!first) {
                    add(nodes.weights()[k], r[0], r[1], out[0], out[1], from, size);
                }
            }
        }
        return out;
    }

    private static int[][] lengths(LatentNodes nodes, double negligible) {
        int[][] lengths = new int[nodes.perils()][nodes.size()];
        double each = negligible / (nodes.perils() * nodes.size());
        for (int i = 0; i < nodes.perils(); i++) {
            for (int k = 0; k < nodes.size(); k++) {
                double[] s = nodes.survival()[i][k];
                int n = s.length;
                double left = each;
                while (n > 0 && (left -= Math.abs(s[n - 1] * nodes.weights()[k])) > 0) {
                    n--;
                }
                lengths[i][k] = n;
            }
        }
        return lengths;
    }

    /**
     * Joins one peril's counts to what is there: r ← r + x − r·x, x = w·h.
     *
     * @param h to work in
     * @param r {real, imaginary} × frequency of the block, 0 where nothing is there yet
     */
    static void join(double[] survival, double[] wr, double[] wi, int from, double[][] h, double[][] r, int size) {
        int length = survival.length;
        if (length == 0) {
            return;
        }
        java.util.Arrays.fill(h[0], 0, size, survival[length - 1]);
        java.util.Arrays.fill(h[1], 0, size, 0);
        for (int n = length - 2; n >= 0; n--) {
            double s = survival[n];
            for (int f = 0; f < size; f++) {
                double p = 1 - wr[from + f];
                double q = -wi[from + f];
                double a = h[0][f];
                double b = h[1][f];
                h[0][f] = Math.fma(a, p, Math.fma(-b, q, s));
                h[1][f] = Math.fma(a, q, b * p);
            }
        }
        join(wr, wi, from, h[0], h[1], r[0], r[1], size, false);
    }

    /** The same for a deficit x + iy. */
    static void join(double[] x, double[] y, double[][] r, int size) {
        for (int f = 0; f < size; f++) {
            double a = r[0][f];
            double b = r[1][f];
            r[0][f] = a + x[f] - (a * x[f] - b * y[f]);
            r[1][f] = b + y[f] - (a * y[f] + b * x[f]);
        }
    }

    private static void horner(double[] survival, int length, double[] pr, double[] pi, double[] hr, double[] hi, int size) {
        double top = survival[length - 1];
        for (int f = 0; f < size; f++) {
            hr[f] = top;
            hi[f] = 0;
        }
        int n = length - 2;
        for (; n >= 3; n -= 4) {
            fourSteps(survival[n], survival[n - 1], survival[n - 2], survival[n - 3], pr, pi, hr, hi, size);
        }
        for (; n >= 0; n--) {
            step(survival[n], pr, pi, hr, hi, size);
        }
    }

    /** h ← h·φ + s. */
    private static void step(double s, double[] pr, double[] pi, double[] hr, double[] hi, int size) {
        for (int f = 0; f < size; f++) {
            double a = hr[f];
            double b = hi[f];
            hr[f] = Math.fma(a, pr[f], Math.fma(-b, pi[f], s));
            hi[f] = Math.fma(a, pi[f], b * pr[f]);
        }
    }

    /** Four steps at once: the arithmetic, not the memory, then sets the pace. */
    private static void fourSteps(double s0, double s1, double s2, double s3, double[] pr, double[] pi, double[] hr, double[] hi, int size) {
        for (int f = 0; f < size; f++) {
            double p = pr[f];
            double q = pi[f];
            double a0 = hr[f];
            double b0 = hi[f];
            double a1 = Math.fma(a0, p, Math.fma(-b0, q, s0));
            double b1 = Math.fma(a0, q, b0 * p);
            double a2 = Math.fma(a1, p, Math.fma(-b1, q, s1));
            double b2 = Math.fma(a1, q, b1 * p);
            double a3 = Math.fma(a2, p, Math.fma(-b2, q, s2));
            double b3 = Math.fma(a2, q, b2 * p);
            hr[f] = Math.fma(a3, p, Math.fma(-b3, q, s3));
            hi[f] = Math.fma(a3, q, b3 * p);
        }
    }

    /** x = w·h; r ← r + x − r·x, or x at first. */
    private static void join(double[] wr, double[] wi, int from, double[] hr, double[] hi, double[] rr, double[] ri, int size, boolean first) {
        for (int f = 0; f < size; f++) {
            double x = wr[from + f] * hr[f] - wi[from + f] * hi[f];
            double y = wr[from + f] * hi[f] + wi[from + f] * hr[f];
            if (first) {
                rr[f] = x;
                ri[f] = y;
            } else {
                double a = rr[f];
                double b = ri[f];
                rr[f] = a + x - (a * x - b * y);
                ri[f] = b + y - (a * y + b * x);
            }
        }
    }

    private static void add(double weight, double[] rr, double[] ri, double[] outR, double[] outI, int from, int size) {
        for (int f = 0; f < size; f++) {
            outR[from + f] += weight * rr[f];
            outI[from + f] += weight * ri[f];
        }
    }

    /** The same at one real point: deficits w_i of the perils. */
    static double at(LatentNodes nodes, double[] deficits) {
        double out = 0;
        for (int k = 0; k < nodes.size(); k++) {
            double r = 0;
            for (int i = 0; i < deficits.length; i++) {
                double[] s = nodes.survival()[i][k];
                double h = 0;
                for (int n = s.length - 1; n >= 0; n--) {
                    h = h * (1 - deficits[i]) + s[n];
                }
                double x = deficits[i] * h;
                r += x - r * x;
            }
            out += nodes.weights()[k] * r;
        }
        return out;
    }
}
