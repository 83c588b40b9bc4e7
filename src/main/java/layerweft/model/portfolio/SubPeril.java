package layerweft.model.portfolio;

import layerweft.model.Check;
import layerweft.model.severity.SeverityModel;

/**
 * One of the ways in which an event does damage, e.g. the surge of a storm.
 *
 * @param name unique within the peril
 * @param chance that an event brings this loss, in (0, 1], independent of the other sub-perils
 * @param severity the loss, given that it occurs
 */
public record SubPeril(String name, double chance, SeverityModel severity) {
    public SubPeril {
        new Check().name("name", name)
                .that(name == null || !name.contains("/"), "name", "\"" + name + "\"", "a name without /")
                .that(chance > 0 && chance <= 1, "chance", chance, "above 0 and at most 1")
                .that(severity != null, "severity", "nothing", "a severity model")
                .orThrow();
    }
}
