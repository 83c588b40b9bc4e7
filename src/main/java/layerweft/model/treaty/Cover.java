package layerweft.model.treaty;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.Check;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;

/**
 * Which perils and sub-perils a layer covers in a given portfolio.
 *
 * <p>{@code part(i)} is null where peril i is not covered, otherwise one flag per part of its event loss (a single loss is one part).
 */
public final class Cover {
    private final boolean[][] parts;

    private Cover(boolean[][] parts) {
        this.parts = parts;
    }

    /**
     * @param field path of the layer, for messages, e.g. {@code layers[2]}
     * @throws layerweft.model.InadmissibleException if a name is not in the portfolio or a peril stands beside its own sub-peril
     */
    public static Cover of(Layer layer, Portfolio portfolio, String field) {
        Check check = new Check();
        boolean[][] parts = new boolean[portfolio.perils().size()][];
        if (layer.perils().isEmpty()) {
            for (int i = 0; i < parts.length; i++) {
                parts[i] = all(portfolio.perils().get(i));
            }
        }
        boolean[] named = new boolean[parts.length];
        for (int k = 0; k < layer.perils().size(); k++) {
            String name = layer.perils().get(k);
            String path = field + ".perils[" + k + "]";
            int slash = name.indexOf('/');
            int i = portfolio.indexOf(slash < 0 ? name : name.substring(0, slash));
            int part = i < 0 || slash < 0 ? -1 : subPeril(portfolio.perils().get(i), name.substring(slash + 1));
            if (i < 0 || (slash >= 0 && part < 0)) {
                check.that(false, path, "\"" + name + "\"", "a peril or peril/sub-peril of the portfolio: " + String.join(", ", names(portfolio)));
            } else if (slash < 0) {
                check.that(!named[i], path, "\"" + name + "\" again", "each peril once");
                check.that(named[i] || parts[i] == null, path, "\"" + name + "\" beside its own sub-peril", "a peril or its sub-perils, not both");
                named[i] = true;
                parts[i] = all(portfolio.perils().get(i));
            } else {
                check.that(!named[i], path, "\"" + name + "\" beside its own peril", "a peril or its sub-perils, not both");
                boolean[] covered = parts[i] == null ? new boolean[all(portfolio.perils().get(i)).length] : parts[i];
                check.that(named[i] || !covered[part], path, "\"" + name + "\" again", "each sub-peril once");
                covered[part] = true;
                parts[i] = covered;
            }
        }
        check.orThrow();
        return new Cover(parts);
    }

    public boolean covers(int peril) {
        return parts[peril] != null;
    }

    /** Whether part k of the peril's event loss is covered; a single loss is part 0. */
    public boolean covers(int peril, int part) {
        return parts[peril] != null && parts[peril][part];
    }

    /** Whether all parts of the peril's event loss are covered. */
    public boolean coversWhole(int peril) {
        if (parts[peril] == null) {
            return false;
        }
        for (boolean covered : parts[peril]) {
            if (!covered) {
                return false;
            }
        }
        return true;
    }

    /** Number of perils covered, wholly or in part. */
    public int size() {
        int n = 0;
        for (boolean[] part : parts) {
            n += part == null ? 0 : 1;
        }
        return n;
    }

    private static boolean[] all(Peril peril) {
        boolean[] all = new boolean[peril.eventLoss() instanceof EventLoss.Split split ? split.subPerils().size() : 1];
        java.util.Arrays.fill(all, true);
        return all;
    }

    private static int subPeril(Peril peril, String name) {
        if (peril.eventLoss() instanceof EventLoss.Split split) {
            List<SubPeril> subPerils = split.subPerils();
            for (int k = 0; k < subPerils.size(); k++) {
                if (subPerils.get(k).name().equals(name)) {
                    return k;
                }
            }
        }
        return -1;
    }

    private static List<String> names(Portfolio portfolio) {
        List<String> names = new ArrayList<>();
        for (Peril peril : portfolio.perils()) {
            names.add(peril.name());
            if (peril.eventLoss() instanceof EventLoss.Split split) {
                split.subPerils().forEach(s -> names.add(peril.name() + "/" + s.name()));
            }
        }
        return names;
    }
}
