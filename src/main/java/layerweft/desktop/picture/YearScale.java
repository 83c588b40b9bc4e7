package layerweft.desktop.picture;

import java.util.List;

/** How bad a year is, against a part of an axis: by return period, −log₁₀(1 − u), or by rank, u. */
enum YearScale {
    /** Gives the years that matter a third of the axis instead of a hundredth. */
    RETURN_PERIOD(List.of(1, 2, 5, 10, 20, 50, 100, 200, 500, 1000)) {
        @Override
        double place(double u) {
            return Math.min(1, -Math.log10(1 - u) / DECADES);
        }

        @Override
        double years(double place) {
            return Math.pow(10, DECADES * place);
        }
    },
    RANK(List.of(1, 2, 5, 10, 20)) {
        @Override
        double place(double u) {
            return u;
        }

        @Override
        double years(double place) {
            return 1 / Math.max(1e-3, 1 - place);
        }
    };

    /** Of return periods: 1 in 1 to 1 in 300 or so. */
    private static final double DECADES = 2.5;

    private final List<Integer> ticks;

    YearScale(List<Integer> ticks) {
        this.ticks = ticks;
    }

    /** @param u part of all years that are better, in [0, 1) */
    abstract double place(double u);

    /** Return period at a place from 0 to 1. */
    abstract double years(double place);

    double placeOfYears(double years) {
        return place(1 - 1 / years);
    }

    /** Return periods to be written at the axis. */
    List<Integer> ticks() {
        return ticks.stream().filter(t -> placeOfYears(t) < 1).toList();
    }
}
