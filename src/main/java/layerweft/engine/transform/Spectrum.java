package layerweft.engine.transform;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.jtransforms.fft.DoubleFFT_1D;
import org.jtransforms.utils.CommonUtils;

/**
 * Lattice laws and their transforms, as survival functions: with z = e^(−tilt − 2πij/n), 1 − E[z^K] = (1 − z)·Σ_k P(K &gt; k) z^k. The
 * deficit 1 − E[z^K] keeps its digits however rare a loss is. The tilt damps what wraps around (Grübel &amp; Hermesmeier 1999,
 * "Computation of compound distributions I: aliasing errors and exponential tilting").
 *
 * @param length n, even
 * @param tilt per cell
 */
record Spectrum(int length, double tilt) {
    private static final Map<Integer, DoubleFFT_1D> PLANS = new ConcurrentHashMap<>();

    static {
        // an engine stays on its caller's thread
        CommonUtils.setThreadsBeginN_1D_FFT_2Threads(Long.MAX_VALUE);
        CommonUtils.setThreadsBeginN_1D_FFT_4Threads(Long.MAX_VALUE);
    }

    /** Frequencies 0..n/2. */
    int frequencies() {
        return length / 2 + 1;
    }

    /** The deficit 1 − E[z^K] at every frequency, {real, imaginary}, of a law with P(K &gt; k) = survival[k] and 0 beyond. */
    double[][] deficit(double[] survival) {
        double[] a = new double[length];
        for (int k = 0; k < survival.length; k++) {
            // the law may be longer than the transform: what wraps carries its own factor
            a[k % length] += survival[k] * Math.exp(-tilt * k);
        }
        plan().realForward(a);
        double[][] out = unpacked(a);
        for (int j = 0; j < frequencies(); j++) {
            double re = 1 - zRe(j);
            double im = -zIm(j);
            double x = out[0][j];
            double y = out[1][j];
            out[0][j] = re * x - im * y;
            out[1][j] = re * y + im * x;
        }
        return out;
    }

    /** The survival function P(K &gt; k), k = 0..count−1, of a deficit; the arrays are used up. */
    double[] survival(double[] re, double[] im, int count) {
        double[] a = new double[length];
        for (int j = 0; j < frequencies(); j++) {
            double p = 1 - zRe(j);
            double q = -zIm(j);
            double norm = p * p + q * q;
            double x = (re[j] * p + im[j] * q) / norm;
            double y = (im[j] * p - re[j] * q) / norm;
            if (j == 0) {
                a[0] = x;
            } else if (j == length / 2) {
                a[1] = x;
            } else {
                a[2 * j] = x;
                a[2 * j + 1] = y;
            }
        }
        plan().realInverse(a, true);
        double[] survival = new double[count];
        for (int k = 0; k < count; k++) {
            survival[k] = a[k] * Math.exp(tilt * k);
        }
        return survival;
    }

    double zRe(int j) {
        return Math.exp(-tilt) * Math.cos(2 * Math.PI * j / length);
    }

    double zIm(int j) {
        return -Math.exp(-tilt) * Math.sin(2 * Math.PI * j / length);
    }

    private double[][] unpacked(double[] a) {
        double[][] out = new double[2][frequencies()];
        out[0][0] = a[0];
        out[0][length / 2] = a[1];
        for (int j = 1; j < length / 2; j++) {
            out[0][j] = a[2 * j];
            out[1][j] = a[2 * j + 1];
        }
        return out;
    }

    private DoubleFFT_1D plan() {
        return PLANS.computeIfAbsent(length, DoubleFFT_1D::new);
    }

    /** The next even length of at least n that factors into 2, 3 and 5. */
    static int goodLength(int n) {
        for (int m = Math.max(4, n + (n & 1));; m += 2) {
            int rest = m;
            for (int f : new int[] {2, 3, 5}) {
                while (rest % f == 0) {
                    rest /= f;
                }
            }
            if (rest == 1) {
                return m;
            }
        }
    }
}
