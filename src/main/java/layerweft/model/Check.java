package layerweft.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Gathers findings on the values of one object, so that a user hears of all of them at once. Comparisons are written so that NaN
 * never passes.
 *
 * <pre>{@code
 * new Check().positive("threshold", threshold).positive("alpha", alpha).orThrow();
 * }</pre>
 */
public final class Check {
    private final List<Finding> findings = new ArrayList<>();

    /** A finding unless {@code ok}. */
    public Check that(boolean ok, String field, Object found, String admissible) {
        if (!ok) {
            findings.add(new Finding(field, show(found), admissible));
        }
        return this;
    }

    /** Finite and above 0. */
    public Check positive(String field, double value) {
        return that(value > 0 && value < Double.POSITIVE_INFINITY, field, value, "a finite number above 0");
    }

    /** Finite and at least 0. */
    public Check notNegative(String field, double value) {
        return that(value >= 0 && value < Double.POSITIVE_INFINITY, field, value, "a finite number of at least 0");
    }

    /** Above 0, infinity allowed (a limit that may be absent). */
    public Check positiveOrInfinite(String field, double value) {
        return that(value > 0, field, value, "a number above 0");
    }

    public Check finite(String field, double value) {
        return that(Double.isFinite(value), field, value, "a finite number");
    }

    /** Within [low, high]. */
    public Check within(String field, double value, double low, double high) {
        return that(value >= low && value <= high, field, value, "from " + show(low) + " to " + show(high));
    }

    /** Strictly between low and high. */
    public Check between(String field, double value, double low, double high) {
        return that(value > low && value < high, field, value,
                "above " + show(low) + (high == Double.POSITIVE_INFINITY ? ", finite" : " and below " + show(high)));
    }

    /** A name that a person and a file can use: not blank. */
    public Check name(String field, String value) {
        return that(value != null && !value.isBlank(), field, value == null ? "nothing" : "\"" + value + "\"", "a name that is not blank");
    }

    /** Takes over findings on a part of the object, below the given field. */
    public Check within(String field, InadmissibleException part) {
        for (Finding f : part.findings()) {
            boolean joined = field.isEmpty() || f.field().isEmpty() || f.field().startsWith("[");
            String path = field + (joined ? "" : ".") + f.field();
            findings.add(new Finding(path, f.found(), f.admissible()));
        }
        return this;
    }

    public boolean clean() {
        return findings.isEmpty();
    }

    /** @throws InadmissibleException with all findings, if there are any */
    public void orThrow() {
        if (!findings.isEmpty()) {
            throw new InadmissibleException(findings);
        }
    }

    private static String show(Object value) {
        if (value instanceof Double d) {
            return d == Math.rint(d) && Math.abs(d) < 1e15 ? String.format(Locale.ROOT, "%.0f", d) : Double.toString(d);
        }
        return String.valueOf(value);
    }
}
