package layerweft.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;

/**
 * An entry of {@code published-checks.json}: values printed in a book, paper, examination or manual, with the number of decimals printed,
 * and the same values recomputed independently of this program (Python with SciPy).
 *
 * @param id of the entry
 * @param entry the whole of it, source included
 */
record PublishedCheck(String id, JsonNode entry) {

    static PublishedCheck of(String id) {
        try {
            for (JsonNode entry : new ObjectMapper().readTree(PublishedCheck.class.getResource("/reference/published-checks.json"))) {
                if (entry.get("id").asText().equals(id)) {
                    return new PublishedCheck(id, entry);
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        throw new IllegalArgumentException("no published check " + id);
    }

    /** To every printed digit: within half a unit of the last printed place. */
    PublishedCheck printed(String label, double... values) {
        JsonNode printed = entry.get("printed").get(label);
        double half = 0.5 * Math.pow(10, -printed.get("decimals").asInt()) * (1 + 1e-6);
        compare(label, printed.get("value"), values, v -> half);
        return this;
    }

    /** Against the independent recomputation, to a relative tolerance: where nothing is printed, or what is printed is a slip. */
    PublishedCheck recomputed(String label, double relative, double... values) {
        compare(label, entry.get("recomputed").get(label), values, v -> relative * Math.abs(v));
        return this;
    }

    /** A single printed number. */
    double printed(String label) {
        return entry.get("printed").get(label).get("value").doubleValue();
    }

    /** A single recomputed number. */
    double recomputed(String label) {
        return entry.get("recomputed").get(label).doubleValue();
    }

    private void compare(String label, JsonNode expected, double[] values, java.util.function.DoubleUnaryOperator allowed) {
        assertEquals(expected.isArray() ? expected.size() : 1, values.length, () -> id + ", " + label + ": how many values");
        for (int k = 0; k < values.length; k++) {
            double value = expected.isArray() ? expected.get(k).doubleValue() : expected.doubleValue();
            int at = k;
            assertEquals(value, values[k], Math.max(Double.MIN_VALUE, allowed.applyAsDouble(value)), () -> id + ", " + label + " " + at + ": " + entry.get("source"));
        }
    }
}
