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
    /** Below this part of P(A &gt; 0) the deductible asks for transforms that keep more digits. */
    private static final double RARE = 1e-3;
    private final AnnualSums sums;
    private final LayerTerms terms;
    private final Programme programme;
    private final Accuracy accuracy;
    private final LatticeSum[] levels = new LatticeSum[3];
    private int start;
    private SumFacts facts;
    private Figure[] figures;

    /** @param start level to begin with, where an earlier answer for this layer ended */
    LayerAnswer(AnnualSums sums, LayerTerms terms, Programme programme, Accuracy accuracy, int start) {
        this.sums = sums;
        this.terms = terms;
        this.programme = programme;
        this.accuracy = accuracy;
        this.start = start;
        refine();
    }

    /** The coarsest of the three levels that were good enough. */
    int level() {
        return start;
    }

    LatticeSum finest() {
        return levels[2];
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
        double wanted = accuracy.relative() * scale();
        while (figures[0].error() > wanted && 2L * sums.cells(start + 2) <= accuracy.mostCells()) {
            start++;
            levels[0] = levels[1];
            levels[1] = levels[2];
            levels[2] = sums.sum(start + 2);
            compute();
        }
    }

    private boolean rare() {
        double[] mean = levels[2].mean();
        int at = Math.min(mean.length - 1, (int) (terms.deductible() / levels[2].step()));
        return terms.deductible() > 0 && mean.length > 0 && mean[at] < RARE * mean[0];
    }

    /** What errors are measured by: L, M where there is no L, the expected loss where there is neither. */
    private double scale() {
        double line = terms.line();
        return line < Double.POSITIVE_INFINITY ? line : Math.max(facts.mean() < Double.POSITIVE_INFINITY ? facts.mean() : 0, terms.deductible());
    }

    private void compute() {
        facts = sums.facts(levels[2]);
        Loading loading = programme.pricing().loading();
        List<Double> asked = programme.buyer().levels();
        double[][] rows = new double[3][];
        for (int k = 0; k < 3; k++) {
            rows[k] = new LevelFigures(levels[k], terms, facts, sums.end()).row(loading, asked, programme.buyer().tailLevel());
        }
        figures = new Figure[rows[0].length];
        double depth = sums.end() - terms.deductible();
        double probability = sums.jointError() + levels[2].noise();
        for (int f = 0; f < figures.length; f++) {
            boolean isProbability = f == 2 || f == 3;
            double floor = isProbability ? probability : f >= 8 ? levels[2].step() * 1e-3 : probability * depth;
            figures[f] = Extrapolation.of(rows[0][f], rows[1][f], rows[2][f], floor);
        }
    }

    LayerStatistics statistics() {
        List<Double> asked = programme.buyer().levels();
        SortedMap<Double, Figure> valueAtRisk = new TreeMap<>();
        SortedMap<Double, Figure> occurrence = new TreeMap<>();
        for (int k = 0; k < asked.size(); k++) {
            Figure v = figures[8 + k];
            valueAtRisk.put(asked.get(k), new Figure(Math.min(Math.max(0, v.value()), terms.annualLimit()), v.error()));
            double largest = sums.largestEvent(asked.get(k));
            occurrence.put(asked.get(k), Double.isNaN(largest) ? Figure.UNDEFINED : new Figure(largest, 1e-12 * largest));
        }
        Figure mean = positive(figures[0]);
        Bracket bracket = Double.isInfinite(mean.value()) ? null : sums.bracket(start + 2, levels[2]);
        PremiumBuildUp premium = PremiumBuildUp.of(programme.pricing(), new PremiumBuildUp.Inputs(mean.value(), figures[1].value(),
                figures[6].value(), figures[5].value(), figures[4].value()));
        double premiumError = error(premium.slopes());
        return new LayerStatistics(Engine.TRANSFORM, mean, bracket, positive(figures[1]), probability(figures[2]),
                probability(figures[3]), Figure.exact(facts.expectedEvents()), positive(figures[4]),
                new Figure(premium.net(), netError(premium, premiumError)), new Figure(premium.upfront(), premiumError), valueAtRisk,
                positive(figures[7]), occurrence);
    }

    private double error(PremiumBuildUp.Slopes slopes) {
        return part(slopes.byExpectedLoss(), figures[0]) + part(slopes.byStandardDeviation(), figures[1]) + part(slopes.byTail(), figures[6])
                + part(slopes.byDistorted(), figures[5]) + part(slopes.byReinstatementFactor(), figures[4]);
    }

    /** The net premium is the upfront one without the divisor, and does not move with the reinstatement factor. */
    private double netError(PremiumBuildUp premium, double upfrontError) {
        double divisor = premium.upfront() == 0 ? 1 : premium.net() / premium.upfront();
        return Math.max(0, upfrontError - part(premium.slopes().byReinstatementFactor(), figures[4])) * divisor;
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
