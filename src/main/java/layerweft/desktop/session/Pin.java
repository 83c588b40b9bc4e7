package layerweft.desktop.session;

import java.time.LocalTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Optional;
import layerweft.figures.LayerFigures;
import layerweft.study.DependenceStrength;

/**
 * Figures kept as the base line of all later changes.
 *
 * @param prices of one treaty, valid at the time
 * @param at the time of day
 */
public record Pin(LivePrices prices, LocalTime at) {
    private static final DateTimeFormatter CLOCK = DateTimeFormatter.ofPattern("HH:mm");

    /** Where the dependence stood. */
    public TauState tau() {
        return prices.tau();
    }

    /** The pinned figures of the layer of that name; empty where there was none. */
    public Optional<LayerFigures> layer(String name) {
        return prices.layers().stream().filter(layer -> layer.name().equals(name)).findFirst();
    }

    /** E.g. {@code Gaussian 0.15, 10:42}. */
    public String label() {
        boolean strength = tau().kind() == DependenceStrength.Kind.ONE_TAU || tau().kind() == DependenceStrength.Kind.PAIRS;
        return tau().copula() + (strength ? String.format(Locale.ROOT, " %.2f", tau().tau()) : "") + ", " + CLOCK.format(at);
    }
}
