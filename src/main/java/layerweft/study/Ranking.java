package layerweft.study;

import java.util.List;
import java.util.Optional;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.model.Check;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Treaty;

/**
 * What moves a price most: the change of one figure for a step of 0.1 in τ, another family at the same τ, and 10 % of each peril's frequency,
 * severity and tail, one at a time.
 *
 * @param layer the layer looked at; empty for the sum over the programme
 * @param base the figure as it is
 * @param sensitivities the largest change first, whatever its sign
 * @param notVaried what could not be varied, and why, in words
 */
public record Ranking(
        Treaty treaty, Optional<String> layer, FigureKind figure, Figure base, List<Sensitivity> sensitivities, List<String> notVaried) {
    /** Step of each peril's assumptions. */
    public static final double PART = 0.1;
    /** Step of Kendall's τ. */
    public static final double TAU_STEP = 0.1;

    public Ranking {
        sensitivities = List.copyOf(sensitivities);
        notVaried = List.copyOf(notVaried);
    }

    /**
     * Ranks.
     *
     * @param layer name of a layer; empty for the sum over all
     * @param settings for layers that the transform cannot price: simulated with the same random numbers before and after each step
     * @throws layerweft.model.InadmissibleException if there is no layer of the name, or the figure cannot be added over layers
     * @throws java.util.concurrent.CancellationException if the control stops it
     */
    public static Ranking of(Treaty treaty, Optional<String> layer, FigureKind figure, SimulationSettings settings, RunControl control) {
        new Check().that(layer.isEmpty() || treaty.programme().indexOf(layer.get()) >= 0, "layer", "\"" + layer.orElse("") + "\"",
                        "one of " + String.join(", ", treaty.programme().layers().stream().map(Layer::name).toList()))
                .that(layer.isPresent() || figure.additive(), "figure", figure.label() + " of a whole programme",
                        "expectedLoss, netPremium or technicalPremium, whose sum over the layers means something; others with --layer")
                .orThrow();
        return new RankingRun(treaty, layer, figure, settings, control).ranking();
    }
}
