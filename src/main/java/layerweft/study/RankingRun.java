package layerweft.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Independence;
import layerweft.model.copula.TauRange;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Treaty;

/** One ranking at work. */
final class RankingRun {
    /** Stands in for the family where the perils are independent and a first bit of dependence is tried. */
    private static final CopulaFamily FIRST = CopulaFamily.parse("gumbel");

    private final Treaty treaty;
    private final Optional<String> layer;
    private final FigureKind figure;
    private final SimulationSettings settings;
    private final RunControl control;
    private final List<Integer> layers;
    private final Copula copula;
    private final CopulaPricing asIs;
    private final Figure base;
    private final Steps steps;
    private final List<Sensitivity> found = new ArrayList<>();
    private final List<String> notVaried = new ArrayList<>();

    RankingRun(Treaty treaty, Optional<String> layer, FigureKind figure, SimulationSettings settings, RunControl control) {
        this.treaty = treaty;
        this.layer = layer;
        this.figure = figure;
        this.settings = settings;
        this.control = control;
        layers = layer.map(name -> List.of(treaty.programme().indexOf(name)))
                .orElseGet(() -> IntStream.range(0, treaty.layers()).boxed().toList());
        copula = treaty.portfolio().dependence().copula();
        asIs = new CopulaPricing(treaty, settings, control);
        steps = new Steps(control, 2 + 3L * treaty.portfolio().perils().size());
        base = under(copula);
    }

    Ranking ranking() {
        dependence();
        List<String> names = treaty.portfolio().perils().stream().map(p -> p.name()).toList();
        for (int i = 0; i < names.size(); i++) {
            peril(i, names.get(i));
        }
        found.sort(Comparator.comparingDouble((Sensitivity s) -> -Math.abs(s.change().value())));
        return new Ranking(treaty, layer, figure, base, found, notVaried);
    }

    private Figure under(Copula other) {
        return figure(asIs, other);
    }

    private Figure figure(CopulaPricing pricing, Copula other) {
        List<LayerFigures> priced = pricing.price(other, layers);
        return layer.isPresent() ? figure.of(priced.get(0)) : figure.sum(priced);
    }

    private void dependence() {
        int perils = treaty.portfolio().perils().size();
        Optional<String> still = layers.stream().map(j -> DependenceReach.none(treaty, j, figure))
                .reduce((a, b) -> a.isEmpty() ? a : b).orElseThrow();
        if (still.isPresent()) {
            notVaried.add("dependence: " + figure.words() + " does not depend on it, because " + still.get());
            return;
        }
        CopulaFamily family = copula instanceof Independence ? FIRST : Families.ofOneTau(copula, perils);
        if (family == null) {
            notVaried.add("dependence: one Kendall's τ does not describe a copula of this kind (" + copula.label() + ")");
            return;
        }
        double tau = copula instanceof Independence ? 0 : copula.kendallTau(0, 1);
        strength(family, tau, family.tauRange(perils));
        if (tau == 0) {
            notVaried.add("family: independent perils have none");
        } else {
            families(family, tau, perils);
        }
    }

    private void strength(CopulaFamily family, double tau, TauRange range) {
        double next = range.contains(tau + Ranking.TAU_STEP) ? tau + Ranking.TAU_STEP : tau - Ranking.TAU_STEP;
        Figure low = under(range.low() == -1 ? new Countermonotonic() : new Independence());
        Figure high = under(new Comonotonic());
        String lowName = range.low() == -1 ? "countermonotonic" : "independent";
        Sensitivity.Reach reach = low.value() <= high.value() ? new Sensitivity.Reach(lowName, low, "comonotonic", high)
                : new Sensitivity.Reach("comonotonic", high, lowName, low);
        add(Sensitivity.Lever.STRENGTH, "", "τ " + number(tau) + " → " + number(next) + ", " + family.label(), under(family.at(next)),
                Optional.of(reach));
    }

    /** The family at equal τ that moves the figure most. */
    private void families(CopulaFamily own, double tau, int perils) {
        List<CopulaFamily> others = SweepRequest.USUAL_FAMILIES.stream().filter(f -> !f.equals(own) && f.tauRange(perils).contains(tau)).toList();
        CopulaFamily lowest = own;
        CopulaFamily highest = own;
        Figure low = base;
        Figure high = base;
        for (CopulaFamily other : others) {
            Figure value = under(other.at(tau));
            if (value.value() < low.value()) {
                low = value;
                lowest = other;
            }
            if (value.value() > high.value()) {
                high = value;
                highest = other;
            }
        }
        boolean up = high.value() - base.value() >= base.value() - low.value();
        add(Sensitivity.Lever.FAMILY, "", own.label() + " → " + (up ? highest : lowest).label() + ", τ " + number(tau), up ? high : low,
                Optional.of(new Sensitivity.Reach(lowest.label(), low, highest.label(), high)));
    }

    private void peril(int i, String name) {
        double factor = 1 + Ranking.PART;
        if (layers.stream().allMatch(j -> !treaty.cover(j).covers(i) && treaty.layer(j).inuring().isEmpty())) {
            notVaried.add(name + ": not covered");
            return;
        }
        Portfolio portfolio = treaty.portfolio();
        step(Sensitivity.Lever.FREQUENCY, name, "10 % more events", PerilStress.moreEvents(portfolio, i, factor),
                "a year cannot have 10 % more events");
        step(Sensitivity.Lever.SEVERITY, name, "losses 10 % larger", PerilStress.dearerEvents(portfolio, i, factor), "");
        Optional<Portfolio> heavier = PerilStress.heavierTail(portfolio, i, factor);
        String mean = heavier.map(changed -> meanMoves(PerilStress.meanLoss(portfolio, i), PerilStress.meanLoss(changed, i))).orElse("");
        step(Sensitivity.Lever.TAIL, name, "tail 10 % heavier, " + mean, heavier, "its severity has no tail parameter that could be 10 % heavier");
    }

    private static String meanMoves(double before, double after) {
        if (after == Double.POSITIVE_INFINITY) {
            return "mean infinite";
        }
        double part = after / before - 1;
        return Math.abs(part) < 5e-7 ? "same mean" : String.format(Locale.ROOT, "mean %+.2g %%", 100 * part);
    }

    private void step(Sensitivity.Lever lever, String peril, String step, Optional<Portfolio> changed, String unless) {
        if (changed.isEmpty()) {
            notVaried.add(peril + ", " + lever.words() + ": " + unless);
            return;
        }
        add(lever, peril, step, figure(new CopulaPricing(treaty.on(changed.get()), settings, control), copula), Optional.empty());
    }

    private void add(Sensitivity.Lever lever, String subject, String step, Figure value, Optional<Sensitivity.Reach> reach) {
        steps.one();
        found.add(new Sensitivity(lever, subject, step, value, value.minus(base), reach, Optional.empty()));
    }

    /** Up to four decimals: τ from a parameter θ has more than a reader wants. */
    private static String number(double tau) {
        String text = String.format(Locale.ROOT, "%.4f", tau);
        return text.replaceAll("0+$", "").replaceAll("\\.$", "");
    }
}
