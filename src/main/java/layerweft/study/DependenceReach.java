package layerweft.study;

import java.util.Optional;
import java.util.Set;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.Treaty;

/** Which figures of a layer the copula between the perils cannot move, whatever it is: known from the terms, without pricing anything. */
final class DependenceReach {
    /** Means over single events: without annual terms they are sums of the perils' own means. */
    private static final Set<FigureKind> OF_EVENTS = Set.of(FigureKind.EXPECTED_LOSS, FigureKind.LOSS_ON_LINE, FigureKind.PAID_UP_FACTOR);
    private static final Set<FigureKind> PREMIUMS = Set.of(FigureKind.NET_PREMIUM, FigureKind.TECHNICAL_PREMIUM, FigureKind.TECHNICAL_RATE_ON_LINE);

    private DependenceReach() {}

    /** Why no figure of the layer depends on the copula; empty where some do. */
    static Optional<String> none(Treaty treaty, int j) {
        if (treaty.portfolio().perils().size() == 1) {
            return Optional.of("the portfolio has one peril");
        }
        return treaty.cover(j).size() == 1 && treaty.layer(j).inuring().isEmpty() ? Optional.of("it covers one peril") : Optional.empty();
    }

    /** Why one figure of the layer does not depend on the copula; empty where it does, or may. */
    static Optional<String> none(Treaty treaty, int j, FigureKind figure) {
        Optional<String> onePeril = none(treaty, j);
        if (onePeril.isPresent()) {
            return onePeril;
        }
        Layer layer = treaty.layer(j);
        LayerTerms terms = layer.terms();
        if (figure == FigureKind.EXPECTED_EVENTS && layer.inuring().isEmpty()) {
            return Optional.of("events are counted peril by peril");
        }
        boolean mean = OF_EVENTS.contains(figure)
                || PREMIUMS.contains(figure) && treaty.programme().pricing().loading() instanceof Loading.None;
        return mean && layer.inuring().isEmpty() && !terms.hasAnnualTerms()
                ? Optional.of("it has no annual terms, so that its mean is a sum over the perils") : Optional.empty();
    }
}
