package layerweft.command;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleFunction;
import layerweft.figures.FigureText;

/** Curves over one axis in the characters of a terminal: a letter for each curve, {@code *} where several share a place. */
final class LineChart {
    private static final int WIDTH = 60;
    private static final int HEIGHT = 12;

    /** @param x rising, at least two; {@code y} of the same length, NaN where there is no point */
    private record Curve(String name, char letter, double[] x, double[] y) {}

    private final String yTitle;
    private final String xTitle;
    private final DoubleFunction<String> yLabel;
    private final List<Curve> curves = new ArrayList<>();
    private double level = Double.NaN;
    private String levelName = "";

    LineChart(String xTitle, String yTitle, DoubleFunction<String> yLabel) {
        this.xTitle = xTitle;
        this.yTitle = yTitle;
        this.yLabel = yLabel;
    }

    LineChart curve(String name, double[] x, double[] y) {
        curves.add(new Curve(name, letter(name), x, y));
        return this;
    }

    /** A level line across the chart, where it is finite. */
    LineChart level(String name, double value) {
        levelName = name;
        level = value;
        return this;
    }

    /** The first letter of the name that no other curve has. */
    private char letter(String name) {
        String used = curves.stream().map(c -> String.valueOf(c.letter)).reduce("", String::concat);
        return (char) (name + "abcdefghijklmnopqrstuvwxyz").chars().filter(Character::isLetter).map(Character::toUpperCase)
                .filter(c -> used.indexOf(c) < 0).findFirst().orElse('+');
    }

    @Override
    public String toString() {
        double left = curves.stream().mapToDouble(c -> c.x[0]).min().orElse(0);
        double right = curves.stream().mapToDouble(c -> c.x[c.x.length - 1]).max().orElse(1);
        double low = bound(-1);
        double high = bound(1);
        if (!(right > left) || !(high > low)) {
            return "";
        }
        char[][] cells = new char[HEIGHT][WIDTH];
        for (char[] row : cells) {
            Arrays.fill(row, ' ');
        }
        if (Double.isFinite(level)) {
            Arrays.fill(cells[row(level, low, high)], '┄');
        }
        for (Curve curve : curves) {
            for (int c = 0; c < WIDTH; c++) {
                double y = at(curve, left + (right - left) * c / (WIDTH - 1));
                if (Double.isFinite(y)) {
                    char[] row = cells[row(y, low, high)];
                    row[c] = row[c] == ' ' || row[c] == '┄' ? curve.letter : '*';
                }
            }
        }
        return frame(cells, low, high, left, right);
    }

    /** The end of the vertical axis: the lowest (−1) or the highest (1) of what is drawn. */
    private double bound(int side) {
        double bound = Double.NEGATIVE_INFINITY;
        for (Curve curve : curves) {
            for (double y : curve.y) {
                bound = Double.isFinite(y) ? Math.max(bound, side * y) : bound;
            }
        }
        return side * (Double.isFinite(level) ? Math.max(bound, side * level) : bound);
    }

    private static int row(double y, double low, double high) {
        return (int) Math.round((high - y) / (high - low) * (HEIGHT - 1));
    }

    /** Straight between the points; NaN outside them. */
    private static double at(Curve curve, double x) {
        double margin = 1e-9;
        for (int k = 1; k < curve.x.length; k++) {
            if (x >= curve.x[k - 1] - margin && x <= curve.x[k] + margin) {
                return curve.y[k - 1] + (curve.y[k] - curve.y[k - 1]) * (x - curve.x[k - 1]) / (curve.x[k] - curve.x[k - 1]);
            }
        }
        return Double.NaN;
    }

    private String frame(char[][] cells, double low, double high, double left, double right) {
        String[] labels = {yLabel.apply(high), yLabel.apply((low + high) / 2), yLabel.apply(low)};
        int margin = Arrays.stream(labels).mapToInt(String::length).max().orElse(0);
        StringBuilder text = new StringBuilder(yTitle).append('\n');
        for (int r = 0; r < HEIGHT; r++) {
            String label = r == 0 ? labels[0] : r == HEIGHT / 2 ? labels[1] : r == HEIGHT - 1 ? labels[2] : "";
            text.append(" ".repeat(margin - label.length())).append(label).append(label.isEmpty() ? " │" : " ┤");
            text.append(new String(cells[r]).stripTrailing()).append('\n');
        }
        text.append(" ".repeat(margin)).append(" └").append("─".repeat(WIDTH)).append('\n');
        String from = FigureText.plain(left);
        String to = FigureText.plain(right);
        int gap = WIDTH - from.length() - to.length() - xTitle.length();
        text.append(" ".repeat(margin + 2)).append(from).append(" ".repeat(Math.max(1, gap / 2))).append(xTitle)
                .append(" ".repeat(Math.max(1, gap - gap / 2))).append(to).append('\n');
        text.append(" ".repeat(margin + 2));
        curves.forEach(c -> text.append(c.letter).append(' ').append(c.name).append("  "));
        text.append(Double.isFinite(level) ? "┄ " + levelName + "  " : "").append("* several").append('\n');
        return text.toString();
    }
}
