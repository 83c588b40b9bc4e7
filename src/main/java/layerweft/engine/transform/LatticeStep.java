package layerweft.engine.transform;

import java.util.Arrays;
import java.util.stream.DoubleStream;

/** The step of a layer's coarsest lattice: one that divides the amounts at which the terms bend, where they are commensurable. */
final class LatticeStep {
    private static final double SAME = 1e-9;

    private LatticeStep() {
    }

    /**
     * @param cap largest occurrence loss; always on the lattice
     * @param terms annual deductible and the sum of deductible and limit, as far as finite
     * @param landmarks amounts that are good to have on the lattice
     * @param ceiling up to where the annual sum matters
     * @param cells wanted up to the cap at least
     */
    static double of(double cap, double[] terms, double[] landmarks, double ceiling, int cells) {
        // a step finer than this costs more than kinks off the lattice do
        double finest = ceiling / (64.0 * cells);
        double step = common(DoubleStream.concat(DoubleStream.of(cap), DoubleStream.concat(Arrays.stream(terms), Arrays.stream(landmarks))).toArray(), finest);
        if (Double.isNaN(step)) {
            step = common(DoubleStream.concat(DoubleStream.of(cap), Arrays.stream(terms)).toArray(), finest);
        }
        if (Double.isNaN(step)) {
            step = cap;
        }
        double wanted = Math.min(cap / cells, ceiling / (2.5 * cells));
        return step / Math.max(1, Math.ceil(step / wanted * (1 - SAME)));
    }

    /** The largest step that divides all amounts (Euclid's algorithm on doubles), NaN where it falls below the finest. */
    static double common(double[] amounts, double finest) {
        double scale = Arrays.stream(amounts).max().orElse(0);
        double step = 0;
        for (double amount : amounts) {
            double a = Math.max(amount, step);
            double b = Math.min(amount, step);
            while (b > SAME * scale) {
                double rest = Math.abs(a - b * Math.rint(a / b));
                a = b;
                b = rest;
            }
            step = a;
        }
        return step >= finest ? amounts[0] / Math.rint(amounts[0] / step) : Double.NaN;
    }

    /** Cells from 0 to the amount; the amount need not be on the lattice. */
    static int cells(double amount, double step) {
        double x = amount / step;
        return (int) (Math.abs(x - Math.rint(x)) < 1e-7 ? Math.rint(x) : Math.ceil(x));
    }

    static boolean holds(double amount, double step) {
        double x = amount / step;
        return Math.abs(x - Math.rint(x)) < 1e-7;
    }
}
