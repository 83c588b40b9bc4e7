package layerweft.engine.transform;

import java.util.Arrays;

/**
 * The annual sum A of a layer on one lattice: averages of P(A &gt; y) over the cells, and beside them the atoms of A, which are exact.
 *
 * @param step h, in money
 * @param mean averages of P(A &gt; y) over [kh, (k+1)h), of the law with mass spread
 * @param atomStep distance of the places where atoms can be, a multiple of h
 * @param atomSurvival P(A &gt; k·atomStep, A an atom), k = 0, 1, …, as far as the cells go
 * @param noise bound of rounding and wrap-around in any of the means
 */
record LatticeSum(double step, double[] mean, double atomStep, double[] atomSurvival, double noise) {

    /** P(A &gt; y, A one of the atoms). */
    private double atomsAbove(double y) {
        int k = (int) Math.floor(y / atomStep + 1e-7);
        return atomSurvival[Math.min(k, atomSurvival.length - 1)];
    }

    /** P(A = y) of an atom above 0. */
    double atom(double y) {
        double x = y / atomStep;
        int k = (int) Math.rint(x);
        boolean known = k >= 1 && k < atomSurvival.length && Math.abs(x - k) < 1e-7;
        return known ? Math.max(0, atomSurvival[k - 1] - atomSurvival[k]) : 0;
    }

    /** Averages of the survival function over the cells without the atoms. */
    double[] continuous() {
        double[] c = mean.clone();
        for (int cell = 0; cell < c.length; cell++) {
            c[cell] = Math.max(0, c[cell] - atomsAbove((cell + 0.5) * step));
        }
        return c;
    }

    /**
     * This sum with the second-order error of the lattice taken off its averages, as the sum on a lattice of twice the step shows it:
     * what point values are read from.
     */
    LatticeSum corrected(LatticeSum coarser) {
        double[] better = mean.clone();
        for (int c = 0; c < coarser.mean.length && 2 * c + 1 < better.length; c++) {
            double change = (0.5 * (mean[2 * c] + mean[2 * c + 1]) - coarser.mean[c]) / 3;
            better[2 * c] += change;
            better[2 * c + 1] += change;
        }
        for (int k = 0; k < better.length; k++) {
            better[k] = Math.max(0, k == 0 ? better[k] : Math.min(better[k], better[k - 1]));
        }
        return new LatticeSum(step, better, atomStep, atomSurvival, noise);
    }

    /** P(A &gt; y) at a point of the lattice, from cells above only (the function bends at the terms). */
    double survivalFromAbove(double y, double[] continuous) {
        int k = (int) Math.rint(y / step);
        if (!LatticeStep.holds(y, step) || k + 3 >= continuous.length) {
            return at(y, continuous) + atomsAbove(y);
        }
        double value = (25 * continuous[k] - 23 * continuous[k + 1] + 13 * continuous[k + 2] - 3 * continuous[k + 3]) / 12;
        double most = k > 0 ? continuous[k - 1] : 1;
        return Math.min(most, Math.max(continuous[k], value)) + atomsAbove(y);
    }

    /** P(A ≥ y) at a point of the lattice, from cells below only. */
    double reachesFromBelow(double y, double[] continuous) {
        int k = (int) Math.rint(y / step);
        if (!LatticeStep.holds(y, step) || k < 4) {
            return at(y, continuous) + atomsAbove(y) + atom(y);
        }
        double value = (25 * continuous[k - 1] - 23 * continuous[k - 2] + 13 * continuous[k - 3] - 3 * continuous[k - 4]) / 12;
        double least = k < continuous.length ? continuous[k] : 0;
        return Math.max(least, Math.min(continuous[k - 1], value)) + atomsAbove(y) + atom(y);
    }

    /** The continuous part of the survival function, linear between the middles of the cells. */
    private double at(double y, double[] continuous) {
        double x = y / step - 0.5;
        int k = (int) Math.floor(x);
        double left = continuous[Math.max(0, Math.min(k, continuous.length - 1))];
        double right = continuous[Math.max(0, Math.min(k + 1, continuous.length - 1))];
        return left + (right - left) * (x - k);
    }

    /** E[min(A, y)]; inside a cell by a parabola with the averages of three cells. */
    double limited(double y) {
        int k = Math.min((int) Math.floor(y / step + 1e-7), mean.length - 1);
        double sum = 0;
        for (int j = k - 1; j >= 0; j--) {
            sum += mean[j];
        }
        double s = Math.max(0, y / step - k);
        if (s < 1e-7) {
            return sum * step;
        }
        double here = mean[k];
        boolean edge = k == 0 || k + 1 == mean.length;
        double slope = edge ? 0 : 0.5 * (mean[k + 1] - mean[k - 1]);
        double bend = edge ? 0 : 0.5 * (mean[k + 1] - 2 * here + mean[k - 1]);
        // ∫ over [0, s] of the parabola a + b(x − ½) + c((x − ½)² − 1/12)
        double part = here * s + slope * 0.5 * (s * s - s) + bend * ((Math.pow(s - 0.5, 3) + 0.125) / 3 - s / 12);
        return step * (sum + part);
    }

    /** The layer's law on [D, D + M]: bounds of its pieces and the average of P(A &gt; y) over each. */
    Pieces pieces(double deductible, double end) {
        int first = (int) Math.floor(deductible / step + 1e-7);
        int last = LatticeStep.cells(end, step);
        double[] bounds = new double[last - first + 1];
        double[] average = new double[last - first];
        bounds[0] = deductible;
        for (int k = first; k < last; k++) {
            double to = k + 1 == last ? end : (k + 1) * step;
            double from = bounds[k - first];
            bounds[k - first + 1] = to;
            boolean whole = to - from > step * (1 - 1e-7);
            average[k - first] = whole ? mean[k] : (limited(to) - limited(from)) / (to - from);
        }
        return new Pieces(bounds, average);
    }

    /**
     * Part of a law of A.
     *
     * @param bounds rising, in money of A
     * @param average of P(A &gt; y) between neighbouring bounds
     */
    record Pieces(double[] bounds, double[] average) {

        /** ∫ P(A &gt; y) dy. */
        double integral() {
            double sum = 0;
            for (int k = average.length - 1; k >= 0; k--) {
                sum += average[k] * (bounds[k + 1] - bounds[k]);
            }
            return sum;
        }

        /** ∫ 2(y − start) P(A &gt; y) dy. */
        double secondMoment() {
            double sum = 0;
            for (int k = average.length - 1; k >= 0; k--) {
                double middle = 0.5 * (bounds[k] + bounds[k + 1]) - bounds[0];
                sum += 2 * middle * average[k] * (bounds[k + 1] - bounds[k]);
            }
            return sum;
        }

        double[] lengths() {
            double[] lengths = new double[average.length];
            Arrays.setAll(lengths, k -> bounds[k + 1] - bounds[k]);
            return lengths;
        }
    }
}
