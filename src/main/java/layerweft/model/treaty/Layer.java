package layerweft.model.treaty;

import java.util.List;
import layerweft.model.Check;

/**
 * One layer of a programme as agreed. All amounts are in the portfolio's unit at 100 % of the layer.
 *
 * @param name unique within the programme
 * @param perils names of covered perils, or {@code peril/subPeril}; empty for all
 * @param reinstatements premium rate of each reinstatement, as a fraction of the upfront premium; an empty list for none, null where
 *     their number is unlimited
 * @param quotaShare part of each subject loss that the layer's terms apply to, in (0, 1]
 * @param share part of the layer that is placed, in (0, 1]
 * @param proRataTime whether reinstatement premium is also in proportion to the part of the year still to run
 * @param inuring names of the layers whose recoveries come off the subject loss first, event by event
 * @param premium quoted upfront premium at 100 %, null where none is quoted
 */
public record Layer(
        String name,
        List<String> perils,
        OccurrenceTerms occurrence,
        AnnualTerms annual,
        List<Double> reinstatements,
        double quotaShare,
        double share,
        boolean proRataTime,
        List<String> inuring,
        Double premium) {

    public Layer {
        perils = List.copyOf(perils);
        inuring = List.copyOf(inuring);
        Check check = new Check().name("name", name)
                .that(quotaShare > 0 && quotaShare <= 1, "quotaShare", quotaShare, "above 0 and at most 1")
                .that(share > 0 && share <= 1, "share", share, "above 0 and at most 1");
        if (reinstatements != null) {
            reinstatements = List.copyOf(reinstatements);
            for (int k = 0; k < reinstatements.size(); k++) {
                check.notNegative("reinstatements[" + k + "]", reinstatements.get(k));
            }
            check.that(occurrence.limit() < Double.POSITIVE_INFINITY, "reinstatements", "no occurrence limit",
                    "reinstatements only where there is an occurrence limit to reinstate");
        }
        if (premium != null) {
            check.notNegative("premium", premium);
        }
        check.orThrow();
    }

    /** A layer with these terms that covers all perils, fully placed, with nothing else agreed. */
    public static Layer of(String name, OccurrenceTerms occurrence, AnnualTerms annual) {
        return new Layer(name, List.of(), occurrence, annual, null, 1, 1, false, List.of(), null);
    }

    /** The same layer with reinstatements at these rates. */
    public Layer withReinstatements(List<Double> rates) {
        return new Layer(name, perils, occurrence, annual, rates, quotaShare, share, proRataTime, inuring, premium);
    }

    /** The same layer covering only these perils. */
    public Layer covering(String... names) {
        return new Layer(name, List.of(names), occurrence, annual, reinstatements, quotaShare, share, proRataTime, inuring, premium);
    }

    /** The same layer without the recoveries of a layer of that name taken off first. */
    public Layer withoutInuring(String other) {
        return new Layer(name, perils, occurrence, annual, reinstatements, quotaShare, share, proRataTime,
                inuring.stream().filter(n -> !n.equals(other)).toList(), premium);
    }

    /** The terms as arithmetic. */
    public LayerTerms terms() {
        return LayerTerms.of(this);
    }
}
