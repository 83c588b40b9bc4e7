package layerweft.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.DoubleFunction;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.NetPositions;
import layerweft.engine.simulation.PositionSample;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.figures.ProgrammeCost;
import layerweft.model.Check;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.TauRange;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/**
 * The strength of dependence at which one programme becomes cheaper for the buyer than another, family by family. The upfront premium is the
 * quoted one, the technical one (which moves with τ) where none is quoted; each layer counts at its share.
 *
 * @param measure by what they are compared
 * @param answers in the order of the families
 */
public record BreakEven(Portfolio portfolio, Programme first, Programme second, Measure measure, List<Answer> answers) {
    /** Nearer to comonotonic (or countermonotonic) perils than this no break-even is looked for. */
    private static final double STRONGEST = 0.95;
    /** Of τ, where all layers are priced by the transform. */
    private static final double FINE = 1e-6;
    /** Of τ, where simulation is needed. */
    private static final double COARSE = 1e-3;
    /** Years of each simulation of net positions: two dozen are needed for a family. */
    private static final long MOST_YEARS = 200_000;

    /** By what programmes are compared. */
    public enum Measure {
        /** Premiums with the expected reinstatement premium less expected recoveries. */
        EXPECTED_COST("expectedCost", "expected cost"),
        /** E[net position] + capital cost·(TVaR − E), the net position with all premiums, at the first programme's tail level and capital cost. */
        COST_OF_RISK("costOfRisk", "cost of risk");

        private final String label;
        private final String words;

        Measure(String label, String words) {
            this.label = label;
            this.words = words;
        }

        /** As written in files. */
        public String label() {
            return label;
        }

        /** As said to a reader. */
        public String words() {
            return words;
        }
    }

    public BreakEven {
        answers = List.copyOf(answers);
    }

    /** What is found of a family. */
    public enum Outcome {
        /** The programmes change places at the τ given. */
        CROSSES,
        /** The first is cheaper at every τ. */
        ALWAYS,
        /** The first is cheaper at no τ: the second always is. */
        NEVER,
        /** The costs differ at no τ by more than their errors. */
        EQUAL,
        /** A cost is infinite or not defined. */
        UNDEFINED
    }

    /**
     * The answer for one family.
     *
     * @param from lowest τ looked at: of the family's range for two perils, 0 for more
     * @param to highest τ looked at
     * @param taus where the programmes change places, rising, with errors; at each of them the cheaper one changes
     * @param cheaperBelow name of the programme that is cheaper below the first of them, of the cheaper one throughout where there are none;
     *     null where they are equal or not defined
     * @param differenceFrom cost of the first less cost of the second at {@code from}
     * @param differenceTo the same at {@code to}
     */
    public record Answer(
            CopulaFamily family,
            double from,
            double to,
            Outcome outcome,
            List<Figure> taus,
            String cheaperBelow,
            Figure differenceFrom,
            Figure differenceTo) {

        public Answer {
            taus = List.copyOf(taus);
        }

        /**
         * The sign of the first programme's cost less the second's at a τ: −1 where the first is cheaper; 0 where they do not differ or are not
         * defined.
         *
         * @param first name of the first programme
         */
        int signAt(double tau, String first) {
            if (cheaperBelow == null) {
                return 0;
            }
            long crossed = taus.stream().filter(t -> t.value() < tau).count();
            return (cheaperBelow.equals(first) ? -1 : 1) * (crossed % 2 == 0 ? 1 : -1);
        }
    }

