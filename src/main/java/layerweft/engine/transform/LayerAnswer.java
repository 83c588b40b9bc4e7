package layerweft.engine.transform;

import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import layerweft.figures.Bracket;
import layerweft.figures.Engine;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.figures.PremiumBuildUp;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.Programme;

/** Refines a layer's lattices until its expected loss is as good as wanted and writes down its figures with their errors. */
final class LayerAnswer {
    /** Below these parts of P(A &gt; 0) the deductible or the end of the layer asks for transforms that keep more digits. */
    private static final double RARE = 1e-3;
    /** Errors of figures measured by themselves may be so many times larger than the accuracy: they are stated with much to spare. */
    private static final double OWN_SIZE = 30;
    /** Values at risk may have errors so many times the accuracy, of themselves. */
    private static final double QUANTILES = 1000;
    /** Where {@link LevelFigures#means} has the distortion's integral. */
    private static final int DISTORTED = 3;
    private static final int CHEAP_CELLS = 4096;
    /** The same where there is no annual limit: the lattice reaches far, and the figures are about its lower end. */
    private static final int CHEAP_OPEN_CELLS = 1 << 15;
    private static final double RARELY_FULL = 3e-6;
    /** Width wanted of the guaranteed range, as a part of the limit. */
    private static final double NARROW = 5e-5;
    /** A range that shrinks by less than this factor is as wide as what no lattice removes. */
    private static final double WORTHWHILE = 0.7;
    private final AnnualSums sums;
    private final LayerTerms terms;
    private final Programme programme;
    private final Accuracy accuracy;
    private final LatticeSum[] levels = new LatticeSum[3];
    private int start;
    private int bracketLevel;
    private SumFacts facts;
    private Figure[] means;
    private Figure[] points;
    /** Errors of the means that a finer lattice makes smaller. */
    private double[] latticeError;

    /**
     * @param start level to begin with, where an earlier answer for this layer ended
     * @param bracketLevel the same for the guaranteed range
     */
    LayerAnswer(AnnualSums sums, LayerTerms terms, Programme programme, Accuracy accuracy, int start, int bracketLevel) {
        this.sums = sums;
        this.terms = terms;
        this.programme = programme;
        this.accuracy = accuracy;
        this.start = start;
        this.bracketLevel = bracketLevel;
        refine();
    }

    /** The coarsest of the three levels that were good enough. */
    int level() {
        return start;
    }

    /** The level at which the guaranteed range was narrow enough, once the {@link #statistics} are made. */
    int bracketLevel() {
        return bracketLevel;
    }

    /** Whether a limited layer with an annual deductible is attached with less than this chance. */
    boolean reachedRarely(double chance) {
        return terms.deductible() > 0 && terms.annualLimit() < Double.POSITIVE_INFINITY && points[0].value() < chance;
    }

    LatticeSum finest() {
        return levels[2];
    }

    /** The sum on the lattice of twice the finest step. */
    LatticeSum coarser() {
        return levels[1];
    }

    SumFacts facts() {
        return facts;
    }

    private void refine() {
        for (int k = 0; k < 3; k++) {
            levels[k] = sums.sum(start + k);
        }
        if (rare() && sums.sharpen()) {
            for (int k = 0; k < 3; k++) {
                levels[k] = sums.sum(start + k);
            }
        }
        compute();
        while (!good() && 2L * sums.longest(start + 2) <= accuracy.mostCells()) {
            start++;
            levels[0] = levels[1];
            levels[1] = levels[2];
            levels[2] = sums.sum(start + 2);
            compute();
        }
    }

    /** Whether the lattice's part of the errors is small: of the limit for the expected loss, and, while that is cheap, of each figure itself. */
    private boolean good() {
        if (latticeError[0] > accuracy.relative() * scale()) {
            return false;
        }
        double part = OWN_SIZE * accuracy.relative();
        boolean cheap = 2L * sums.cells(start + 2) <= (terms.annualLimit() < Double.POSITIVE_INFINITY ? CHEAP_CELLS : CHEAP_OPEN_CELLS);
        for (int k = 2; cheap && k < points.length; k++) {
            if (points[k].error() > QUANTILES * accuracy.relative() * points[k].value() + 1e-5 * levels[2].step()) {
                return false;
            }
        }
        return !cheap || latticeError[0] <= part * Math.abs(means[0].value()) && latticeError[1] <= part * means[1].value()
                && points[0].error() <= part * points[0].value() + floor() && points[1].error() <= 2 * part * points[1].value() + floor();
    }

