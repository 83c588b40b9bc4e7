package layerweft.engine.transform;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.jtransforms.fft.DoubleFFT_1D;
import org.jtransforms.utils.CommonUtils;

/**
 * Lattice laws and their transforms, as survival functions: with z = e^(−tilt − 2πij/n), 1 − E[z^K] = (1 − z)·Σ_k P(K &gt; k) z^k. The
 * deficit 1 − E[z^K] keeps its digits however rare a loss is. The tilt damps what wraps around (Grübel &amp; Hermesmeier 1999,
 * "Computation of compound distributions I: aliasing errors and exponential tilting").
 */
final class Spectrum {
    private static final Map<Integer, DoubleFFT_1D> PLANS = new ConcurrentHashMap<>();

    static {
        // an engine stays on its caller's thread
        CommonUtils.setThreadsBeginN_1D_FFT_2Threads(Long.MAX_VALUE);
        CommonUtils.setThreadsBeginN_1D_FFT_4Threads(Long.MAX_VALUE);
    }

    private final int length;
    private final double tilt;
    private final DoubleFFT_1D plan;
    /** 1 − z at every frequency. */
    private final double[] re;
    private final double[] im;
    /** e^(−tilt·k). */
    private final double[] damping;

    /**
     * @param length n, even
     * @param tilt per cell
     */
    Spectrum(int length, double tilt) {
        this.length = length;
        this.tilt = tilt;
        plan = PLANS.computeIfAbsent(length, DoubleFFT_1D::new);
        re = new double[frequencies()];
        im = new double[frequencies()];
        for (int j = 0; j < re.length; j++) {
            re[j] = 1 - Math.exp(-tilt) * Math.cos(2 * Math.PI * j / length);
            im[j] = Math.exp(-tilt) * Math.sin(2 * Math.PI * j / length);
        }
        damping = new double[length];
        for (int k = 0; k < length; k++) {
            damping[k] = Math.exp(-tilt * k);
        }
    }

    int length() {
        return length;
    }

    double tilt() {
        return tilt;
    }

    /** Frequencies 0..n/2. */
    int frequencies() {
        return length / 2 + 1;
    }

    /** The deficit 1 − E[z^K] at every frequency, {real, imaginary}, of a law with P(K &gt; k) = survival[k] and 0 beyond its end. */
    double[][] deficit(double[] survival) {
        double[] a = new double[length];
        for (int k = 0; k < survival.length; k++) {
            // the law may be longer than the transform: what wraps carries its own factor
            a[k % length] += survival[k] * (k < length ? damping[k] : Math.exp(-tilt * k));
        }
        plan.realForward(a);
        double[][] out = unpacked(a);
        for (int j = 0; j < re.length; j++) {
            double x = out[0][j];
            double y = out[1][j];
            out[0][j] = re[j] * x - im[j] * y;
            out[1][j] = re[j] * y + im[j] * x;
        }
        return out;
    }

    /** The survival function P(K &gt; k), k = 0..count−1 ≤ n − 1, of a deficit. */
    double[] survival(double[] deficitRe, double[] deficitIm, int count) {
        double[] a = new double[length];
        for (int j = 0; j < re.length; j++) {
            double norm = re[j] * re[j] + im[j] * im[j];
            double x = (deficitRe[j] * re[j] + deficitIm[j] * im[j]) / norm;
            double y = (deficitIm[j] * re[j] - deficitRe[j] * im[j]) / norm;
            if (j == 0) {
                a[0] = x;
            } else if (j == length / 2) {
                a[1] = x;
            } else {
                a[2 * j] = x;
                a[2 * j + 1] = y;
            }
        }
        plan.realInverse(a, true);
        double[] survival = new double[count];
        for (int k = 0; k < count; k++) {
            survival[k] = a[k] / damping[k];
        }
        return survival;
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
