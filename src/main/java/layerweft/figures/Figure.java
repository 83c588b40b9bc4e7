package layerweft.figures;

/**
 * A number with its error, both in the same unit.
 *
 * @param value may be infinite; NaN means that the figure is not defined (a loss on line without any limit)
 * @param error the standard error of a simulation or the error estimate of a deterministic engine; 0 where the value is exact;
 *     infinite where no error can be given
 */
public record Figure(double value, double error) {

    public static final Figure UNDEFINED = new Figure(Double.NaN, 0);

    public static final Figure INFINITE = new Figure(Double.POSITIVE_INFINITY, 0);

    public Figure {
        if (Double.isNaN(error)) {
            error = Double.isNaN(value) ? 0 : Double.POSITIVE_INFINITY;
        }
    }

    public static Figure exact(double value) {
        return new Figure(value, 0);
    }

    /** The figure times a factor of either sign. */
    public Figure times(double factor) {
        return Double.isInfinite(value) ? this : new Figure(value * factor, Math.abs(factor) * error);
    }

    /** The figure over a finite divisor; undefined where the divisor is infinite. */
    public Figure over(double divisor) {
        return divisor < Double.POSITIVE_INFINITY ? times(1 / divisor) : UNDEFINED;
    }

    /** The sum of two figures whose errors may go together: the errors add. */
    public Figure plus(Figure other) {
        return new Figure(value + other.value, error + other.error);
    }

    /** The difference of two figures whose errors may go together: the errors add. */
    public Figure minus(Figure other) {
        return new Figure(value - other.value, error + other.error);
    }

    public boolean infinite() {
        return Double.isInfinite(value);
    }

    public boolean defined() {
        return !Double.isNaN(value);
    }
}