    private boolean rare() {
        double[] mean = levels[2].mean();
        int at = Math.min(mean.length - 1, (int) (terms.deductible() / levels[2].step()));
        int last = Math.min(mean.length, sums.cells(start + 2)) - 1;
        return terms.deductible() > 0 && mean[at] < RARE * mean[0]
                || terms.annualLimit() < Double.POSITIVE_INFINITY && mean[last] < RARELY_FULL * mean[0];
    }

    /** What errors are measured by: L, M where there is no L, the expected loss where there is neither. */
    private double scale() {
        double line = terms.line();
        return line < Double.POSITIVE_INFINITY ? line : Math.max(facts.mean() < Double.POSITIVE_INFINITY ? facts.mean() : 0, terms.deductible());
    }

    private void compute() {
        facts = sums.facts(levels[2]);
        Loading loading = programme.pricing().loading();
        double[][] rows = new double[3][];
        for (int k = 0; k < 3; k++) {
            rows[k] = figures(levels[k]).means(loading, programme.buyer().tailLevel());
        }
        means = new Figure[rows[0].length];
        latticeError = new double[means.length];
        double floor = floor() * sums.weightOfErrors();
        double unlimited = Double.isInfinite(terms.annualLimit()) ? sums.meanError() : 0;
        for (int f = 0; f < means.length; f++) {
            Figure figure = Extrapolation.of(rows[0][f], rows[1][f], rows[2][f]);
            latticeError[f] = figure.error();
            double beyond = f == DISTORTED && !Double.isNaN(figure.value()) ? figures(levels[2]).distortedBeyond(loading, sums.cap(), sums.capPassed()) : 0;
            means[f] = new Figure(figure.value(), figure.error() + beyond + (f == 0 ? floor + unlimited : Math.max(floor, floor() * (sums.end() - terms.deductible()))));
        }
        double deviation = means[1].value();
        means[1] = Double.isInfinite(deviation) ? Figure.exact(deviation) : new Figure(deviation, means[1].error() + (deviation > 0 ? facts.secondMomentError() / (2 * deviation) : 0));
        points = points();
    }

    /** Error of probabilities that no lattice removes. */
    private double floor() {
        return sums.jointError() + levels[2].noise();
    }

    private LevelFigures figures(LatticeSum sum) {
        return new LevelFigures(sum, terms, facts, sums.end());
    }

    /** Point values of the two finest lattices, each corrected by the one below it. */
    private Figure[] points() {
        List<Double> asked = programme.buyer().levels();
        LevelFigures finer = figures(levels[2].corrected(levels[1]));
        LevelFigures coarser = figures(levels[1].corrected(levels[0]));
        double[] fine = finer.points(asked);
        double[] coarse = coarser.points(asked);
        Figure[] points = new Figure[fine.length];
        double probability = floor();
        for (int f = 0; f < fine.length; f++) {
            boolean exact = f >= 2 && fine[f] == coarse[f] && surelyOnAtom(finer, coarser, fine[f], 1 - asked.get(f - 2));
            points[f] = exact ? Figure.exact(fine[f])
                    : new Figure(fine[f], Math.abs(fine[f] - coarse[f]) + (f < 2 ? probability : 1e-6 * levels[2].step()));
        }
        return points;
    }

    /** Whether P(Y &gt; y) is below the tail and P(Y ≥ y) above it, by more than their errors: then y is the quantile and nothing else is. */
    private boolean surelyOnAtom(LevelFigures finer, LevelFigures coarser, double y, double tail) {
        boolean most = y >= terms.annualLimit();
        double above = most ? 0 : finer.survival(y);
        double reaches = above + finer.atom(y);
        double error = floor() + 1e-12 + (most ? 0 : Math.abs(above - coarser.survival(y)));
        double atomError = Math.abs(finer.atom(y) - coarser.atom(y));
        return tail - above > error && reaches - tail > error + atomError && finer.atom(y) > 0;
    }

