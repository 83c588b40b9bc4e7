package layerweft.desktop.session;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import layerweft.file.FileTree;

/** Layers of a programme file added, copied, moved and removed; names stay unique, and a layer that goes no longer inures to others. */
public final class LayerEdit {
    private static final String LAYERS = "layers";

    private LayerEdit() {}

    /** How many layers the programme has, valid or not. */
    public static int count(FileTree programme) {
        return programme.size(LAYERS);
    }

    /** With a layer on top of the one at a place, as wide as that, with one reinstatement at 100 %; put after it. */
    public static FileTree addedAbove(FileTree programme, int place) {
        double retention = programme.number(path(place) + ".occurrence.retention");
        double limit = programme.number(path(place) + ".occurrence.limit");
        double top = (Double.isNaN(retention) ? 0 : retention) + (Double.isNaN(limit) ? 0 : limit);
        return added(programme, place + 1, top, Double.isNaN(limit) ? 10 : limit);
    }

    /** With a layer of its own at a place: limit xs retention with one reinstatement at 100 %. */
    public static FileTree added(FileTree programme, int place, double retention, double limit) {
        Map<String, Object> occurrence = new LinkedHashMap<>();
        occurrence.put("retention", retention);
        occurrence.put("limit", limit);
        Map<String, Object> layer = new LinkedHashMap<>();
        layer.put("name", freeName(programme, "Layer " + (count(programme) + 1)));
        layer.put("occurrence", occurrence);
        layer.put("reinstatements", List.of(1.0));
        return programme.insert(LAYERS, Math.min(place, count(programme)), layer);
    }

    /** With a copy of the layer at a place, put after it. */
    public static FileTree duplicated(FileTree programme, int place) {
        String name = freeName(programme, programme.text(path(place) + ".name") + " copy");
        FileTree copied = programme.insert(LAYERS, place + 1, Map.of()).copy(path(place), path(place + 1));
        return copied.set(path(place + 1) + ".name", name);
    }

    /** With another name of the layer at a place, also where others name it. */
    public static FileTree renamed(FileTree programme, int place, String name) {
        String old = programme.text(path(place) + ".name");
        FileTree changed = programme.set(path(place) + ".name", name);
        for (int j = 0; j < count(changed); j++) {
            if (changed.get(path(j) + ".inuring") instanceof List<?> names && names.contains(old)) {
                changed = changed.set(path(j) + ".inuring", names.stream().map(n -> n.equals(old) ? name : n).toList());
            }
        }
        return changed;
    }

    /** Without the layer at a place. */
    public static FileTree removed(FileTree programme, int place) {
        String name = programme.text(path(place) + ".name");
        FileTree rest = programme.remove(path(place));
        for (int j = 0; j < count(rest); j++) {
            String inuring = path(j) + ".inuring";
            if (rest.get(inuring) instanceof List<?> names && names.contains(name)) {
                List<Object> left = new ArrayList<>(names);
                left.remove(name);
                rest = left.isEmpty() ? rest.remove(inuring) : rest.set(inuring, left);
            }
        }
        return rest;
    }

    private static String path(int place) {
        return LAYERS + "[" + place + "]";
    }

    private static String freeName(FileTree programme, String wished) {
        Set<String> taken = new HashSet<>();
        for (int j = 0; j < count(programme); j++) {
            taken.add(programme.text(path(j) + ".name"));
        }
        String name = wished;
        for (int k = 2; taken.contains(name); k++) {
            name = wished + " " + k;
        }
        return name;
    }
}
