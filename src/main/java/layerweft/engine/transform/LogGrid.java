package layerweft.engine.transform;

import java.util.function.DoubleUnaryOperator;

/**
 * A grid on the line for the trapezoidal rule in ζ(y) = (y − c)/step + density·asinh((y − c)/width): even steps far from the centre c,
 * and, where the integrand has a narrow core, steps of about width/density there.
 */
record LogGrid(double centre, double step, double width, double density) {

    static LogGrid even(double centre, double step) {
        return new LogGrid(centre, step, 1, 0);
    }

    static LogGrid dense(double centre, double step, double width, double density) {
        return new LogGrid(centre, step, width, density);
    }

    /** The rule for ∫ f(y)·density(y) dy from low to high, its weights with the density in them. */
    FrailtyRule rule(DoubleUnaryOperator weight, double low, double high) {
        int first = (int) Math.floor(zeta(low - centre));
        int last = Math.max(first, (int) Math.ceil(zeta(high - centre)));
        double[] logs = new double[last - first + 1];
        double[] weights = new double[logs.length];
        for (int k = 0; k < logs.length; k++) {
            double x = inverse(first + k);
            logs[k] = centre + x;
            weights[k] = weight.applyAsDouble(centre + x) / slope(x);
        }
        return new FrailtyRule(logs, weights);
    }

    private double zeta(double x) {
        double r = Math.abs(x) / width;
        return x / step + (density == 0 ? 0 : Math.signum(x) * density * Math.log(r + Math.sqrt(r * r + 1)));
    }

    private double slope(double x) {
        return 1 / step + (density == 0 ? 0 : density / Math.sqrt(x * x + width * width));
    }

    /** Newton's method from 0, monotone because ζ is odd and concave above 0. */
    private double inverse(int target) {
        if (density == 0) {
            return target * step;
        }
        double goal = Math.abs(target);
        double x = 0;
        for (int round = 0; round < 60; round++) {
            double change = (goal - zeta(x)) / slope(x);
            x += change;
            if (Math.abs(change) <= 1e-14 * (x + width)) {
                break;
            }
        }
        return target < 0 ? -x : x;
    }
}
