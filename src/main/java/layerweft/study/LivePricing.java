package layerweft.study;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ConcurrentHashMap;
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
 * transform prepares, and layers that no copula moves, are kept as long as only the copula changes. {@link #price} and {@link #along} are
 * for one thread at a time; {@link #rough} may run beside them.
 */
public final class LivePricing {
    /** Years of the short simulation: some tens of milliseconds, and an error that is shown. */
    public static final long SHORT_RUN = 20_000;
    /** A layer whose transform takes longer than this for one copula is simulated where many copulas are asked for. */
    private static final long LONGEST_OF_MANY = 400_000_000;

    private final Treaty treaty;
    private final TransformEngine engine;
    private final SimulationSettings settings;
    private final Map<Integer, LiveLayer> resting;

    /** @param settings of the short simulations; see {@link #shortRun} */
    public LivePricing(Treaty treaty, SimulationSettings settings) {
        this(treaty, new TransformEngine(treaty, Accuracy.USUAL), settings, new ConcurrentHashMap<>());
    }

    private LivePricing(Treaty treaty, TransformEngine engine, SimulationSettings settings, Map<Integer, LiveLayer> resting) {
        this.treaty = treaty;
        this.engine = engine;
        this.settings = settings;
        this.resting = resting;
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
        return differsByCopulaOnly(other)
                ? new LivePricing(other, engine.with(other.portfolio().dependence().copula()), settings, resting) : new LivePricing(other, settings);
    }

    private boolean differsByCopulaOnly(Treaty other) {
        return treaty.portfolio().dependence().links() == other.portfolio().dependence().links()
                && treaty.programme().equals(other.programme())
                && treaty.portfolio().with(Dependence.NONE).equals(other.portfolio().with(Dependence.NONE));
    }

    private LivePricing with(Copula copula) {
        Dependence joined = new Dependence(treaty.portfolio().dependence().links(), copula);
        return new LivePricing(treaty.on(treaty.portfolio().with(joined)), engine.with(copula), settings, resting);
    }

    /**
     * All layers, in the order of the programme.
     *
     * @throws CancellationException if the control stops it
     */
    public List<LiveLayer> price(RunControl control) {
        return price(control, Map.of());
    }

    /**
     * All layers of another treaty from the short simulation alone, but for layers that are known and no copula moves: a first answer where
     * the transform takes longer than a hand can wait.
     */
    public List<LiveLayer> rough(Treaty other, RunControl control) {
        Map<Integer, LiveLayer> known = differsByCopulaOnly(other) ? Map.copyOf(resting) : Map.of();
        return rough(other, settings, known, control);
    }

    /** The same where nothing is known yet. */
    public static List<LiveLayer> rough(Treaty treaty, SimulationSettings settings, RunControl control) {
        return rough(treaty, settings, Map.of(), control);
    }

    private static List<LiveLayer> rough(Treaty treaty, SimulationSettings settings, Map<Integer, LiveLayer> known, RunControl control) {
        List<LayerStatistics> simulated = Simulation.run(treaty, settings, control).layers();
        List<LiveLayer> layers = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            layers.add(known.containsKey(j) ? known.get(j)
                    : layer(treaty, j, simulated.get(j), Optional.of("the transform is still at work")));
        }
        return layers;
    }

    /**
     * All layers under each of many copulas; a layer has the same engine under all, so that curves through them have no steps. The first copula
     * tells which layers the transform takes too long for.
     *
     * @return by copula, by layer
     * @throws CancellationException if the control stops it
     */
    public List<List<LiveLayer>> along(List<Copula> copulas, RunControl control) {
        Map<Integer, String> slow = new HashMap<>();
        for (int j = 0; j < treaty.layers(); j++) {
            for (Copula copula : copulas) {
                int layer = j;
                engine.with(copula).refusal(j).ifPresent(reason -> slow.putIfAbsent(layer, reason));
            }
        }
        Map<Integer, Long> nanoseconds = new HashMap<>();
        List<List<LiveLayer>> priced = new ArrayList<>();
        for (int k = 0; k < copulas.size(); k++) {
            control.progress(k, copulas.size());
            if (k == 0) {
                // twice: the first pays for what is prepared once
                with(copulas.get(0)).price(control, slow);
                with(copulas.get(0)).price(control, slow, nanoseconds);
                nanoseconds.forEach((j, time) -> {
                    if (time > LONGEST_OF_MANY) {
                        slow.put(j, "the transform takes too long for a curve");
                    }
                });
            }
            priced.add(with(copulas.get(k)).price(control, slow));
        }
        return priced;
    }

    private List<LiveLayer> price(RunControl control, Map<Integer, String> toSimulate) {
        return price(control, toSimulate, new HashMap<>());
    }

    /** @param toSimulate layers that the transform is not to price, and why; @param nanoseconds receives what the transform took by layer */
    private List<LiveLayer> price(RunControl control, Map<Integer, String> toSimulate, Map<Integer, Long> nanoseconds) {
        List<LayerStatistics> simulated = null;
        List<LiveLayer> layers = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            if (control.cancelled() || Thread.currentThread().isInterrupted()) {
                throw new CancellationException("a newer treaty is to be priced");
            }
            if (resting.containsKey(j)) {
                layers.add(resting.get(j));
                continue;
            }
            int layer = j;
            Optional<String> refusal = Optional.ofNullable(toSimulate.get(j)).or(() -> engine.refusal(layer));
            if (refusal.isPresent() && simulated == null) {
                simulated = Simulation.run(treaty, settings, silent(control)).layers();
            }
            long start = System.nanoTime();
            LayerStatistics statistics = refusal.isPresent() ? simulated.get(j) : engine.price(j);
            nanoseconds.put(j, refusal.isPresent() ? 0 : System.nanoTime() - start);
            LiveLayer priced = layer(treaty, j, statistics, refusal);
            if (refusal.isEmpty() && priced.unmoved().isPresent()) {
                resting.put(j, priced);
            }
            layers.add(priced);
        }
        return layers;
    }

    private static LiveLayer layer(Treaty treaty, int j, LayerStatistics statistics, Optional<String> refusal) {
        return new LiveLayer(LayerFigures.of(treaty.layer(j), treaty.programme().buyer(), statistics), refusal, DependenceReach.none(treaty, j),
                LayerNotes.of(treaty, j, refusal));
    }

    /** A short simulation's progress is not that of the whole. */
    private static RunControl silent(RunControl whole) {
        return new RunControl() {
            @Override
            public void progress(long done, long total) {
                // over before anybody could read it
            }

            @Override
            public boolean cancelled() {
                return whole.cancelled();
            }
        };
    }
}
