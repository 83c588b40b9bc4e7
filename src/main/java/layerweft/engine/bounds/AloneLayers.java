package layerweft.engine.bounds;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.TransformEngine;
import layerweft.engine.transform.TransformLaw;
import layerweft.figures.Figure;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/** One layer taken apart: its occurrence terms on each of its perils alone, and on all of them independent of each other. */
final class AloneLayers {
    /** Laws are not extrapolated: a lattice of up to 8,192 cells. */
    private static final Accuracy OF_LAWS = new Accuracy(1e-12, 1 << 13, false);
    /** Fewer where events are sums over sub-perils, whose laws take their time. */
    private static final Accuracy OF_SPLIT_LAWS = new Accuracy(1e-12, 1 << 12, false);
    private static final Accuracy OF_VALUES = Accuracy.of(1e-7);
    private final Portfolio portfolio;
    private final Treaty original;
    private final Layer layer;
    private final List<List<String>> covered = new ArrayList<>();
    private final boolean split;

    AloneLayers(Treaty treaty, int layer) {
        this.original = treaty;
        this.portfolio = treaty.portfolio().with(Dependence.NONE);
        this.layer = treaty.layer(layer);
        boolean parts = false;
        for (int i = 0; i < portfolio.perils().size(); i++) {
            if (treaty.cover(layer).covers(i) && reaches(i, treaty, layer)) {
                covered.add(names(treaty, layer, i));
                parts |= portfolio.perils().get(i).eventLoss() instanceof EventLoss.Split;
            }
        }
        split = parts;
    }

    /** Whether events of a peril that happen at all can be large enough. */
    private boolean reaches(int i, Treaty treaty, int j) {
        Peril peril = portfolio.perils().get(i);
        double largest = 0;
        if (peril.eventLoss() instanceof EventLoss.Single single) {
            largest = single.severity().upperEnd();
        } else if (peril.eventLoss() instanceof EventLoss.Split split) {
            for (int k = 0; k < split.subPerils().size(); k++) {
                largest += treaty.cover(j).covers(i, k) ? split.subPerils().get(k).severity().upperEnd() : 0;
            }
        }
        return peril.frequency().mean() > 0 && layer.terms().occurrenceLoss(largest) > 0;
    }

    private static List<String> names(Treaty treaty, int layer, int i) {
        Peril peril = treaty.portfolio().perils().get(i);
        if (treaty.cover(layer).coversWhole(i)) {
            return List.of(peril.name());
        }
        EventLoss.Split split = (EventLoss.Split) peril.eventLoss();
        return IntStream.range(0, split.subPerils().size()).filter(k -> treaty.cover(layer).covers(i, k))
                .mapToObj(k -> peril.name() + "/" + split.subPerils().get(k).name()).toList();
    }

    /** Number of covered perils that can reach the layer. */
    int perils() {
        return covered.size();
    }

    /** Why the laws of the A_i are not known; empty where they are. */
    Optional<String> refusal() {
        return covered.isEmpty() ? Optional.empty() : TransformEngine.refusal(treaty(List.of(whole())), 0);
    }

    /** E of the layer for independent A_i. */
    Figure independent() {
        return new TransformEngine(treaty(List.of(whole())), OF_VALUES).price(0).expectedLoss();
    }

    private Layer whole() {
        LayerTerms terms = layer.terms();
        return with("whole", covered.stream().flatMap(List::stream).toList(), new AnnualTerms(terms.deductible(), terms.annualLimit()));
    }

    /** The laws of min(A_i, cap): on the finest lattice, and on that of twice the step. */
    Margin[][] margins(double cap) {
        List<Layer> layers = each(new AnnualTerms(0, cap));
        TransformEngine engine = new TransformEngine(treaty(layers), split ? OF_SPLIT_LAWS : OF_LAWS);
        Margin[][] margins = new Margin[2][layers.size()];
        for (int i = 0; i < layers.size(); i++) {
            TransformLaw law = engine.law(i);
            TransformLaw coarser = law.coarser();
            margins[0][i] = Margin.of(law.bounds(), law.averages());
            margins[1][i] = Margin.of(coarser.bounds(), coarser.averages());
        }
        return margins;
    }

    /** ΣE[(A_i − y)+]. */
    Figure beyond(double y) {
        List<Layer> layers = each(new AnnualTerms(y, Double.POSITIVE_INFINITY));
        TransformEngine engine = new TransformEngine(treaty(layers), OF_VALUES);
        Figure sum = Figure.exact(0);
        for (int i = 0; i < layers.size(); i++) {
            sum = sum.plus(engine.price(i).expectedLoss());
        }
        return sum;
    }

    private List<Layer> each(AnnualTerms annual) {
        return IntStream.range(0, covered.size()).mapToObj(i -> with("peril " + i, covered.get(i), annual)).toList();
    }

    private Layer with(String name, List<String> perils, AnnualTerms annual) {
        return new Layer(name, perils, layer.occurrence(), annual, null, layer.quotaShare(), 1, false, List.of(), null);
    }

    private Treaty treaty(List<Layer> layers) {
        return new Treaty(portfolio, new Programme("perils alone", layers, Pricing.PLAIN, original.programme().buyer()));
    }
}
