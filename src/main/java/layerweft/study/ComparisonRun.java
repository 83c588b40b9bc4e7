package layerweft.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.NetPositions;
import layerweft.engine.simulation.PositionSample;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.figures.ProgrammeCost;
import layerweft.model.Check;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/** Makes a {@link Comparison}: prices all layers, then runs the same years through every programme, and through each without each of its layers. */
final class ComparisonRun {
    private final Portfolio portfolio;
    private final List<Programme> programmes;
    private final List<CopulaFamily> families;
    private final SimulationSettings settings;
    private final RunControl control;
    private final Buyer buyer;
    private final List<List<LayerFigures>> layers = new ArrayList<>();
    private NetPositions.Result samples;
    /** Place of each programme's first variant among the samples: the whole programme; those without a layer follow. */
    private final List<Integer> place = new ArrayList<>();

    ComparisonRun(Portfolio portfolio, List<Programme> programmes, List<CopulaFamily> families, SimulationSettings settings, RunControl control) {
        this.portfolio = portfolio;
        this.programmes = programmes;
        this.families = families;
        this.settings = settings;
        this.control = control;
        this.buyer = programmes.get(0).buyer();
    }

    Comparison comparison() {
        List<NetPositions.Structure> all = new ArrayList<>();
        Check check = new Check();
        for (int k = 0; k < programmes.size(); k++) {
            Programme programme = programmes.get(k);
            Treaty treaty = new Treaty(portfolio, new Programme(programme.name(), programme.layers(), programme.pricing(), buyer));
            CopulaPricing pricing = new CopulaPricing(treaty, settings, new Stoppable(control));
            layers.add(pricing.price(portfolio.dependence().copula(), IntStream.range(0, treaty.layers()).boxed().toList()));
            place.add(all.size());
            NetPositions.Structure whole = Comparison.structure(treaty, layers.get(k));
            for (int j = 0; j < treaty.layers(); j++) {
                check.that(Double.isFinite(whole.upfront()[j]), "programmes[" + k + "].layers[" + j + "].premium", whole.upfront()[j],
                        "a finite premium: quoted, or technical of a finite expected loss and loading");
            }
            all.add(whole);
            for (int j = 0; j < treaty.layers() && treaty.layers() > 1; j++) {
                all.add(without(treaty, whole.upfront(), j));
            }
        }
        check.orThrow();
        samples = NetPositions.run(portfolio, all, buyer.levels(), buyer.tailLevel(), settings, control);
        List<Structure> structures = IntStream.range(0, programmes.size()).mapToObj(this::structure).toList();
        List<StructurePair> pairs = new ArrayList<>();
        for (int a = 0; a < structures.size(); a++) {
            for (int b = a + 1; b < structures.size(); b++) {
                pairs.add(pair(structures, a, b));
            }
        }
        return new Comparison(portfolio, buyer, settings, NetFigures.of(grossMean(), samples.gross()), structures, pairs);
    }

    /** The programme without one layer, which no longer inures to any other either. */
    private NetPositions.Structure without(Treaty treaty, double[] upfront, int left) {
        String name = treaty.layer(left).name();
        List<Layer> rest = new ArrayList<>();
        double[] premiums = new double[upfront.length - 1];
        for (int j = 0; j < treaty.layers(); j++) {
            if (j != left) {
                premiums[rest.size()] = upfront[j];
                rest.add(treaty.layer(j).withoutInuring(name));
            }
        }
        return new NetPositions.Structure(new Treaty(portfolio, new Programme(treaty.programme().name(), rest, treaty.programme().pricing(), buyer)), premiums);
    }

    private Figure grossMean() {
        double mean = portfolio.expectedLoss();
        return Double.isInfinite(mean) ? Figure.INFINITE : Figure.exact(mean);
    }

    private Structure structure(int k) {
        ProgrammeCost cost = ProgrammeCost.of(layers.get(k));
        PositionSample sample = samples.net().get(place.get(k));
        Figure mean = grossMean().plus(cost.costOfCover());
        NetFigures relief = NetFigures.of(cost.costOfCover().times(-1), samples.gross().minus(sample));
        Figure capital = samples.recovered().get(place.get(k)).tailBeyondMean();
        return new Structure(programmes.get(k), layers.get(k), cost, NetFigures.of(mean, sample), relief,
                perUnit(cost.costOfCover(), relief.tailValueAtRisk()), mean.plus(sample.tailBeyondMean().times(buyer.capitalCost())), capital,
                perUnit(reinsurersResult(programmes.get(k).pricing(), layers.get(k)), capital), worths(k));
    }

    private List<Structure.LayerWorth> worths(int k) {
        List<LayerFigures> own = layers.get(k);
        PositionSample with = samples.net().get(place.get(k));
        return IntStream.range(0, own.size()).mapToObj(j -> {
            PositionSample without = own.size() == 1 ? samples.gross() : samples.net().get(place.get(k) + 1 + j);
            Figure cost = own.get(j).costOfCover();
            // what a layer costs beside the others is its own cost only where nothing inures; its mean is read from the sample otherwise
            boolean inures = programmes.get(k).layers().stream().anyMatch(layer -> layer.inuring().contains(own.get(j).name()));
            PositionSample difference = without.minus(with);
            NetFigures relief = NetFigures.of(inures ? difference.mean() : cost.times(-1), difference);
            return new Structure.LayerWorth(own.get(j).name(), cost, relief, perUnit(cost, relief.tailValueAtRisk()));
        }).toList();
    }

    /** Expected premiums after brokerage and expenses less expected recoveries. */
    private static Figure reinsurersResult(Pricing pricing, List<LayerFigures> layers) {
        double upfront = 1 - pricing.brokerage() - pricing.expenses();
        double reinstatement = 1 - pricing.expenses() - (pricing.brokerageOnReinstatements() ? pricing.brokerage() : 0);
        return layers.stream().map(layer -> layer.premium().times(upfront).plus(layer.reinstatementPremium().times(reinstatement)).minus(layer.expectedLoss()))
                .reduce(Figure.exact(0), Figure::plus);
    }

    /** Undefined where there is nothing, less than nothing or no end to divide by. */
    private static Figure perUnit(Figure cost, Figure of) {
        boolean defined = of.value() > 0 && of.value() < Double.POSITIVE_INFINITY && Double.isFinite(cost.value());
        double ratio = cost.value() / of.value();
        return defined ? new Figure(ratio, (cost.error() + Math.abs(ratio) * of.error()) / of.value()) : Figure.UNDEFINED;
    }

    private StructurePair pair(List<Structure> structures, int a, int b) {
        PositionSample difference = samples.net().get(place.get(a)).minus(samples.net().get(place.get(b)));
        Figure cost = structures.get(a).cost().costOfCover().minus(structures.get(b).cost().costOfCover());
        List<BreakEven> breakEvens = new ArrayList<>();
        if (!families.isEmpty()) {
            for (BreakEven.Measure measure : BreakEven.Measure.values()) {
                breakEvens.add(BreakEven.of(portfolio, asBuyer(a), asBuyer(b), measure, families, settings, new Stoppable(control)));
            }
        }
        return new StructurePair(a, b, NetFigures.of(cost, difference), cost, cost.plus(difference.tailBeyondMean().times(buyer.capitalCost())), breakEvens);
    }

    private Programme asBuyer(int k) {
        Programme p = programmes.get(k);
        return new Programme(p.name(), p.layers(), p.pricing(), buyer);
    }
}
