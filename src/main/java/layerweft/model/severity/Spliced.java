package layerweft.model.severity;

import java.util.function.DoublePredicate;
import java.util.function.DoubleSupplier;
import java.util.function.DoubleUnaryOperator;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;

/**
 * Body and tail from different laws: P(X &gt; threshold) = tailWeight; below, the body's law given X ≤ threshold; above, the tail's law
 * given X &gt; threshold.
 *
 * @param threshold u, above 0, with body below and tail above it
 * @param tailWeight w, in (0, 1)
 */
public record Spliced(SeverityModel body, double threshold, SeverityModel tail, double tailWeight) implements SeverityModel {

    public Spliced {
        Check check = new Check().positive("threshold", threshold).between("tailWeight", tailWeight, 0, 1);
        if (threshold > 0) {
            check.that(body.cdf(threshold) > 0, "threshold", threshold, "an amount that the body can fall below")
                    .that(tail.survival(threshold) > 0, "threshold", threshold, "an amount that the tail can exceed");
        }
        check.orThrow();
    }

    @Override
    public double cdf(double x) {
        return x <= threshold ? ofBody() * body.cdf(x) : 1 - ofTail() * tail.survival(x);
    }

    @Override
    public double survival(double x) {
        return x < threshold ? tailWeight + ofBody() * (body.survival(x) - body.survival(threshold))
                : x == threshold ? tailWeight : ofTail() * tail.survival(x);
    }

    @Override
    public double atom(double x) {
        return x <= threshold ? ofBody() * body.atom(x) : ofTail() * tail.atom(x);
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return p <= 1 - tailWeight ? bodyQuantile(p) : tailQuantile(1 - p);
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return q >= tailWeight ? bodyQuantile(1 - q) : tailQuantile(q);
    }

    @Override
    public double mean() {
        return limitedMean(Double.POSITIVE_INFINITY);
    }

    @Override
    public double limitedMean(double x) {
        return layerMean(0, x);
    }

    /** ∫ P(X &gt; x) dx below and above the threshold. */
    @Override
    public double layerMean(double from, double to) {
        double start = Math.max(from, 0);
        double sum = 0;
        if (start < threshold) {
            double end = Math.min(to, threshold);
            sum += (tailWeight - ofBody() * body.survival(threshold)) * (end - start) + ofBody() * body.layerMean(start, end);
        }
        if (to > threshold) {
            sum += ofTail() * tail.layerMean(Math.max(start, threshold), to);
        }
        return sum;
    }

    @Override
    public double limitedSecondMoment(double x) {
        double end = Math.min(Math.max(x, 0), threshold);
        double square = ofBody() * (body.limitedSecondMoment(end) - end * end * body.survival(threshold)) + tailWeight * end * end;
        return x <= threshold ? square : square + ofTail() * (tail.limitedSecondMoment(x) - tail.limitedSecondMoment(threshold));
    }

    @Override
    public double upperEnd() {
        return tail.upperEnd();
    }

    @Override
    public SeveritySampler sampler() {
        Part low = part(body, body.cdf(threshold), u -> bodyQuantile((1 - tailWeight) * u), x -> x <= threshold);
        Part high = part(tail, tail.survival(threshold), u -> tailQuantile(tailWeight * u), x -> x > threshold);
        return stream -> {
            DoubleSupplier below = low.bind(stream);
            DoubleSupplier above = high.bind(stream);
            return () -> stream.nextDouble() < tailWeight ? above.getAsDouble() : below.getAsDouble();
        };
    }

    /** One side of the threshold as a source of losses. */
    private interface Part {
        DoubleSupplier bind(KeyedStream stream);
    }

    /** By the model's own sampler, drawing again until the loss is on the right side, where that is likely; else by the quantile. */
    private static Part part(SeverityModel model, double chance, DoubleUnaryOperator quantile, DoublePredicate inside) {
        if (chance < 0.5) {
            return stream -> () -> quantile.applyAsDouble(stream.nextOpen());
        }
        SeveritySampler sampler = model.sampler();
        return stream -> {
            DoubleSupplier losses = sampler.bind(stream);
            return () -> {
                double x = losses.getAsDouble();
                while (!inside.test(x)) {
                    x = losses.getAsDouble();
                }
                return x;
            };
        };
    }

    /** Density of X by that of the body, below the threshold. */
    private double ofBody() {
        return (1 - tailWeight) / body.cdf(threshold);
    }

    /** Density of X by that of the tail, above the threshold. */
    private double ofTail() {
        return tailWeight / tail.survival(threshold);
    }

    private double bodyQuantile(double p) {
        return Math.min(body.quantile(Math.min(1, p / ofBody())), threshold);
    }

    private double tailQuantile(double q) {
        return Math.max(tail.survivalQuantile(Math.min(1, q / ofTail())), threshold);
    }
}
