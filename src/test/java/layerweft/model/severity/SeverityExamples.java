package layerweft.model.severity;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;

/** Laws of every kind, ordinary and extreme, for the tests that hold for all of them. */
final class SeverityExamples {
    private static final List<Double> LOSSES = List.of(3.0, 8.0, 0.0, 13.5, 40.0, 8.0);

    private SeverityExamples() {}

    static List<SeverityModel> all() {
        List<SeverityModel> all = new ArrayList<>(smooth());
        all.addAll(withAtoms());
        all.addAll(spliced());
        return all;
    }

    /** Laws with a density. */
    static List<SeverityModel> smooth() {
        return List.of(
                new Lognormal(1.5, 1.2), new Lognormal(15, 0.05), new Lognormal(-3, 3), Lognormal.ofMeanAndCv(14, 2.1),
                new Pareto(5, 1.6), new Pareto(2, 0.8), new Pareto(2, 1), new Pareto(2, 2), new Pareto(1e6, 1 + 1e-9), new Pareto(2, 2 - 1e-9),
                new Pareto(2, 12),
                new GeneralizedPareto(2, 9, 0.4), new GeneralizedPareto(2, 9, 0), new GeneralizedPareto(2, 9, 1e-10),
                new GeneralizedPareto(2, 9, -0.3), new GeneralizedPareto(0, 3, 1.2), new GeneralizedPareto(1, 3, 1),
                new GeneralizedPareto(1, 3, 0.5), new GeneralizedPareto(1, 3, -1e-7), new GeneralizedPareto(0, 3, -1),
                new GeneralizedPareto(0, 3, -2.5),
                new Gamma(0.7, 6), new Gamma(4, 5), new Gamma(0.05, 100), new Gamma(400, 0.1), Gamma.ofMeanAndCv(20, 1.5),
                new Weibull(0.6, 8), new Weibull(2.5, 8), new Weibull(0.15, 1), new Weibull(20, 100), new Weibull(1, 7), new Weibull(0.01, 1),
                new Burr(1.3, 1.7, 12), new Burr(0.5, 1.8, 12), new Burr(20, 0.8, 50), new Burr(0.05, 30, 10), new Burr(1, 1, 7),
                new Burr(1, 2, 7), new Burr(0.3, 0.5, 3), new Burr(50, 3, 10), new Burr(0.6, 1.7, 12), new Burr(0.02, 8, 1),
                new Loglogistic(2.2, 7), new Loglogistic(0.9, 7), new Loglogistic(1, 7), new Loglogistic(8, 1000),
                new Exponential(11), new Exponential(1e-3),
                new InverseGaussian(10, 4), new InverseGaussian(10, 400), new InverseGaussian(10, 0.05), new InverseGaussian(10, 1e5),
                new Beta(0.4, 3.5, 200), new Beta(2, 1, 1), new Beta(3, 0.5, 100), new Beta(1, 1, 10), new Beta(200, 300, 1e6),
                new Beta(0.05, 0.05, 10));
    }

    /** Total losses, caps, discrete losses. */
    static List<SeverityModel> withAtoms() {
        List<SeverityModel> all = new ArrayList<>(List.of(
                new Mbbefd(12.6, 4.2, 50), new Mbbefd(1, 4, 50), new Mbbefd(0.25, 4, 50), new Mbbefd(1 + 1e-9, 4, 50),
                new Mbbefd(0.25 * (1 - 1e-9), 4, 50), new Mbbefd(1e-6, 2, 10), new Mbbefd(30, 1000, 1), new Mbbefd(2, 1, 50),
                new DiscreteLosses(List.of(1.0, 5.0, 20.0, 100.0), List.of(0.5, 0.3, 0.15, 0.05)),
                new DiscreteLosses(List.of(7.0), List.of(1.0)),
                DiscreteLosses.ofEquallyLikely(LOSSES),
                new Capped(new Lognormal(1.5, 1.2), 30), new Capped(new Pareto(2, 0.6), 300), new Capped(new Beta(2, 1, 1), 5),
                new Capped(DiscreteLosses.ofEquallyLikely(LOSSES), 13.5),
                new Capped(new Mbbefd(12.6, 4.2, 50), 20),
                new Mixture(List.of(0.85, 0.15), List.of(Lognormal.ofMeanAndCv(4, 1), new Pareto(10, 1.5))),
                new Mixture(List.of(0.4, 0.0, 0.6), List.of(DiscreteLosses.ofEquallyLikely(LOSSES), new Pareto(1, 0.1), new Exponential(6))),
                new Mixture(List.of(0.5, 0.5), List.of(new Capped(new Exponential(9), 12), new Beta(2, 2, 30)))));
        DoubleStream.of(0, 1.5, 5, 10).forEach(c -> all.add(Mbbefd.ofC(c, 100)));
        return all;
    }

    static List<SeverityModel> spliced() {
        return List.of(
                new Spliced(Lognormal.ofMeanAndCv(6, 1.2), 20, new Pareto(20, 1.4), 0.08),
                new Capped(new Spliced(Gamma.ofMeanAndCv(5, 0.9), 15, new GeneralizedPareto(15, 8, 0.5), 0.12), 400),
                new Spliced(new Exponential(5), 10, Lognormal.ofMeanAndCv(12, 2), 0.2),
                new Spliced(new Lognormal(1, 1), 15, new Pareto(30, 1.4), 0.05),
                new Spliced(DiscreteLosses.ofEquallyLikely(LOSSES), 8, DiscreteLosses.ofEquallyLikely(LOSSES), 0.3));
    }

    /** Amounts at which a survival function steps or has a kink, in no order. */
    static DoubleStream kinks(SeverityModel model) {
        if (model instanceof Capped capped) {
            return DoubleStream.concat(DoubleStream.of(capped.cap()), kinks(capped.model()));
        }
        if (model instanceof Mixture mixture) {
            return mixture.components().stream().flatMapToDouble(SeverityExamples::kinks);
        }
        if (model instanceof Spliced spliced) {
            return DoubleStream.concat(DoubleStream.of(spliced.threshold()),
                    Stream.of(spliced.body(), spliced.tail()).flatMapToDouble(SeverityExamples::kinks));
        }
        if (model instanceof DiscreteLosses discrete) {
            return discrete.losses().stream().mapToDouble(Double::doubleValue);
        }
        return DoubleStream.of(model.quantile(0), model.upperEnd()).filter(Double::isFinite);
    }

    /** Amounts with a positive chance, rising. */
    static double[] atoms(SeverityModel model) {
        return kinks(model).filter(x -> model.atom(x) > 0).sorted().distinct().toArray();
    }

    /** Amounts over the whole range of the law, far into both tails and at its kinks, rising; of those whose squares are numbers. */
    static double[] amounts(SeverityModel model) {
        double[] p = {1e-12, 1e-6, 1e-3, 0.02, 0.1, 0.25, 0.4, 0.5};
        DoubleStream quantiles = DoubleStream.concat(Arrays.stream(p).map(model::quantile), Arrays.stream(p).map(model::survivalQuantile));
        return DoubleStream.concat(quantiles, kinks(model)).filter(x -> x == 0 || x > 1e-150 && x < 1e150).sorted().distinct().toArray();
    }
}