    LayerStatistics statistics() {
        List<Double> asked = programme.buyer().levels();
        SortedMap<Double, Figure> valueAtRisk = new TreeMap<>();
        SortedMap<Double, Figure> occurrence = new TreeMap<>();
        for (int k = 0; k < asked.size(); k++) {
            Figure v = points[2 + k];
            valueAtRisk.put(asked.get(k), new Figure(Math.min(Math.max(0, v.value()), terms.annualLimit()), v.error()));
            double largest = sums.largestEvent(asked.get(k));
            occurrence.put(asked.get(k), Double.isNaN(largest) ? Figure.UNDEFINED : new Figure(largest, 1e-12 * largest));
        }
        Figure mean = positive(means[0]);
        Bracket bracket = accuracy.brackets() && mean.value() < Double.POSITIVE_INFINITY ? bracket() : null;
        PremiumBuildUp premium = PremiumBuildUp.of(programme.pricing(), new PremiumBuildUp.Inputs(mean.value(), means[1].value(),
                means[4].value(), means[3].value(), means[2].value()));
        double premiumError = error(premium.slopes());
        return new LayerStatistics(Engine.TRANSFORM, mean, bracket, positive(means[1]), probability(points[0]),
                Double.isInfinite(terms.annualLimit()) ? Figure.exact(0) : probability(points[1]), Figure.exact(facts.expectedEvents()), positive(means[2]),
                new Figure(premium.net(), netError(premium, premiumError)), new Figure(premium.upfront(), premiumError), valueAtRisk,
                positive(means[5]), occurrence);
    }

    /** On finer lattices than the figures need, until the range is narrow; a range of second order shrinks to a quarter each time. */
    private Bracket bracket() {
        int level = Math.max(start + 2, bracketLevel);
        Bracket bracket = sums.bracket(level);
        bracketLevel = level;
        long most = Math.min(accuracy.mostCells(), sums.mostBracketCells());
        while (bracket.high() - bracket.low() > NARROW * scale() && 2L * sums.longest(level) <= most) {
            double excess = (bracket.high() - bracket.low()) / (NARROW * scale());
            int more = (int) Math.max(1, Math.ceil(0.5 * Math.log(excess) / Math.log(2)));
            while (more > 1 && (long) sums.longest(level) << more > most) {
                more--;
            }
            level += more;
            Bracket finer = sums.bracket(level);
            double before = bracket.high() - bracket.low();
            bracket = new Bracket(Math.max(bracket.low(), finer.low()), Math.min(bracket.high(), finer.high()));
            if (bracket.high() - bracket.low() > WORTHWHILE * before) {
                break;
            }
            bracketLevel = level;
        }
        return bracket;
    }

    private double error(PremiumBuildUp.Slopes slopes) {
        return part(slopes.byExpectedLoss(), means[0]) + part(slopes.byStandardDeviation(), means[1]) + part(slopes.byTail(), means[4])
                + part(slopes.byDistorted(), means[3]) + part(slopes.byReinstatementFactor(), means[2]);
    }

    /** The net premium is the upfront one without the divisor, and does not move with the reinstatement factor. */
    private double netError(PremiumBuildUp premium, double upfrontError) {
        double divisor = premium.upfront() == 0 ? 1 : premium.net() / premium.upfront();
        return Math.max(0, upfrontError - part(premium.slopes().byReinstatementFactor(), means[2])) * divisor;
    }

    private static double part(double slope, Figure figure) {
        return slope == 0 ? 0 : Math.abs(slope) * figure.error();
    }

    private static Figure positive(Figure figure) {
        return new Figure(Math.max(0, figure.value()), figure.error());
    }

    private static Figure probability(Figure figure) {
        return new Figure(Math.min(1, Math.max(0, figure.value())), figure.error());
    }
}
