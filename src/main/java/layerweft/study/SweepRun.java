package layerweft.study;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.concurrent.Callable;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.model.treaty.Treaty;

/** One sweep at work: prices what has to be priced, then puts the points together. */
final class SweepRun {
    private static final List<Copula> ENDS = List.of(new Independence(), new Comonotonic());

    private final Treaty treaty;
    private final SweepRequest request;
    private final SimulationSettings settings;
    private final RunControl control;
    private final CopulaPricing pricing;
    private final List<Integer> still;
    private final List<Curve> curves = new ArrayList<>();
    private final LayerFigures[][] ends = new LayerFigures[ENDS.size()][];
    private final List<List<LayerFigures>> simulatedEnds = new ArrayList<>();

    /** One family: which layers the transform prices, and the figures by τ. */
    private static final class Curve {
        private final CopulaFamily family;
        private final Map<Integer, String> refusals = new LinkedHashMap<>();
        private final TauLadder priced;
        private final TauLadder simulated;
        private final List<Double> taus;
        private final LayerFigures[][] transform;
        private final Map<Double, List<LayerFigures>> simulation = new TreeMap<>();
        private final Map<Double, List<LayerFigures>> check = new TreeMap<>();

        Curve(CopulaFamily family, List<Double> asked, int perils) {
            this.family = family;
            priced = new TauLadder(asked, family.tauRange(perils), true);
            simulated = new TauLadder(asked, family.tauRange(perils), false);
            taus = priced.taus();
            transform = new LayerFigures[taus.size()][];
        }

        List<Copula> copulas() {
            return taus.stream().map(family::at).toList();
        }

        LayerFigures at(double tau, int layer) {
            return refusals.containsKey(layer) ? simulation.get(tau).get(layer) : transform[taus.indexOf(tau)][layer];
        }

        Figure slope(double tau, int layer, FigureKind figure) {
            return (refusals.containsKey(layer) ? simulated : priced).slope(tau, t -> figure.of(at(t, layer)));
        }
    }

    SweepRun(Treaty treaty, SweepRequest request, SimulationSettings settings, RunControl control) {
        this.treaty = treaty;
        this.request = request;
        this.settings = settings;
        this.control = control;
        pricing = new CopulaPricing(treaty, settings, control);
        still = positions().filter(j -> DependenceReach.none(treaty, j).isPresent()).boxed().toList();
    }

    List<LayerSweep> layers() {
        for (CopulaFamily family : request.families()) {
            Curve curve = new Curve(family, request.taus(), treaty.portfolio().perils().size());
            positions().filter(j -> !still.contains(j)).forEach(j ->
                    pricing.refusal(j, curve.copulas()).ifPresent(reason -> curve.refusals.put(j, reason)));
            curves.add(curve);
        }
        boolean endsToo = positions().anyMatch(j -> pricing.refusal(j, ENDS).isPresent() || curves.stream().anyMatch(c -> c.refusals.containsKey(j)));
        List<Callable<Void>> tasks = transformTasks();
        List<Runnable> simulations = simulations(endsToo);
        Steps steps = new Steps(control, tasks.size() + simulations.size());
        Parallel.run(tasks, settings.threads(), steps);
        simulations.forEach(simulation -> {
            simulation.run();
            steps.one();
        });
        return positions().mapToObj(this::layer).toList();
    }

    private IntStream positions() {
        return IntStream.range(0, treaty.layers());
    }

    private List<Callable<Void>> transformTasks() {
        List<Callable<Void>> tasks = new ArrayList<>();
        for (Curve curve : curves) {
            for (int k = 0; k < curve.transform.length; k++) {
                curve.transform[k] = new LayerFigures[treaty.layers()];
            }
            List<Integer> layers = positions().filter(j -> !still.contains(j) && !curve.refusals.containsKey(j)).boxed().toList();
            tasks.addAll(pricing.transform(curve.copulas(), layers, curve.transform));
        }
        for (int e = 0; e < ends.length; e++) {
            ends[e] = new LayerFigures[treaty.layers()];
        }
        tasks.addAll(pricing.transform(ENDS, positions().filter(j -> pricing.refusal(j, ENDS).isEmpty()).boxed().toList(), ends));
        return tasks;
    }

    /** One after the other, as each uses all threads. */
    private List<Runnable> simulations(boolean endsToo) {
        List<Runnable> simulations = new ArrayList<>();
        for (Curve curve : curves) {
            for (double tau : request.taus()) {
                if (!curve.refusals.isEmpty()) {
                    simulations.add(() -> curve.simulation.put(tau, pricing.simulate(curve.family.at(tau), settings.years())));
                }
                if (request.check() > 0) {
                    simulations.add(() -> curve.check.put(tau, pricing.simulate(curve.family.at(tau), request.check())));
                }
            }
        }
        if (endsToo) {
            ENDS.forEach(end -> simulations.add(() -> simulatedEnds.add(pricing.simulate(end, settings.years()))));
        }
        return simulations;
    }

    private LayerSweep layer(int j) {
        boolean simulated = curves.stream().anyMatch(curve -> curve.refusals.containsKey(j));
        LayerFigures independent = end(0, j, simulated);
        LayerFigures comonotone = still.contains(j) ? independent : end(1, j, simulated);
        Optional<String> reason = DependenceReach.none(treaty, j, request.figure());
        List<SweepPoint> points = new ArrayList<>();
        for (Curve curve : curves) {
            for (double tau : request.taus()) {
                points.add(point(curve, tau, j));
            }
        }
        Figure ceiling = request.figure().of(comonotone);
        List<String> refusals = curves.stream().map(curve -> curve.refusals.get(j)).filter(r -> r != null).distinct().toList();
        return new LayerSweep(treaty.layer(j).name(), reason, refusals, independent, comonotone, ceiling,
                reason.isPresent() ? rest(ceiling) : lift(ceiling, request.figure().of(independent)), points);
    }

    private LayerFigures end(int e, int j, boolean simulated) {
        return simulated || ends[e][j] == null ? simulatedEnds.get(e).get(j) : ends[e][j];
    }

    private SweepPoint point(Curve curve, double tau, int j) {
        LayerFigures independent = end(0, j, curve.refusals.containsKey(j));
        LayerFigures figures = still.contains(j) ? independent : curve.at(tau, j);
        FigureKind kind = request.figure();
        Figure value = kind.of(figures);
        boolean unmoved = DependenceReach.none(treaty, j, kind).isPresent();
        boolean meanUnmoved = DependenceReach.none(treaty, j, FigureKind.EXPECTED_LOSS).isPresent();
        return new SweepPoint(curve.family, tau, figures,
                meanUnmoved ? rest(figures.expectedLoss()) : lift(figures.expectedLoss(), independent.expectedLoss()), value,
                unmoved ? rest(value) : lift(value, kind.of(independent)),
                unmoved ? rest(value) : curve.slope(tau, j, kind),
                request.check() > 0 ? curve.check.get(tau).get(j) : null);
    }

    /** The lift and the slope of a figure that cannot move. */
    private static Figure rest(Figure value) {
        return Double.isFinite(value.value()) ? Figure.exact(0) : Figure.UNDEFINED;
    }

    /** φ/φ_0 − 1; the errors are added as if they went together, which for simulations with the same random numbers is more than they are. */
    private static Figure lift(Figure value, Figure independent) {
        if (!(independent.value() > 0) || independent.infinite() || !Double.isFinite(value.value())) {
            return Figure.UNDEFINED;
        }
        double ratio = value.value() / independent.value();
        return new Figure(ratio - 1, (value.error() + Math.abs(ratio) * independent.error()) / independent.value());
    }
}
