package layerweft.engine.transform;

import java.util.Arrays;

/**
 * 1 − E[Π_i φ_i^{N_i}] for counts joined by {@link LatentNodes}, at many frequencies at once, from the deficits w_i = 1 − φ_i of the
 * perils' event laws. At a node 1 − E[φ^N] = w·Σ_n P(N &gt; n) φ^n, and deficits of independent perils join as r + s − rs: nothing is ever
 * subtracted from 1, so rare layers keep their digits.
 *
 * <p>The polynomials have real coefficients, so that one real recurrence of two terms, b_n = s_n + 2 Re φ·b_{n+1} − |φ|²·b_{n+2}, takes half
 * the work of Horner's rule (Knuth, The Art of Computer Programming, vol. 2, 4.6.4, formula (3)): Σ = s_0 + φ·b_1 − |φ|²·b_2.
 * Its rounding grows as the square of the degree near φ = 1; long polynomials are therefore cut into short ones, joined by Horner's rule in a
 * power of φ.
 */
final class JointDeficit {
    /** Frequencies handled together: the working arrays stay in the nearest cache. */
    static final int BLOCK = 128;
    /** Coefficients of a short polynomial, a power of 2. */
    private static final int SHORT = 16;

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
        Points[] points = new Points[perils];
        Arrays.setAll(points, i -> new Points());
        double[][] h = new double[2][BLOCK];
        double[][] r = new double[2][BLOCK];
        for (int from = 0; from < count; from += BLOCK) {
            int size = Math.min(BLOCK, count - from);
            for (int i = 0; i < perils; i++) {
                points[i].set(deficits[i], from, size);
            }
            for (int k = 0; k < nodes.size(); k++) {
                boolean first = true;
                for (int i = 0; i < perils; i++) {
                    int length = lengths[i][k];
                    if (length > 0) {
                        points[i].polynomial(nodes.survival()[i][k], length, h);
                        join(points[i], h, r, size, first);
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

    /** One peril's deficits w at a block of frequencies, and what of φ = 1 − w its polynomials need. */
    static final class Points {
        private final double[] re = new double[BLOCK];
        private final double[] im = new double[BLOCK];
        private final double[] twice = new double[BLOCK];
        private final double[] square = new double[BLOCK];
        private final double[] b = new double[BLOCK];
        private final double[] c = new double[BLOCK];
        /** φ^SHORT, made when a polynomial asks for it. */
        private final double[][] power = new double[2][BLOCK];
        private final double[][] part = new double[2][BLOCK];
        private boolean raised;
        private int size;

        /** @param deficit {real, imaginary} × frequency */
        void set(double[][] deficit, int from, int count) {
            size = count;
            raised = false;
            for (int f = 0; f < size; f++) {
                double x = deficit[0][from + f];
                double y = deficit[1][from + f];
                re[f] = x;
                im[f] = y;
                twice[f] = 2 - 2 * x;
                square[f] = (1 - x) * (1 - x) + y * y;
            }
        }

        /** Σ_{n &lt; length} s_n φ^n, written to h. */
        void polynomial(double[] s, int length, double[][] h) {
            int from = (length - 1) / SHORT * SHORT;
            shortPolynomial(s, from, length, h);
            while (from > 0) {
                raise();
                from -= SHORT;
                shortPolynomial(s, from, from + SHORT, part);
                product(h[0], h[1], power[0], power[1], h[0], h[1], size);
                for (int f = 0; f < size; f++) {
                    h[0][f] += part[0][f];
                    h[1][f] += part[1][f];
                }
            }
        }

        private void raise() {
            if (!raised) {
                for (int f = 0; f < size; f++) {
                    power[0][f] = 1 - re[f];
                    power[1][f] = -im[f];
                }
                for (int squares = 1; squares < SHORT; squares *= 2) {
                    product(power[0], power[1], power[0], power[1], power[0], power[1], size);
                }
                raised = true;
            }
        }

        /** Σ_{from ≤ n &lt; end} s_n φ^(n − from). */
        private void shortPolynomial(double[] s, int from, int end, double[][] h) {
            Arrays.fill(b, 0, size, 0);
            Arrays.fill(c, 0, size, 0);
            int n = end - 1;
            for (; n >= from + 4; n -= 4) {
                fourSteps(s[n], s[n - 1], s[n - 2], s[n - 3]);
            }
            for (; n > from; n--) {
                step(s[n]);
            }
            finish(s[from], h[0], h[1]);
        }

        private void step(double s) {
            for (int f = 0; f < size; f++) {
                double next = Math.fma(twice[f], b[f], Math.fma(-square[f], c[f], s));
                c[f] = b[f];
                b[f] = next;
            }
        }

        /** Four steps at once: the arithmetic, not the memory, then sets the pace. */
        private void fourSteps(double s0, double s1, double s2, double s3) {
            for (int f = 0; f < size; f++) {
                double t = twice[f];
                double q = -square[f];
                double b0 = b[f];
                double b1 = Math.fma(t, b0, Math.fma(q, c[f], s0));
                double b2 = Math.fma(t, b1, Math.fma(q, b0, s1));
                double b3 = Math.fma(t, b2, Math.fma(q, b1, s2));
                b[f] = Math.fma(t, b3, Math.fma(q, b2, s3));
                c[f] = b3;
            }
        }

        private void finish(double s, double[] hr, double[] hi) {
            for (int f = 0; f < size; f++) {
                hr[f] = Math.fma(1 - re[f], b[f], Math.fma(-square[f], c[f], s));
                hi[f] = -im[f] * b[f];
            }
        }
    }

    /**
     * Joins one peril's counts to what is there: r ← r + x − r·x, x = w·h.
     *
     * @param h to work in
     * @param r {real, imaginary} × frequency of the block, 0 where nothing is there yet
     */
    static void join(double[] survival, Points points, double[][] h, double[][] r, int size) {
        if (survival.length > 0) {
            points.polynomial(survival, survival.length, h);
            join(points, h, r, size, false);
        }
    }

    /** The same for a deficit x + iy. */
    static void join(double[] x, double[] y, double[][] r, int size) {
        double[] rr = r[0];
        double[] ri = r[1];
        for (int f = 0; f < size; f++) {
            double a = rr[f];
            double b = ri[f];
            rr[f] = a + x[f] - (a * x[f] - b * y[f]);
            ri[f] = b + y[f] - (a * y[f] + b * x[f]);
        }
    }

    /** x = w·h; r ← r + x − r·x, or x at first. */
    private static void join(Points w, double[][] h, double[][] r, int size, boolean first) {
        if (first) {
            product(w.re, w.im, h[0], h[1], r[0], r[1], size);
        } else {
            product(w.re, w.im, h[0], h[1], h[0], h[1], size);
            join(h[0], h[1], r, size);
        }
    }

    private static void product(double[] a, double[] b, double[] c, double[] d, double[] re, double[] im, int size) {
        for (int f = 0; f < size; f++) {
            double x = a[f] * c[f] - b[f] * d[f];
            double y = a[f] * d[f] + b[f] * c[f];
            re[f] = x;
            im[f] = y;
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
