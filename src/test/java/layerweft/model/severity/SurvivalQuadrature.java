package layerweft.model.severity;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** ∫ S(x) dx and ∫ 2x·S(x) dx by Gauss–Legendre rules between the kinks and the quantiles of a law: short, slow and independent of its formulas. */
final class SurvivalQuadrature {
    private static final int NODES = 24;
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(NODES);
    /** Part of an amount below which nothing is left of an integral up to it. */
    private static final double LEAST = 1e-25;

    private SurvivalQuadrature() {}

    /**
     * ∫_from^to S(x)·weight dx, weight 1 for moment 1 and 2x for moment 2.
     *
     * @param to finite
     */
    static double integral(SeverityModel model, int moment, double from, double to) {
        double[] cuts = cuts(model, from, to);
        double sum = 0;
        for (int k = cuts.length - 1; k > 0; k--) {
            double half = (cuts[k] - cuts[k - 1]) / 2;
            double middle = cuts[k - 1] + half;
            for (int i = 0; i < NODES; i++) {
                double x = middle + half * RULE.getPoint(i);
                sum += half * RULE.getWeight(i) * model.survival(x) * (moment == 1 ? 1 : 2 * x);
            }
        }
        return sum;
    }

    /** Kinks, quantiles at probabilities that halve towards both tails, amounts that halve the way to the end, and steps of a third of an amount at most, so that each piece is smooth. */
    private static double[] cuts(SeverityModel model, double from, double to) {
        DoubleStream low = DoubleStream.iterate(0.5, p -> p > 1e-18, p -> p / 2).map(model::quantile);
        DoubleStream high = DoubleStream.iterate(0.5, q -> q > 1e-30, q -> q / 2).map(model::survivalQuantile);
        DoubleStream top = DoubleStream.iterate(0.5, r -> r > 1e-16, r -> r / 2).map(r -> model.upperEnd() * (1 - r));
        DoubleStream inner = Stream.of(low, high, top, SeverityExamples.kinks(model)).flatMapToDouble(s -> s);
        double[] coarse = DoubleStream.concat(DoubleStream.of(from, to), inner.filter(x -> x > Math.max(from, LEAST * to) && x < to)).sorted().distinct().toArray();
        DoubleStream fine = Arrays.stream(coarse);
        for (int k = 1; k < coarse.length; k++) {
            double a = Math.max(coarse[k - 1], LEAST * coarse[k]);
            double b = coarse[k];
            int pieces = (int) Math.ceil(Math.log(b / a) / 0.3);
            fine = DoubleStream.concat(fine, DoubleStream.iterate(1, i -> i < pieces, i -> i + 1).map(i -> a * Math.pow(b / a, i / pieces)));
        }
        return fine.sorted().distinct().toArray();
    }
}
