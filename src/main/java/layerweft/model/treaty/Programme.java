package layerweft.model.treaty;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import layerweft.model.Check;

/**
 * An ordered list of layers on one portfolio, with how they are priced and what the buyer looks at.
 *
 * @param layers at least one, names unique; {@code inuring} names exist and hold no cycle
 */
public record Programme(String name, List<Layer> layers, Pricing pricing, Buyer buyer) {

    public Programme {
        layers = List.copyOf(layers);
        Check check = new Check().name("name", name).that(!layers.isEmpty(), "layers", "an empty list", "at least one layer");
        Set<String> names = new HashSet<>();
        for (int j = 0; j < layers.size(); j++) {
            String layer = layers.get(j).name();
            check.that(names.add(layer), "layers[" + j + "].name", "\"" + layer + "\" a second time", "a name of its own for each layer");
        }
        boolean known = true;
        for (int j = 0; j < layers.size(); j++) {
            List<String> inuring = layers.get(j).inuring();
            for (int k = 0; k < inuring.size(); k++) {
                boolean there = names.contains(inuring.get(k));
                known &= there;
                check.that(there, "layers[" + j + "].inuring[" + k + "]", "\"" + inuring.get(k) + "\"",
                        "the name of a layer of this programme: " + String.join(", ", layers.stream().map(Layer::name).toList()));
            }
        }
        if (known) {
            List<String> cycle = cycle(layers);
            if (!cycle.isEmpty()) {
                int first = positions(layers).get(cycle.get(0));
                check.that(false, "layers[" + first + "].inuring", "layers that inure to each other: " + String.join(" → ", cycle),
                        "an order in which each layer's inuring layers come before it");
            }
        }
        check.orThrow();
    }

    /** Positions of the layers in an order in which each follows all that inure to it; otherwise in programme order. */
    public List<Integer> inuringOrder() {
        Map<String, Integer> position = positions(layers);
        List<Integer> order = new ArrayList<>();
        boolean[] done = new boolean[layers.size()];
        while (order.size() < layers.size()) {
            for (int j = 0; j < layers.size(); j++) {
                if (!done[j] && layers.get(j).inuring().stream().allMatch(n -> done[position.get(n)])) {
                    done[j] = true;
                    order.add(j);
                }
            }
        }
        return order;
    }

    /** Position of the layer of that name, or -1. */
    public int indexOf(String layerName) {
        return positions(layers).getOrDefault(layerName, -1);
    }

    private static Map<String, Integer> positions(List<Layer> layers) {
        Map<String, Integer> position = new HashMap<>();
        for (int j = 0; j < layers.size(); j++) {
            position.putIfAbsent(layers.get(j).name(), j);
        }
        return position;
    }

    /** A cycle of names, first repeated last, or an empty list. Depth first with an explicit stack: any depth of programme is legal. */
    private static List<String> cycle(List<Layer> layers) {
        Map<String, Integer> position = positions(layers);
        int[] colour = new int[layers.size()]; // 0 not seen, 1 on the path, 2 done
        int[] next = new int[layers.size()];
        for (int start = 0; start < layers.size(); start++) {
            Deque<Integer> path = new ArrayDeque<>();
            if (colour[start] == 0) {
                path.push(start);
                colour[start] = 1;
            }
            while (!path.isEmpty()) {
                int j = path.peek();
                List<String> inuring = layers.get(j).inuring();
                if (next[j] == inuring.size()) {
                    colour[j] = 2;
                    path.pop();
                    continue;
                }
                int i = position.get(inuring.get(next[j]++));
                if (colour[i] == 1) {
                    return cycleOf(layers, path, i);
                }
                if (colour[i] == 0) {
                    colour[i] = 1;
                    path.push(i);
                }
            }
        }
        return List.of();
    }

    private static List<String> cycleOf(List<Layer> layers, Deque<Integer> path, int closing) {
        List<String> names = new ArrayList<>();
        names.add(layers.get(closing).name());
        for (int j : path) { // from the top of the stack: each inures to the one before it
            names.add(layers.get(j).name());
            if (j == closing) {
                break;
            }
        }
        return names;
    }
}
