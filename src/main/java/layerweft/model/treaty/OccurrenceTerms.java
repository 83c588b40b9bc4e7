package layerweft.model.treaty;

import layerweft.model.Check;

/**
 * What a layer pays of one event, at 100 %: the excess over a retention, or the whole loss once it passes a franchise, up to a limit.
 *
 * @param retention in the portfolio's unit, at least 0; 0 where a franchise is given
 * @param franchise the loss from the ground up once it is strictly above this amount; null where there is none
 * @param limit of one event, above 0; infinite where there is none
 */
public record OccurrenceTerms(double retention, Double franchise, double limit) {

    /** Every event in full. */
    public static final OccurrenceTerms NONE = new OccurrenceTerms(0, null, Double.POSITIVE_INFINITY);

    public OccurrenceTerms {
        Check check = new Check().notNegative("retention", retention).positiveOrInfinite("limit", limit);
        if (franchise != null) {
            check.notNegative("franchise", franchise)
                    .that(retention == 0, "franchise", "a franchise beside a retention", "either retention or franchise");
        }
        check.orThrow();
    }

    /** Excess of loss: limit xs retention. */
    public static OccurrenceTerms excess(double limit, double retention) {
        return new OccurrenceTerms(retention, null, limit);
    }
}
