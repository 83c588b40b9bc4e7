package layerweft.file;

/** Single values: types are taken as they stand, nothing is converted. */
final class Scalars {
    static final TwoWay<Double> NUMBER = TwoWay.of(FieldType.NUMBER, (node, path, faults) -> {
        if (!(node instanceof Node.Decimal number)) {
            faults.wrongType(node, path, "a number");
            return null;
        }
        if (Double.isInfinite(number.value())) {
            faults.wrongType(node, path, "a number within the range of double precision, up to 1.7e308");
            return null;
        }
        return number.value();
    }, value -> value);

    static final TwoWay<Integer> INTEGER = TwoWay.of(FieldType.WHOLE_NUMBER, (node, path, faults) -> {
        if (!(node instanceof Node.Decimal number) || number.value() != (int) number.value()) {
            faults.wrongType(node, path, "a whole number, at most " + Integer.MAX_VALUE + " in size");
            return null;
        }
        return (int) number.value();
    }, value -> value);

    static final TwoWay<Boolean> TRUTH = TwoWay.of(FieldType.TRUTH, (node, path, faults) -> {
        if (!(node instanceof Node.Truth truth)) {
            faults.wrongType(node, path, "true or false");
            return null;
        }
        return truth.value();
    }, value -> value);

    /** A name or label: short enough to show, without characters that a terminal would act on. */
    static final TwoWay<String> TEXT = TwoWay.of(FieldType.TEXT, (node, path, faults) -> {
        if (!(node instanceof Node.Text text)) {
            faults.wrongType(node, path, "a text in double quotes");
            return null;
        }
        if (text.text().length() > Limits.TEXT || !text.text().codePoints().allMatch(Excerpt::isPrintable)) {
            faults.wrongType(node, path, "a text of at most " + Limits.TEXT + " characters, without control characters");
            return null;
        }
        return text.text();
    }, value -> value);

    private Scalars() {}

    /** Exactly this text. */
    static TwoWay<String> constant(String expected) {
        return TwoWay.of(FieldType.TEXT, (node, path, faults) -> {
            if (!(node instanceof Node.Text text) || !text.text().equals(expected)) {
                faults.wrongType(node, path, Excerpt.quoted(expected));
                return null;
            }
            return expected;
        }, value -> value);
    }
}
