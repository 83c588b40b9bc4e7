package layerweft.engine.transform;

import layerweft.figures.Figure;

/**
 * Richardson's extrapolation of a figure computed on lattices of step h, h/2, h/4, whose error is of second order. The error stated is
 * the change by the last extrapolation where the three values fall in place as a second-order error does, and the change between the
 * finest lattices where they do not.
 */
final class Extrapolation {

    private Extrapolation() {
    }

    static Figure of(double coarse, double middle, double fine) {
        if (fine == middle || !Double.isFinite(coarse + middle + fine)) {
            return new Figure(fine, fine == middle ? 0 : Double.POSITIVE_INFINITY);
        }
        double first = (4 * middle - coarse) / 3;
        double second = (4 * fine - middle) / 3;
        double ratio = (middle - coarse) / (fine - middle);
        double change = Math.abs(second - first);
        boolean regular = ratio > 2 && ratio < 8 && change < 0.5 * Math.abs(fine - middle);
        if (regular) {
            return new Figure(second, change);
        }
        double spread = Math.max(Math.abs(fine - middle), Math.abs(middle - coarse) / 4);
        return new Figure(fine, spread);
    }
}
