package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import layerweft.figures.LayerStatistics;
import layerweft.model.copula.Copula;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.Treaty;

/**
 * Prices layers of a treaty without noise, by transforms on lattices. What does not depend on the copula is made once and shared by all
 * engines that {@link #with} returns; these may be used on different threads only one at a time.
 */
public final class TransformEngine {
    /** A limited layer attached through its annual deductible with less than this chance is priced by {@link FarSums}. */
    private static final double FAR = 1e-3;
    private final Treaty treaty;
    private final Accuracy accuracy;
    private final Copula copula;
    private final Shared shared;
    private final Map<List<Integer>, JointLaw> nodes = new HashMap<>();

    /** What all copulas share, filled as layers are asked for. */
    private static final class Shared {
        private final Map<Integer, CountMargin> margins = new HashMap<>();
        private final Map<Integer, PreparedLayer> layers = new HashMap<>();
        private final Map<Integer, List<LayerLattice>> totals = new HashMap<>();
        private final Map<Integer, Integer> levels = new HashMap<>();
        private final Map<Integer, Integer> bracketLevels = new HashMap<>();
    }

    public TransformEngine(Treaty treaty, Accuracy accuracy) {
        this(treaty, accuracy, treaty.portfolio().dependence().copula(), new Shared());
    }

    private TransformEngine(Treaty treaty, Accuracy accuracy, Copula copula, Shared shared) {
        this.treaty = treaty;
        this.accuracy = accuracy;
        this.copula = copula;
        this.shared = shared;
    }

    /** The same treaty under another copula between the perils: quick, because the lattices are kept. */
    public TransformEngine with(Copula other) {
        other.requireDimension(treaty.portfolio().perils().size());
        return new TransformEngine(treaty, accuracy, other, shared);
    }

    /** Why a layer of the treaty has to be simulated, in plain words; empty where this engine can price it. */
    public static Optional<String> refusal(Treaty treaty, int layer) {
        return new TransformEngine(treaty, Accuracy.USUAL).refusal(layer);
    }

    /** The same for this engine's copula. */
    public Optional<String> refusal(int j) {
        Layer layer = treaty.layer(j);
        if (!layer.inuring().isEmpty()) {
            return Optional.of("recoveries of other layers inure to it, event by event");
        }
        if (layer.proRataTime()) {
            return Optional.of("its reinstatement premium is pro rata as to time");
        }
        Optional<String> parts = partsRefusal(j).or(() -> openTailRefusal(j));
        if (parts.isPresent()) {
            return parts;
        }
        int[] covered = covered(j);
        if (!totalsJoined() || covered.length == 1) {
            CountMargin[] margins = Arrays.stream(covered).mapToObj(this::margin).toArray(CountMargin[]::new);
            return LatentModel.refusal(copula, covered, margins);
        }
        LayerTerms terms = layer.terms();
        if (terms.occurrenceLimit() < Double.POSITIVE_INFINITY || terms.retention() > 0 || terms.hasFranchise()) {
            return Optional.of("the copula joins annual totals, and the layer has occurrence terms");
        }
        for (int i : covered) {
            if (!treaty.cover(j).coversWhole(i)) {
                return Optional.of("the copula joins annual totals, and the layer covers only a part of " + treaty.portfolio().perils().get(i).name());
            }
        }
        return DependentSum.refusal(copula, covered);
    }

    /** A distorted premium is an integral over the whole tail; what of it lies beyond the lattice is bounded by the variance of single losses. */
    private Optional<String> openTailRefusal(int j) {
        Loading loading = treaty.programme().pricing().loading();
        boolean distorted = loading instanceof Loading.ProportionalHazard || loading instanceof Loading.Wang;
        LayerTerms terms = treaty.layer(j).terms();
        if (!distorted || terms.annualLimit() < Double.POSITIVE_INFINITY || terms.occurrenceLimit() < Double.POSITIVE_INFINITY) {
            return Optional.empty();
        }
        int[] covered = covered(j);
        boolean bounded = (covered.length == 1 || !totalsJoined()) && Arrays.stream(covered).allMatch(i ->
                treaty.portfolio().perils().get(i).eventLoss() instanceof EventLoss.Single single && single.severity().limitedSecondMoment(Double.POSITIVE_INFINITY) < Double.POSITIVE_INFINITY);
        return bounded ? Optional.empty() : Optional.of("its loading weighs a tail without a limit, and the transform cannot bound what is far up");
    }

    private Optional<String> partsRefusal(int j) {
        Portfolio portfolio = treaty.portfolio();
        for (int i = 0; i < portfolio.perils().size(); i++) {
            Peril peril = portfolio.perils().get(i);
            if (treaty.cover(j).covers(i) && peril.eventLoss() instanceof EventLoss.Split split) {
                int layer = j;
                int at = i;
                int[] members = java.util.stream.IntStream.range(0, split.subPerils().size()).filter(k -> treaty.cover(layer).covers(at, k)).toArray();
                if (members.length > 3) {
                    return Optional.of("it covers " + members.length + " sub-perils of " + peril.name() + ", and the transform takes at most 3");
                }
                for (int k : members) {
                    if (members.length > 1 && PartsSum.hasAtoms(split.subPerils().get(k).severity())) {
                        return Optional.of("the losses of sub-peril " + peril.name() + "/" + split.subPerils().get(k).name() + " are discrete");
                    }
                }
                Optional<String> reason = DependentSum.refusal(split.copula(), members);
                if (reason.isPresent()) {
                    return reason;
                }
            }
        }
        return Optional.empty();
    }

