package layerweft.file;

/** Readings of single values: types are taken as they stand, nothing is converted. */
final class Scalars {
    static final Reading<Double> NUMBER = (node, path, faults) -> {
        if (!(node instanceof Node.Decimal number)) {
            faults.wrongType(node, path, "a number");
            return null;
        }
        if (Double.isInfinite(number.value())) {
            faults.wrongType(node, path, "a number within the range of double precision, up to 1.7e308");
            return null;
        }
        return number.value();
    };

    static final Reading<Integer> INTEGER = (node, path, faults) -> {
        if (!(node instanceof Node.Decimal number) || number.value() != (int) number.value()) {
            faults.wrongType(node, path, "a whole number, at most " + Integer.MAX_VALUE + " in size");
            return null;
        }
        return (int) number.value();
    };

    static final Reading<Boolean> TRUTH = (node, path, faults) -> {
        if (!(node instanceof Node.Truth truth)) {
            faults.wrongType(node, path, "true or false");
            return null;
        }
        return truth.value();
    };

    /** A name or label: short enough to show, without characters that a terminal would act on. */
    static final Reading<String> TEXT = (node, path, faults) -> {
        if (!(node instanceof Node.Text text)) {
            faults.wrongType(node, path, "a text in double quotes");
            return null;
        }
        if (text.text().length() > Limits.TEXT || !text.text().codePoints().allMatch(Excerpt::isPrintable)) {
            faults.wrongType(node, path, "a text of at most " + Limits.TEXT + " characters, without control characters");
            return null;
        }
        return text.text();
    };

    private Scalars() {}

    /** Exactly this text. */
    static Reading<String> constant(String expected) {
        return (node, path, faults) -> {
            if (!(node instanceof Node.Text text) || !text.text().equals(expected)) {
                faults.wrongType(node, path, Excerpt.quoted(expected));
                return null;
            }
            return expected;
        };
    }
}
