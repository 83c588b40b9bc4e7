package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.SeverityModel;

/** Portfolios with one thing about one peril changed; empty where the peril's models do not admit the change. */
final class PerilStress {

    private PerilStress() {}

    /** More events: {@link FrequencyStress}. */
    static Optional<Portfolio> moreEvents(Portfolio portfolio, int i, double factor) {
        Peril peril = portfolio.perils().get(i);
        return FrequencyStress.meanTimes(peril.frequency(), factor)
                .map(frequency -> with(portfolio, i, new Peril(peril.name(), frequency, peril.eventLoss())));
    }

    /** Dearer events, those of all sub-perils: {@link SeverityScale}. */
    static Optional<Portfolio> dearerEvents(Portfolio portfolio, int i, double factor) {
        return losses(portfolio, i, model -> Optional.of(SeverityScale.scaled(model, factor)));
    }

    /** A heavier tail, that of all sub-perils that have a tail parameter: {@link TailStress}. */
    static Optional<Portfolio> heavierTail(Portfolio portfolio, int i, double factor) {
        return losses(portfolio, i, model -> TailStress.heavier(model, factor));
    }

    /** Mean loss of one event, in the portfolio's unit. */
    static double meanLoss(Portfolio portfolio, int i) {
        EventLoss loss = portfolio.perils().get(i).eventLoss();
        if (loss instanceof EventLoss.Single single) {
            return single.severity().mean();
        }
        return ((EventLoss.Split) loss).subPerils().stream().mapToDouble(sub -> sub.chance() * sub.severity().mean()).sum();
    }

    private static Optional<Portfolio> losses(Portfolio portfolio, int i, Function<SeverityModel, Optional<SeverityModel>> change) {
        Peril peril = portfolio.perils().get(i);
        return losses(peril.eventLoss(), change).map(loss -> with(portfolio, i, new Peril(peril.name(), peril.frequency(), loss)));
    }

    private static Optional<EventLoss> losses(EventLoss loss, Function<SeverityModel, Optional<SeverityModel>> change) {
        if (loss instanceof EventLoss.Single single) {
            return change.apply(single.severity()).map(EventLoss.Single::new);
        }
        EventLoss.Split split = (EventLoss.Split) loss;
        List<SubPeril> changed = new ArrayList<>();
        boolean any = false;
        for (SubPeril sub : split.subPerils()) {
            Optional<SeverityModel> severity = change.apply(sub.severity());
            any |= severity.isPresent();
            changed.add(new SubPeril(sub.name(), sub.chance(), severity.orElse(sub.severity())));
        }
        return any ? Optional.of(new EventLoss.Split(changed, split.copula())) : Optional.empty();
    }

    private static Portfolio with(Portfolio portfolio, int i, Peril peril) {
        List<Peril> perils = new ArrayList<>(portfolio.perils());
        perils.set(i, peril);
        return new Portfolio(portfolio.name(), portfolio.currency(), portfolio.unit(), perils, portfolio.dependence());
    }
}
