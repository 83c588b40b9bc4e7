package layerweft.study;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import java.util.stream.IntStream;
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
 * Prices the layers of one treaty under many copulas, keeping what the copula joins. A transform engine serves a fixed number of copulas in
 * turn, so that results depend neither on the number of threads nor on what else is asked for.
 */
final class CopulaPricing {
    /** Copulas that share the preparation of one engine: long enough to pay for it, short enough to keep all threads busy. */
    private static final int SHARE = 12;

    private final Treaty treaty;
    private final SimulationSettings settings;
    private final RunControl control;
    private final TransformEngine prepared;
    private final Map<Integer, LayerFigures> resting = new HashMap<>();

    CopulaPricing(Treaty treaty, SimulationSettings settings, RunControl control) {
        this.treaty = treaty;
        this.settings = settings;
        this.control = control;
        this.prepared = new TransformEngine(treaty, Accuracy.USUAL);
    }

    /** Why the layer has to be simulated under at least one of the copulas; empty where the transform can price it under all. */
    Optional<String> refusal(int layer, List<Copula> copulas) {
        return copulas.stream().map(copula -> prepared.with(copula).refusal(layer)).flatMap(Optional::stream).findFirst();
    }

    /**
     * Tasks that price, by the transform, the wanted layers under each of the copulas.
     *
     * @param layers positions of the wanted layers
     * @param out receives the figures, {@code out[copula][layer]}
     */
    List<Callable<Void>> transform(List<Copula> copulas, List<Integer> layers, LayerFigures[][] out) {
        List<Callable<Void>> tasks = new ArrayList<>();
        for (int from = 0; from < copulas.size() && !layers.isEmpty(); from += SHARE) {
            int first = from;
            int end = Math.min(copulas.size(), from + SHARE);
            tasks.add(() -> {
                TransformEngine ownEngine = new TransformEngine(treaty, Accuracy.USUAL);
                for (int k = first; k < end; k++) {
                    TransformEngine engine = ownEngine.with(copulas.get(k));
                    for (int j : layers) {
                        stopIfAsked();
                        out[k][j] = figures(j, engine.price(j));
                    }
                }
                return null;
            });
        }
        return tasks;
    }

    /**
     * Figures of the wanted layers under a copula, by the transform where it can price them and by simulation elsewhere, on the calling
     * thread. For studies that ask for one copula after the other: the transform's preparation is kept, and so are layers that no copula moves.
     *
     * @param layers positions; the figures come in their order
     */
    List<LayerFigures> price(Copula copula, List<Integer> layers) {
        List<Integer> moving = layers.stream().filter(j -> !resting.containsKey(j)).toList();
        Map<Integer, LayerFigures> priced = new HashMap<>(resting);
        TransformEngine engine = prepared.with(copula);
        List<LayerFigures> simulated = null;
        for (int j : moving) {
            stopIfAsked();
            if (engine.refusal(j).isEmpty()) {
                priced.put(j, figures(j, engine.price(j)));
            } else {
                simulated = simulated == null ? simulate(copula, settings.years()) : simulated;
                priced.put(j, simulated.get(j));
            }
            if (DependenceReach.none(treaty, j).isPresent()) {
                resting.put(j, priced.get(j));
            }
        }
        return layers.stream().map(priced::get).toList();
    }

    /** All layers under a copula, simulated with the same random numbers for every copula. */
    List<LayerFigures> simulate(Copula copula, long years) {
        Dependence joined = new Dependence(treaty.portfolio().dependence().links(), copula);
        List<LayerStatistics> statistics = Simulation.run(treaty.on(treaty.portfolio().with(joined)),
                new SimulationSettings(years, settings.seed(), settings.threads()), new Stoppable(control)).layers();
        return IntStream.range(0, treaty.layers()).mapToObj(j -> figures(j, statistics.get(j))).toList();
    }

    private LayerFigures figures(int j, LayerStatistics statistics) {
        return LayerFigures.of(treaty.layer(j), treaty.programme().buyer(), statistics);
    }

    private void stopIfAsked() {
        if (control.cancelled() || Thread.currentThread().isInterrupted()) {
            throw new CancellationException("the study was stopped");
        }
    }
}
