package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/** Towers to look at and to test with; their figures are made up. */
final class TowerExamples {
    static final double NONE = Double.NaN;
    static final double INFINITE = Double.POSITIVE_INFINITY;
    static final List<String> FOUR = List.of("Windstorm", "River flood", "Hail", "Freeze");

    /** Amounts passed about once in so many years. */
    static final List<Tower.Mark> HAZE = List.of(new Tower.Mark(2, 1.01), new Tower.Mark(20, 2), new Tower.Mark(46.7, 5), new Tower.Mark(73, 10), new Tower.Mark(108, 20),
            new Tower.Mark(173, 50), new Tower.Mark(242, 100), new Tower.Mark(330, 200), new Tower.Mark(600, 1000));

    private TowerExamples() {}

    static Tower.Layer layer(String name, double limit, double retention, int reinstatements, List<Double> uses, List<Double> shares) {
        double limits = reinstatements == Tower.UNLIMITED ? INFINITE : reinstatements + 1;
        return new Tower.Layer(name, TowerText.terms(limit, retention) + (reinstatements > 0 ? ", " + reinstatements + " at 100\u2009%" : ""), false, retention, limit, NONE, 0, limits,
                reinstatements, uses, shares, uses.stream().mapToDouble(u -> u).sum(), List.of());
    }

    /** Three adjoining layers, a second-event cover below, a cover of what is left of the year. */
    static Tower five() {
        Tower.Layer frequency = new Tower.Layer("Frequency cover", "20 xs 10, year 40 xs 40", false, 10, 20, NONE, 2, 2, Tower.BY_ANNUAL_LIMIT, List.of(0.07, 0.022),
                List.of(0.55, 0.14, 0.15, 0.16), 0.0462, List.of());
        Tower.Layer stopLoss = new Tower.Layer("Whole-account stop loss", "60 xs 60 in the year", true, 60, 60, NONE, 0, 1, Tower.BY_ANNUAL_LIMIT, List.of(0.149),
                List.of(0.6, 0.2, 0.1, 0.1), 0.149, List.of(0, 1, 2, 3));
        return new Tower(FOUR, List.of(
                layer("First cat", 30, 30, 2, List.of(0.226, 0.033, 0.004), List.of(0.68, 0.11, 0.12, 0.09)),
                layer("Second cat", 90, 60, 1, List.of(0.063, 0.002), List.of(0.78, 0.12, 0.07, 0.03)),
                layer("Third cat", 150, 150, 1, List.of(0.013, 0.0001), List.of(0.83, 0.17, NONE, NONE)),
                frequency, stopLoss), HAZE);
    }

    /** Side by side, thin, without end, without a limit, with a broken deductible. */
    static Tower odd() {
        List<Double> shares = List.of(0.5, 0.3, 0.15, 0.05);
        Tower.Layer broken = new Tower.Layer("Aggregate with a broken deductible", "50 xs 100, year 75 xs 80", false, 100, 50, NONE, 1.6, 1.5, Tower.BY_ANNUAL_LIMIT,
                List.of(0.04, 0.004), shares, 0.044, List.of(1));
        Tower.Layer top = new Tower.Layer("Top, unlimited", "unlimited xs 300", false, 300, INFINITE, NONE, 0, 1, Tower.BY_ANNUAL_LIMIT, List.of(), List.of(0.9, 0.1, NONE, NONE), NONE,
                List.of());
        return new Tower(FOUR, List.of(
                layer("Working layer with a name that goes on for long", 40, 10, Tower.UNLIMITED, List.of(0.3, 0.1, 0.03, 0.01), shares),
                layer("Wide one beside it", 150, 20, 0, List.of(0.12), List.of(0.4, NONE, 0.3, 0.3)),
                broken,
                layer("Thin", 2, 200, 1, List.of(0.07, 0.02), shares), layer("Low", 8, 210, 3, List.of(0.05, 0.01, 0.002, 0.0004), shares), top,
                layer("Hair", 0.5, 230, 0, List.of(0.012), shares)), HAZE);
    }

    static Tower perils(int n) {
        List<String> names = List.of("Windstorm", "River flood", "Hail", "Freeze", "Earthquake", "Wildfire", "Surge", "Landslide", "Cyber", "Terror").subList(0, n);
        List<Double> shares = IntStream.range(0, n).mapToObj(i -> (i + 1) / (0.5 * n * (n + 1))).toList();
        List<Tower.Layer> layers = new ArrayList<>();
        layers.add(layer("First cat", 30, 30, 2, List.of(0.226, 0.033, 0.004), shares));
        layers.add(layer("Second cat", 90, 60, 1, List.of(0.063, 0.002), shares));
        return new Tower(names, layers, HAZE);
    }

    static Tower empty() {
        return new Tower(FOUR, List.of(), HAZE);
    }
}