    /**
     * Compares two programmes on one portfolio, whose links are kept and whose copula is not looked at.
     *
     * @param settings for layers that the transform cannot price: simulated with the same random numbers for both programmes and at every τ
     * @throws layerweft.model.InadmissibleException if a family has no strength or comes twice, or a programme does not fit the portfolio
     * @throws java.util.concurrent.CancellationException if the control stops it
     */
    public static BreakEven of(Portfolio portfolio, Programme first, Programme second, Measure measure, List<CopulaFamily> families,
            SimulationSettings settings, RunControl control) {
        Check findings = new Check().that(!families.isEmpty(), "families", "an empty list", "at least one family");
        Families.check(findings, families);
        findings.orThrow();
        Treaty a = new Treaty(portfolio, first);
        Treaty b = new Treaty(portfolio, second);
        SimulationSettings oneThread = new SimulationSettings(measure == Measure.COST_OF_RISK ? Math.min(MOST_YEARS, settings.years()) : settings.years(),
                settings.seed(), 1);
        Answer[] answers = new Answer[families.size()];
        List<Callable<Void>> tasks = new ArrayList<>();
        for (int f = 0; f < answers.length; f++) {
            int at = f;
            tasks.add(() -> {
                answers[at] = answer(families.get(at), a, b, measure, oneThread, control);
                return null;
            });
        }
        Parallel.run(tasks, settings.threads(), new Steps(control, tasks.size()));
        return new BreakEven(portfolio, first, second, measure, List.of(answers));
    }

    private static Answer answer(CopulaFamily family, Treaty first, Treaty second, Measure measure, SimulationSettings settings, RunControl control) {
        int perils = first.portfolio().perils().size();
        TauRange range = family.tauRange(perils);
        double from = perils > 2 ? Math.max(0, range.low()) : Math.max(-STRONGEST, range.low());
        double to = Math.min(STRONGEST, range.high());
        CopulaPricing ofFirst = new CopulaPricing(first, settings, control);
        CopulaPricing ofSecond = new CopulaPricing(second, settings, control);
        boolean simulated = measure == Measure.COST_OF_RISK || simulated(first, ofFirst, family, from) || simulated(second, ofSecond, family, from);
        DoubleFunction<Figure> difference = tau -> {
            Copula copula = family.at(tau);
            List<LayerFigures> one = ofFirst.price(copula, layers(first));
            List<LayerFigures> other = ofSecond.price(copula, layers(second));
            Figure cost = ProgrammeCost.of(one).costOfCover().minus(ProgrammeCost.of(other).costOfCover());
            return measure == Measure.EXPECTED_COST ? cost : cost.plus(chargeDifference(first, one, second, other, copula, settings, control));
        };
        TauScan.Roots roots = new TauScan(difference, simulated ? COARSE : FINE).on(from, to);
        Outcome outcome = !roots.defined() ? Outcome.UNDEFINED : !roots.roots().isEmpty() ? Outcome.CROSSES
                : roots.signBelow() < 0 ? Outcome.ALWAYS : roots.signBelow() > 0 ? Outcome.NEVER : Outcome.EQUAL;
        String cheaper = roots.signBelow() < 0 ? first.programme().name() : roots.signBelow() > 0 ? second.programme().name() : null;
        return new Answer(family, from, to, outcome, roots.roots(), cheaper, roots.atLow(), roots.atHigh());
    }

    /** Capital cost·(TVaR − E) of the first net position less that of the second, from the same simulated years. */
    private static Figure chargeDifference(Treaty first, List<LayerFigures> one, Treaty second, List<LayerFigures> other, Copula copula,
            SimulationSettings settings, RunControl control) {
        Buyer buyer = first.programme().buyer();
        Portfolio joined = first.portfolio().with(new Dependence(first.portfolio().dependence().links(), copula));
        List<NetPositions.Structure> structures = List.of(Comparison.structure(first.on(joined), one), Comparison.structure(second.on(joined), other));
        if (structures.stream().anyMatch(s -> !Double.isFinite(Arrays.stream(s.upfront()).sum()))) {
            return Figure.UNDEFINED;
        }
        List<PositionSample> net = NetPositions.run(joined, structures, List.of(), buyer.tailLevel(), settings, new Stoppable(control)).net();
        return net.get(0).minus(net.get(1)).tailBeyondMean().times(buyer.capitalCost());
    }

    private static boolean simulated(Treaty treaty, CopulaPricing pricing, CopulaFamily family, double tau) {
        return layers(treaty).stream().anyMatch(j -> pricing.refusal(j, List.of(family.at(tau))).isPresent());
    }

    private static List<Integer> layers(Treaty treaty) {
        return IntStream.range(0, treaty.layers()).boxed().toList();
    }
}
