package layerweft.desktop.programme;

import java.util.ArrayList;
import java.util.List;
import layerweft.file.FileTree;

/** Terms of a layer as a hand on the tower sets them. */
final class LayerTermsEdit {

    private LayerTermsEdit() {}

    /**
     * @param retention of an event, or the annual deductible of a layer without an occurrence limit
     * @param limit likewise
     */
    static FileTree moved(FileTree programme, int layer, double retention, double limit) {
        String at = "layers[" + layer + "]";
        boolean ofYear = Double.isNaN(programme.number(at + ".occurrence.limit"));
        String terms = at + (ofYear ? ".annual" : ".occurrence");
        String start = ofYear ? terms + ".deductible" : terms + ".retention";
        boolean franchise = programme.has(at + ".occurrence.franchise");
        boolean nothing = retention == 0 && !programme.has(start);
        FileTree moved = franchise && !ofYear || nothing ? programme : programme.set(start, retention);
        return Double.isInfinite(limit) ? moved : moved.set(terms + ".limit", limit);
    }

    /** With so many reinstatements, new ones at the rate of the last, or 100 %; a number below 0 for any number of them. */
    static FileTree reinstated(FileTree programme, int layer, int number) {
        String at = "layers[" + layer + "].reinstatements";
        if (number < 0) {
            return programme.remove(at);
        }
        List<Object> rates = new ArrayList<>();
        if (programme.get(at) instanceof List<?> had) {
            rates.addAll(had.subList(0, Math.min(number, had.size())));
        }
        while (rates.size() < number) {
            rates.add(rates.isEmpty() ? 1.0 : rates.get(rates.size() - 1));
        }
        return programme.set(at, rates);
    }
}
