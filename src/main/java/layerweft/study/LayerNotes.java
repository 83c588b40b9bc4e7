package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import layerweft.model.copula.Independence;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/** What a reader should know of a layer before drawing conclusions from its figures, in plain words. */
final class LayerNotes {

    private LayerNotes() {}

    /** @param refusal why the layer is simulated although the transform was welcome */
    static List<String> of(Treaty treaty, int j, Optional<String> refusal) {
        List<String> notes = new ArrayList<>();
        refusal.ifPresent(reason -> notes.add("simulated, because " + reason));
        Layer layer = treaty.layer(j);
        LayerTerms terms = layer.terms();
        boolean copula = treaty.portfolio().perils().size() > 1 && !(treaty.portfolio().dependence().copula() instanceof Independence);
        if (copula && layer.inuring().isEmpty()) {
            if (treaty.cover(j).size() == 1) {
                notes.add(terms.hasAnnualTerms()
                        ? "one peril: dependence between perils does not matter here"
                        : "no annual terms on one peril: dependence does not matter here");
            } else if (!terms.hasAnnualTerms()) {
                notes.add("no annual terms: the expected loss does not depend on the dependence between perils");
            }
        }
        if (layer.premium() != null && terms.line() == Double.POSITIVE_INFINITY) {
            notes.add("no limit: a rate on line is not defined");
        }
        return notes;
    }
}
