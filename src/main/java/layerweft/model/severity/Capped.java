package layerweft.model.severity;

import java.util.function.DoubleSupplier;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;

/**
 * A law cut at the largest possible event loss: min(X, cap), with an atom at the cap.
 *
 * @param cap above the smallest loss of the model, else no loss could lie below it
 */
public record Capped(SeverityModel model, double cap) implements SeverityModel {

    public Capped {
        new Check().positive("cap", cap)
                .that(!(cap <= model.quantile(0)), "cap", cap, "above " + model.quantile(0) + ", the smallest possible loss").orThrow();
    }

    @Override
    public double cdf(double x) {
        return x < cap ? model.cdf(x) : 1;
    }

    @Override
    public double survival(double x) {
        return x < cap ? model.survival(x) : 0;
    }

    @Override
    public double atom(double x) {
        return x < cap ? model.atom(x) : x == cap ? model.survival(cap) + model.atom(cap) : 0;
    }

    @Override
    public double quantile(double p) {
        return Math.min(model.quantile(p), cap);
    }

    @Override
    public double survivalQuantile(double q) {
        return Math.min(model.survivalQuantile(q), cap);
    }

    @Override
    public double mean() {
        return model.limitedMean(cap);
    }

    @Override
    public double limitedMean(double x) {
        return model.limitedMean(Math.min(x, cap));
    }

    @Override
    public double limitedSecondMoment(double x) {
        return model.limitedSecondMoment(Math.min(x, cap));
    }

    @Override
    public double layerMean(double from, double to) {
        return from >= cap ? 0 : model.layerMean(from, Math.min(to, cap));
    }

    @Override
    public double upperEnd() {
        return Math.min(model.upperEnd(), cap);
    }

    @Override
    public SeveritySampler sampler() {
        return new Sampler(model.sampler(), cap);
    }

    private record Sampler(SeveritySampler model, double cap) implements SeveritySampler {
        @Override
        public DoubleSupplier bind(KeyedStream stream) {
            DoubleSupplier losses = model.bind(stream);
            return () -> Math.min(losses.getAsDouble(), cap);
        }

        @Override
        public int fill(KeyedStream stream, long firstSlot, int[] counts, int years, double[] out) {
            int n = model.fill(stream, firstSlot, counts, years, out);
            for (int k = 0; k < n; k++) {
                out[k] = Math.min(out[k], cap);
            }
            return n;
        }
    }
}
