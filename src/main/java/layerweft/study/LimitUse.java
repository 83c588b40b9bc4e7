package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/**
 * How much of each full limit a layer uses in a year on average: the first limit, then one for each reinstatement. Use of limit k is
 * E[min(max(Y − (k−1)·L, 0), L)]/L, the difference of the expected losses of two annual limits; the uses of all limits add up to the loss on line.
 *
 * @param name of the layer
 * @param limits full limits that the year can use, the last of them possibly in part; infinite where the year has no limit
 * @param uses of the first limits, at most {@value #MOST}; empty where the layer has no occurrence limit
 */
public record LimitUse(String name, double limits, List<Figure> uses) {
    /** Limits looked at one by one. */
    public static final int MOST = 6;

    public LimitUse {
        uses = List.copyOf(uses);
    }

    /**
     * For each layer of a treaty, by the transform where it can, by simulation of the same years elsewhere.
     *
     * @throws java.util.concurrent.CancellationException if the control stops it
     */
    public static List<LimitUse> of(Treaty treaty, SimulationSettings settings, RunControl control) {
        List<Layer> layers = new ArrayList<>(treaty.programme().layers());
        List<List<Integer>> places = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            LayerTerms terms = treaty.layer(j).terms();
            List<Integer> own = new ArrayList<>();
            for (int k = 1; terms.occurrenceLimit() < Double.POSITIVE_INFINITY && k <= looked(terms); k++) {
                own.add(layers.size());
                layers.add(upTo(treaty.layer(j), k, j));
            }
            places.add(own);
        }
        Programme p = treaty.programme();
        Treaty asked = new Treaty(treaty.portfolio(), new Programme(p.name(), layers, p.pricing(), p.buyer()));
        List<LayerFigures> priced = new CopulaPricing(asked, settings, control).price(treaty.portfolio().dependence().copula(),
                IntStream.range(treaty.layers(), layers.size()).boxed().toList());
        List<LimitUse> uses = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            LayerTerms terms = treaty.layer(j).terms();
            List<Figure> own = new ArrayList<>();
            Figure before = Figure.exact(0);
            for (int place : places.get(j)) {
                Figure upTo = priced.get(place - treaty.layers()).expectedLoss().times(1 / (treaty.layer(j).share() * terms.occurrenceLimit()));
                own.add(upTo.minus(before));
                before = upTo;
            }
            uses.add(new LimitUse(treaty.layer(j).name(), terms.annualLimit() / terms.occurrenceLimit(), own));
        }
        return uses;
    }

    private static int looked(LayerTerms terms) {
        return (int) Math.min(MOST, Math.ceil(terms.annualLimit() / terms.occurrenceLimit() - 1e-9));
    }

    /** The layer with an annual limit of its first k occurrence limits; nothing inures to others from it. */
    private static Layer upTo(Layer layer, int k, int j) {
        LayerTerms terms = layer.terms();
        double limit = Math.min(k * terms.occurrenceLimit(), terms.annualLimit());
        return new Layer("first " + k + " of " + j + " " + layer.name(), layer.perils(), layer.occurrence(), new AnnualTerms(layer.annual().deductible(), limit), null,
                layer.quotaShare(), layer.share(), false, layer.inuring(), null);
    }
}
