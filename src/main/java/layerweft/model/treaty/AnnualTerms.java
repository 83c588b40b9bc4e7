package layerweft.model.treaty;

import layerweft.model.Check;

/**
 * What a layer pays of the year's sum of occurrence losses, at 100 %.
 *
 * @param deductible in the portfolio's unit, at least 0
 * @param limit of the year, above 0; infinite where there is none
 */
public record AnnualTerms(double deductible, double limit) {

    /** The year's sum in full. */
    public static final AnnualTerms NONE = new AnnualTerms(0, Double.POSITIVE_INFINITY);

    public AnnualTerms {
        new Check().notNegative("deductible", deductible).positiveOrInfinite("limit", limit).orThrow();
    }
}
