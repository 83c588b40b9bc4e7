package layerweft.engine.bounds;

/** What a layer pays of a sum S: min((S − D)+, M); convex where M is infinite, concave where D is 0, neither where both matter. */
record AnnualLayer(double deductible, double limit) {

    double loss(double sum) {
        return Math.min(Math.max(sum - deductible, 0), limit);
    }

    /** D + M. */
    double end() {
        return deductible + limit;
    }

    boolean limited() {
        return limit < Double.POSITIVE_INFINITY;
    }

    /** From where on more of a single peril's sum adds nothing, or adds itself: D + M, or D where there is no M. */
    double cap() {
        return limited() ? end() : deductible;
    }
}
