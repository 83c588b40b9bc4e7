package layerweft.study;

import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import layerweft.engine.transform.EventLosses;
import layerweft.model.portfolio.Peril;

/** Expected number of events a year of one peril whose ground-up loss is above an amount: E[N]·P(X &gt; x). */
public final class EventsAbove {

    private EventsAbove() {}

    /** As a function of the amount, at least 0; empty where an event's parts add up to a law that is only drawn. */
    public static Optional<DoubleUnaryOperator> of(Peril peril) {
        double mean = peril.frequency().mean();
        return EventLosses.survival(peril.eventLoss()).map(survival -> x -> mean * survival.applyAsDouble(x));
    }
}
