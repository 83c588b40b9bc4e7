package layerweft.desktop.perils;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.LayerEdit;
import layerweft.file.FileTree;

/** Perils added, copied, moved, renamed and removed; layers and groups that name them follow. */
final class PerilEdit {
    private static final String PERILS = "perils";

    private PerilEdit() {}

    private static String path(int place) {
        return PERILS + "[" + place + "]";
    }

    /** With a peril more at the end: one event a year, exponential with a mean like that of the others. */
    static FileTree added(FileTree portfolio) {
        Map<String, Object> frequency = new LinkedHashMap<>();
        frequency.put("model", "poisson");
        frequency.put("mean", 1.0);
        Map<String, Object> severity = new LinkedHashMap<>();
        severity.put("model", "lognormal");
        severity.put("mean", 10.0);
        severity.put("cv", 1.5);
        Map<String, Object> peril = new LinkedHashMap<>();
        peril.put("name", freeName(portfolio, "peril " + (portfolio.size(PERILS) + 1)));
        peril.put("frequency", frequency);
        peril.put("severity", severity);
        return withoutMatrix(portfolio.insert(PERILS, portfolio.size(PERILS), peril));
    }

    static FileTree duplicated(FileTree portfolio, int place) {
        String name = freeName(portfolio, portfolio.text(path(place) + ".name") + " copy");
        FileTree copied = portfolio.insert(PERILS, place + 1, Map.of()).copy(path(place), path(place + 1));
        return withoutMatrix(copied.set(path(place + 1) + ".name", name));
    }

    /** A matrix has rows in the order of the perils: with another order or number of perils it would say something else, so its mean τ is kept instead. */
    private static FileTree withoutMatrix(FileTree portfolio) {
        if (!(portfolio.get("dependence.copula.correlation") instanceof List<?> rows)) {
            return portfolio;
        }
        double sum = 0;
        int pairs = 0;
        for (int i = 0; i < rows.size(); i++) {
            for (int j = 0; j < i; j++) {
                sum += 2 / Math.PI * Math.asin((Double) ((List<?>) rows.get(i)).get(j));
                pairs++;
            }
        }
        double mean = pairs == 0 ? 0 : Math.round(1000 * sum / pairs) / 1000.0;
        return portfolio.remove("dependence.copula.correlation").set("dependence.copula.kendallTau", mean);
    }

    static FileTree moved(FileTree portfolio, int from, int to) {
        FileTree moved = portfolio.move(PERILS, from, to);
        String matrix = "dependence.copula.correlation";
        if (!(portfolio.get(matrix) instanceof List<?> rows)) {
            return moved;
        }
        List<Object> reordered = new ArrayList<>(rows);
        reordered.add(to, reordered.remove(from));
        List<Object> columns = new ArrayList<>();
        for (Object row : reordered) {
            List<Object> entries = new ArrayList<>((List<?>) row);
            entries.add(to, entries.remove(from));
            columns.add(entries);
        }
        return moved.set(matrix, columns);
    }

    /** With another name, also where layers and groups name the peril. */
    static Document renamed(Document document, int place, String name) {
        String old = document.portfolio().text(path(place) + ".name");
        return document.withPortfolio(t -> inGroups(t.set(path(place) + ".name", name), "dependence.copula", old, name))
                .withProgramme(p -> inLayers(p, old, name));
    }

    /** Without the peril; layers no longer name it, and a layer that covered nothing else goes with it. */
    static Document removed(Document document, int place) {
        String name = document.portfolio().text(path(place) + ".name");
        return document.withPortfolio(t -> withoutMatrix(inGroups(t.remove(path(place)), "dependence.copula", name, null))).withProgramme(p -> inLayers(p, name, null));
    }

    private static FileTree inLayers(FileTree programme, String old, String name) {
        FileTree changed = programme;
        for (int j = programme.size("layers") - 1; j >= 0; j--) {
            String at = "layers[" + j + "].perils";
            if (changed.get(at) instanceof List<?> names) {
                List<Object> left = new ArrayList<>();
                for (Object entry : names) {
                    String text = String.valueOf(entry);
                    boolean its = text.equals(old) || text.startsWith(old + "/");
                    if (!its) {
                        left.add(entry);
                    } else if (name != null) {
                        left.add(name + text.substring(old.length()));
                    }
                }
                if (left.isEmpty() && !names.isEmpty()) {
                    changed = programme.size("layers") > 1 ? LayerEdit.removed(changed, j) : changed.remove(at);
                } else if (!left.equals(names)) {
                    changed = changed.set(at, left);
                }
            }
        }
        return changed;
    }

    private static FileTree inGroups(FileTree portfolio, String at, String old, String name) {
        FileTree changed = portfolio;
        for (int g = portfolio.size(at + ".groups") - 1; g >= 0; g--) {
            String group = at + ".groups[" + g + "]";
            changed = inGroups(changed, group, old, name);
            if (changed.get(group + ".perils") instanceof List<?> names && names.contains(old)) {
                List<Object> left = new ArrayList<>(names);
                int k = left.indexOf(old);
                if (name == null) {
                    left.remove(k);
                } else {
                    left.set(k, name);
                }
                boolean empty = left.isEmpty() && changed.size(group + ".groups") == 0;
                changed = empty ? changed.remove(group) : changed.set(group + ".perils", left);
            }
        }
        return changed.has(at + ".groups") && changed.size(at + ".groups") == 0 ? changed.remove(at + ".groups") : changed;
    }

    private static String freeName(FileTree portfolio, String wished) {
        List<String> taken = new ArrayList<>();
        for (int i = 0; i < portfolio.size(PERILS); i++) {
            taken.add(portfolio.text(path(i) + ".name"));
        }
        String name = wished;
        for (int k = 2; taken.contains(name); k++) {
            name = wished + " " + k;
        }
        return name;
    }
}
