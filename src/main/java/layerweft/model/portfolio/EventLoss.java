package layerweft.model.portfolio;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import layerweft.model.Check;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.Copula;
import layerweft.model.severity.SeverityModel;

/** What one event of a peril costs: a single loss, or a loss for each sub-peril. */
public sealed interface EventLoss {

    /** Expected loss of one event, of all its parts together; possibly infinite. */
    double mean();

    /** One loss. */
    record Single(SeverityModel severity) implements EventLoss {
        public Single {
            new Check().that(severity != null, "severity", "nothing", "a severity model").orThrow();
        }

        @Override
        public double mean() {
            return severity.mean();
        }
    }

    /**
     * A loss for each sub-peril that occurs, their sizes joined by a copula. A sub-peril's absence does not change the copula of the
     * others.
     *
     * @param subPerils at least one, with unique names
     * @param copula joins the severities, in the order of the sub-perils
     */
    record Split(List<SubPeril> subPerils, Copula copula) implements EventLoss {
        public Split {
            subPerils = List.copyOf(subPerils);
            Check check = new Check().that(!subPerils.isEmpty(), "subPerils", "an empty list", "at least one sub-peril");
            Set<String> seen = new HashSet<>();
            for (int k = 0; k < subPerils.size(); k++) {
                String name = subPerils.get(k).name();
                check.that(seen.add(name), "subPerils[" + k + "].name", "\"" + name + "\" a second time", "a name of its own for each sub-peril");
            }
            if (check.clean()) {
                try {
                    copula.requireDimension(subPerils.size());
                } catch (InadmissibleException e) {
                    check.within("subPerilCopula", e);
                }
            }
            check.orThrow();
        }

        @Override
        public double mean() {
            return subPerils.stream().mapToDouble(part -> part.chance() * part.severity().mean()).sum();
        }
    }
}
