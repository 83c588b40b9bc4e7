package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.LayerFigures;
import layerweft.figures.LayerStatistics;
import layerweft.model.copula.Copula;
import layerweft.model.portfolio.Dependence;
import layerweft.model.treaty.Treaty;

/**
 * Prices a treaty again and again while somebody changes it: by the transform where it can, by a short simulation elsewhere. What the
 * transform prepares is kept as long as only the copula changes. Use from one thread at a time.
 */
public final class LivePricing {
    /** Years of the short simulation: some tens of milliseconds, and an error that is shown. */
    public static final long SHORT_RUN = 20_000;

    private final Treaty treaty;
    private final TransformEngine engine;
    private final SimulationSettings settings;

    /** @param settings of the short simulations; see {@link #shortRun} */
    public LivePricing(Treaty treaty, SimulationSettings settings) {
        this(treaty, new TransformEngine(treaty, Accuracy.USUAL), settings);
    }

    private LivePricing(Treaty treaty, TransformEngine engine, SimulationSettings settings) {
        this.treaty = treaty;
        this.engine = engine;
        this.settings = settings;
    }

    /** {@value #SHORT_RUN} years with the seed and threads of the usual run. */
    public static SimulationSettings shortRun() {
        SimulationSettings usual = SimulationSettings.usual();
        return new SimulationSettings(SHORT_RUN, usual.seed(), usual.threads());
    }

    public Treaty treaty() {
        return treaty;
    }

    /** Pricing of another treaty; quick where it differs from this one in nothing but the copula between the perils. */
    public LivePricing of(Treaty other) {
        Dependence mine = treaty.portfolio().dependence();
        Dependence its = other.portfolio().dependence();
        boolean copulaOnly = mine.links() == its.links() && treaty.programme().equals(other.programme())
                && treaty.portfolio().with(Dependence.NONE).equals(other.portfolio().with(Dependence.NONE));
        return copulaOnly ? new LivePricing(other, engine.with(its.copula()), settings) : new LivePricing(other, settings);
    }

    /** The same treaty under another copula. */
    public LivePricing with(Copula copula) {
        Dependence joined = new Dependence(treaty.portfolio().dependence().links(), copula);
        return new LivePricing(treaty.on(treaty.portfolio().with(joined)), engine.with(copula), settings);
    }

    /**
     * All layers, in the order of the programme.
     *
     * @throws CancellationException if the control stops it
     */
    public List<LiveLayer> price(RunControl control) {
        List<LayerStatistics> simulated = null;
        List<LiveLayer> layers = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            if (control.cancelled() || Thread.currentThread().isInterrupted()) {
                throw new CancellationException("a newer treaty is to be priced");
            }
            Optional<String> refusal = engine.refusal(j);
            if (refusal.isPresent() && simulated == null) {
                simulated = Simulation.run(treaty, settings, control).layers();
            }
            LayerStatistics statistics = refusal.isPresent() ? simulated.get(j) : engine.price(j);
            layers.add(new LiveLayer(LayerFigures.of(treaty.layer(j), treaty.programme().buyer(), statistics), refusal,
                    DependenceReach.none(treaty, j), LayerNotes.of(treaty, j, refusal)));
        }
        return layers;
    }
}
