package layerweft.model.portfolio;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import layerweft.model.Check;
import layerweft.model.InadmissibleException;

/**
 * What is covered: perils and the dependence between them. All money is in {@code unit}s of {@code currency}, 100 % of the loss.
 *
 * @param unit a label such as "million"; amounts are never rescaled
 * @param perils at least one, names unique
 */
public record Portfolio(String name, String currency, String unit, List<Peril> perils, Dependence dependence) {
    public Portfolio {
        perils = List.copyOf(perils);
        Check check = new Check().name("name", name)
                .that(currency != null, "currency", "nothing", "a currency")
                .that(unit != null, "unit", "nothing", "a unit")
                .that(!perils.isEmpty(), "perils", "an empty list", "at least one peril");
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < perils.size(); i++) {
            String peril = perils.get(i).name();
            check.that(seen.add(peril), "perils[" + i + "].name", "\"" + peril + "\" a second time", "a name of its own for each peril");
        }
        if (!perils.isEmpty()) {
            try {
                dependence.copula().requireDimension(perils.size());
            } catch (InadmissibleException e) {
                check.within("dependence.copula", e);
            }
        }
        check.orThrow();
    }

    /** The same portfolio under another dependence. */
    public Portfolio with(Dependence other) {
        return new Portfolio(name, currency, unit, perils, other);
    }

    /** Expected ground-up loss of a year, Σ E[N_i]·E[X_i], whatever the dependence; possibly infinite. */
    public double expectedLoss() {
        return perils.stream().mapToDouble(Peril::expectedLoss).sum();
    }

    /** Position of the peril of that name, or -1. */
    public int indexOf(String perilName) {
        for (int i = 0; i < perils.size(); i++) {
            if (perils.get(i).name().equals(perilName)) {
                return i;
            }
        }
        return -1;
    }
}
