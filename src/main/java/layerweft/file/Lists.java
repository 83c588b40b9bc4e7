package layerweft.file;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Lists of values. */
final class Lists {
    private Lists() {}

    /** A list of at most so many items; every faulty item is found, up to the first thousand. */
    static <T> TwoWay<List<T>> of(TwoWay<T> item, int most) {
        return TwoWay.of(item.type().list(), (node, path, faults) -> {
            if (!(node instanceof Node.Elements list)) {
                faults.wrongType(node, path, "a list");
                return null;
            }
            if (list.items().size() > most) {
                faults.add(node.place(), path, "a list of " + list.items().size(), "a list of at most " + most);
                return null;
            }
            int before = faults.count();
            List<T> values = new ArrayList<>(list.items().size());
            for (int k = 0; k < list.items().size(); k++) {
                values.add(item.read(list.items().get(k), FieldPath.item(path, k), faults));
            }
            return faults.count() == before ? values : null;
        }, values -> values.stream().map(item::write).toList());
    }

    /** A list that is not empty. */
    static <T> TwoWay<List<T>> notEmpty(TwoWay<List<T>> list, String admissible) {
        return list.reading((node, path, faults) -> {
            if (node instanceof Node.Elements elements && elements.items().isEmpty()) {
                faults.wrongType(node, path, admissible);
                return null;
            }
            return list.read(node, path, faults);
        });
    }

    /** A list that names nothing twice. */
    static TwoWay<List<String>> distinct(TwoWay<List<String>> list) {
        return list.reading((node, path, faults) -> {
            List<String> values = list.read(node, path, faults);
            Set<String> seen = new HashSet<>();
            int before = faults.count();
            for (int k = 0; values != null && k < values.size(); k++) {
                if (!seen.add(values.get(k))) {
                    faults.add(node.placeOf("[" + k + "]"), FieldPath.item(path, k), Excerpt.quoted(values.get(k)) + " again", "each name once");
                }
            }
            return faults.count() == before ? values : null;
        });
    }

    /** The numbers of a list as an array. */
    static double[] array(List<Double> numbers) {
        return numbers.stream().mapToDouble(Double::doubleValue).toArray();
    }
}