    /**
     * All figures of a layer, at 100 %.
     *
     * @throws IllegalArgumentException if the layer is one of those that {@link #refusal(int)} names
     */
    public LayerStatistics price(int layer) {
        require(layer);
        if (prepared(layer).perils().length == 0) {
            return UnreachableLayer.statistics(treaty.programme().buyer());
        }
        LayerAnswer answer = answer(layer, sums(layer));
        LayerStatistics statistics = answer.statistics();
        shared.bracketLevels.merge(layer, answer.bracketLevel(), Math::max);
        return statistics;
    }

    /**
     * The law of the layer's annual loss, for curves and other figures.
     *
     * @throws IllegalArgumentException if the layer is one of those that {@link #refusal(int)} names, or no loss can reach it
     */
    public TransformLaw law(int layer) {
        require(layer);
        if (prepared(layer).perils().length == 0) {
            throw new IllegalArgumentException("no loss can reach layer \"" + treaty.layer(layer).name() + "\"");
        }
        AnnualSums sums = sums(layer);
        LayerAnswer answer = answer(layer, sums);
        return new TransformLaw(sums, answer.finest(), answer.coarser(), answer.facts(), treaty.layer(layer).terms());
    }

    private LayerAnswer answer(int layer, AnnualSums sums) {
        LayerAnswer answer = answer(layer, sums, shared.levels.getOrDefault(layer, 0));
        shared.levels.merge(layer, answer.level(), Math::max);
        boolean far = answer.reachedRarely(FAR) && sums instanceof CountSums && !branched(shared.layers.get(layer).perils());
        return far ? answer(layer, farSums(layer, sums), answer.level()) : answer;
    }

    private LayerAnswer answer(int layer, AnnualSums sums, int level) {
        return new LayerAnswer(sums, treaty.layer(layer).terms(), treaty.programme(), accuracy, level, shared.bracketLevels.getOrDefault(layer, 0));
    }

    private boolean branched(int[] perils) {
        return LatentModel.branched(copula, perils, Arrays.stream(perils).mapToObj(this::margin).toArray(CountMargin[]::new));
    }

    private FarSums farSums(int layer, AnnualSums usual) {
        PreparedLayer prepared = shared.layers.get(layer);
        CountMargin[] margins = Arrays.stream(prepared.perils())
                .mapToObj(i -> CountMargin.of(treaty.portfolio().perils().get(i).frequency(), FarSums.COUNT_TAIL)).toArray(CountMargin[]::new);
        return new FarSums(prepared, usual, LatentModel.law(copula, prepared.perils(), margins, FarSums.PROBABILITIES));
    }

    private void require(int layer) {
        refusal(layer).ifPresent(reason -> {
            throw new IllegalArgumentException("layer \"" + treaty.layer(layer).name() + "\" needs simulation: " + reason);
        });
    }

    private AnnualSums sums(int layer) {
        PreparedLayer prepared = prepared(layer);
        if (totalsJoined() && prepared.perils().length > 1) {
            return totals(layer, prepared);
        }
        return new CountSums(prepared, nodes(prepared.perils()).hits(prepared.hitChances(), LatentModel.MERGING * accuracy.ofProbabilities()));
    }

    private PreparedLayer prepared(int layer) {
        return shared.layers.computeIfAbsent(layer, j -> PreparedLayer.of(treaty, j, accuracy));
    }

    private boolean totalsJoined() {
        return treaty.portfolio().dependence().links() == Dependence.Links.ANNUAL_TOTALS;
    }

    private JointLaw nodes(int[] perils) {
        List<Integer> key = Arrays.stream(perils).boxed().toList();
        JointLaw known = nodes.get(key);
        if (known == null) {
            CountMargin[] margins = Arrays.stream(perils).mapToObj(this::margin).toArray(CountMargin[]::new);
            known = LatentModel.law(copula, perils, margins, accuracy.ofProbabilities());
            nodes.put(key, known);
        }
        return known;
    }

    private CountMargin margin(int peril) {
        return shared.margins.computeIfAbsent(peril, i -> CountMargin.of(treaty.portfolio().perils().get(i).frequency(), accuracy.ofCounts()));
    }

    private int[] covered(int layer) {
        return java.util.stream.IntStream.range(0, treaty.portfolio().perils().size()).filter(i -> treaty.cover(layer).covers(i)).toArray();
    }

    private AnnualSums totals(int layer, PreparedLayer prepared) {
        List<LayerLattice> lattices = shared.totals.computeIfAbsent(layer, j -> {
            List<LayerLattice> made = new ArrayList<>();
            for (EventLaw event : prepared.events()) {
                made.add(prepared.lattice().of(event));
            }
            return made;
        });
        LatentNodes[] alone = new LatentNodes[lattices.size()];
        double[] u = new double[treaty.portfolio().perils().size()];
        Arrays.fill(u, 1);
        for (int i = 0; i < alone.length; i++) {
            int peril = prepared.perils()[i];
            alone[i] = new LatentNodes(new double[] {1}, new double[][][] {{margin(peril).survival()}}, 0);
            u[peril] = 1 - JointDeficit.at(alone[i], new double[] {prepared.events().get(i).hitChance()});
        }
        double nothing = prepared.terms().deductible() > 0 ? 0 : copula.cdf(u);
        return new TotalSums(prepared, lattices, alone, copula, nothing);
    }
}
