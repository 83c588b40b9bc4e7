package layerweft.report;

import layerweft.figures.Figure;
import layerweft.figures.FigureText;

/** A cell of a table. */
public sealed interface Cell {

    /** As read: the value alone. */
    String text();

    /** As read, the error with its sign; empty where there is none. */
    default String error() {
        return "";
    }

    /** Text, never a number or a formula. */
    record Words(String text) implements Cell {
        public Words {
            text = Letters.admissible(text);
        }
    }

    /** How a number is written. */
    enum Form {
        /** An amount, a count, a ratio: digits follow the error. */
        NUMBER,
        /** A fraction, shown as a percentage. */
        PERCENT,
        /** A number that a person has agreed, with the digits given. */
        AGREED,
        /** A fraction that a person has agreed, as a percentage with the digits given. */
        AGREED_PERCENT,
        /** A chance a year, shown as the years between two of its events. */
        ONE_IN
    }

    /** A number with its error. */
    record Number(Figure figure, Form form) implements Cell {
        /** Where no error can be given, less than this is what rounding leaves of a 0. */
        private static final double ROUNDING = 1e-12;

        public Number {
            if (Double.isInfinite(figure.error()) && Math.abs(figure.value()) < ROUNDING) {
                figure = new Figure(0, figure.error());
            }
        }

        @Override
        public String text() {
            if (!figure.defined() || figure.infinite()) {
                return FigureText.value(figure);
            }
            return switch (form) {
                case NUMBER -> minus(FigureText.value(figure));
                case PERCENT -> minus(FigureText.percent(figure));
                case AGREED -> minus(FigureText.groupedPlain(figure.value()));
                case AGREED_PERCENT -> FigureText.plainPercent(figure.value());
                case ONE_IN -> FigureText.oneIn(figure);
            };
        }

        @Override
        public String error() {
            return switch (form) {
                case NUMBER -> FigureText.error(figure);
                case PERCENT -> FigureText.percentError(figure);
                case AGREED, AGREED_PERCENT, ONE_IN -> "";
            };
        }

        /** A true minus. */
        private static String minus(String text) {
            return text.replace('-', '−');
        }
    }

    static Cell words(String text) {
        return new Words(text);
    }

    static Cell number(Figure figure) {
        return new Number(figure, Form.NUMBER);
    }

    static Cell percent(Figure fraction) {
        return new Number(fraction, Form.PERCENT);
    }

    static Cell agreed(double value) {
        return new Number(Figure.exact(value), Form.AGREED);
    }

    static Cell agreedPercent(double fraction) {
        return new Number(Figure.exact(fraction), Form.AGREED_PERCENT);
    }

    static Cell oneIn(Figure chance) {
        return new Number(chance, Form.ONE_IN);
    }
}
