package layerweft.figures;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.treaty.LayerTerms;

/** A layer's terms as the trade says them. */
public final class LayerTermsText {

    private LayerTermsText() {}

    /** E.g. "90 % of 60 xs 40, 180 a year"; "60 xs 120 a year" for a stop loss. */
    public static String of(LayerTerms t) {
        List<String> parts = new ArrayList<>();
        boolean each = t.occurrenceLimit() < Double.POSITIVE_INFINITY || t.retention() > 0 || t.hasFranchise();
        String share = t.quotaShare() < 1 ? FigureText.plainPercent(t.quotaShare()) + " of " : "";
        if (t.hasFranchise()) {
            parts.add(amount(t.occurrenceLimit()) + " franchise " + amount(t.franchise()));
        } else if (each) {
            parts.add(amount(t.occurrenceLimit()) + (t.retention() > 0 ? " xs " + amount(t.retention()) : " each"));
        }
        if (t.hasAnnualTerms()) {
            parts.add(amount(t.annualLimit()) + (t.deductible() > 0 ? " xs " + amount(t.deductible()) : "") + " a year");
        }
        return share + (parts.isEmpty() ? "all losses" : String.join(", ", parts));
    }

    private static String amount(double value) {
        return Double.isInfinite(value) ? "∞" : FigureText.groupedPlain(value);
    }
}
