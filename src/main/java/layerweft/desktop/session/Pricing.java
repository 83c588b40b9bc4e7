package layerweft.desktop.session;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.model.treaty.Treaty;
import layerweft.study.EngineChoice;
import layerweft.study.LiveLayer;
import layerweft.study.LivePricing;
import layerweft.study.Quote;

/** Keeps prices, curves and the long run behind up with the newest treaty. */
final class Pricing {
    static final String PRICES = "Pricing";
    static final String FIRST_ANSWER = "First answer";
    static final String CURVES = "Curves against τ";
    static final String LONG_RUN = "Simulating the whole treaty";
    /** An older pricing may go on beside a newer treaty for so long: a hand that moves must see answers on the way. */
    private static final Duration PATIENCE = Duration.ofMillis(400);
    /** Where exact prices take longer, a rough answer comes first. */
    private static final Duration LONGEST_WAIT = Duration.ofMillis(150);
    /** The hand must rest for so long before curves and long runs are begun. */
    private static final Duration REST_OF_CURVES = Duration.ofMillis(150);
    private static final Duration REST_OF_LONG_RUN = Duration.ofMillis(700);

    private final Background background;
    private final SimulationSettings longRunSettings;
    private final ReadOnlyObjectWrapper<LivePrices> prices = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyObjectWrapper<LiftCurves> curves = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyObjectWrapper<Task> pricingTask = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyObjectWrapper<Task> longRun = new ReadOnlyObjectWrapper<>();
    /** What the last pricing has prepared; set by the pricing thread alone. */
    private volatile LivePricing prepared;
    /** Counts documents opened, so that a price of the one before is not shown. */
    private int opened;
    private boolean faulty;
    private Treaty newest;
    /** Whether a treaty waits for its exact price, and since when the hand has seen none. */
    private boolean unanswered;
    private long askedAt;

    Pricing(Background background, SimulationSettings longRunSettings) {
        this.background = background;
        this.longRunSettings = longRunSettings;
    }

    ReadOnlyObjectProperty<LivePrices> prices() {
        return prices.getReadOnlyProperty();
    }

    ReadOnlyObjectProperty<LiftCurves> curves() {
        return curves.getReadOnlyProperty();
    }

    ReadOnlyObjectProperty<Task> pricingTask() {
        return pricingTask.getReadOnlyProperty();
    }

    ReadOnlyObjectProperty<Task> longRun() {
        return longRun.getReadOnlyProperty();
    }

    /** Another document: nothing of the present one is shown any longer. */
    void forget() {
        opened++;
        background.stop(PRICES);
        background.stop(FIRST_ANSWER);
        background.stop(CURVES);
        background.stop(LONG_RUN);
        prices.set(null);
        curves.set(null);
    }

    /** The document has faults: the last figures stay, as those of the last valid one. */
    void invalid() {
        faulty = true;
        if (prices.get() != null) {
            prices.set(prices.get().invalid());
        }
    }

    /** @param newCurves whether anything but the strength of the dependence has changed */
    void price(Document document, Treaty treaty, TauState tau, boolean newCurves) {
        int mine = opened;
        faulty = false;
        if (prices.get() != null && !prices.get().valid()) {
            prices.set(prices.get().validAgain());
        }
        newest = treaty;
        long now = System.nanoTime();
        boolean late = unanswered && now - askedAt > LONGEST_WAIT.toNanos();
        askedAt = unanswered ? askedAt : now;
        unanswered = true;
        background.stop(LONG_RUN);
        boolean curvesDue = newCurves || curves.get() == null || !curves.get().current();
        if (curvesDue) {
            if (curves.get() != null) {
                curves.set(curves.get().outdated());
            }
            curves(treaty);
        }
        pricingTask.set(background.follow(PRICES, PATIENCE, Duration.ZERO, control -> live(treaty, control), live -> {
            if (mine == opened) {
                askedAt = System.nanoTime();
                unanswered = newest != treaty;
                if (!unanswered) {
                    background.stop(FIRST_ANSWER);
                }
                prices.set(new LivePrices(document, treaty, tau, live, !faulty, Optional.empty()));
            }
        }));
        firstAnswer(document, treaty, tau, late);
        longRun(treaty);
    }

    /** A rough answer, at once where the one before is late already. */
    private void firstAnswer(Document document, Treaty treaty, TauState tau, boolean late) {
        int mine = opened;
        background.follow(FIRST_ANSWER, PATIENCE, late ? Duration.ZERO : LONGEST_WAIT, control -> roughly(treaty, control), live -> {
            if (mine == opened && pricingTask.get().active()) {
                prices.set(new LivePrices(document, treaty, tau, live, !faulty, Optional.empty()));
            }
        });
    }

    private List<LiveLayer> roughly(Treaty treaty, RunControl control) {
        LivePricing known = prepared;
        return known == null ? LivePricing.rough(treaty, LivePricing.shortRun(), control) : known.rough(treaty, control);
    }

    private List<LiveLayer> live(Treaty treaty, RunControl control) {
        prepared = prepared == null ? new LivePricing(treaty, LivePricing.shortRun()) : prepared.of(treaty);
        return prepared.price(control);
    }

    private void curves(Treaty treaty) {
        background.runAfter(REST_OF_CURVES, CURVES, control -> LiftCurves.of(treaty, control), curves::set);
    }

    private void longRun(Treaty treaty) {
        longRun.set(background.runAfter(REST_OF_LONG_RUN, LONG_RUN,
                control -> Quote.of(treaty, EngineChoice.AUTO, longRunSettings, control), quote -> {
            if (prices.get() != null && prices.get().treaty() == quote.treaty()) {
                prices.set(prices.get().confirmed(quote));
            }
        }));
    }
}
