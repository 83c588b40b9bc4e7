package layerweft.model.portfolio;

import layerweft.model.Check;
import layerweft.model.frequency.FrequencyModel;

/**
 * A cause of loss with an annual event count and a law of the loss of one event, independent of the count and of other events.
 *
 * @param name unique within the portfolio, without {@code /}
 */
public record Peril(String name, FrequencyModel frequency, EventLoss eventLoss) {
    public Peril {
        new Check().name("name", name)
                .that(name == null || !name.contains("/"), "name", "\"" + name + "\"", "a name without /")
                .that(frequency != null, "frequency", "nothing", "a frequency model")
                .that(eventLoss != null, "severity", "nothing", "a severity or sub-perils")
                .orThrow();
    }

    /** E[N]·E[X], the expected ground-up loss of a year; possibly infinite. */
    public double expectedLoss() {
        return frequency.mean() == 0 ? 0 : frequency.mean() * eventLoss.mean();
    }
}
