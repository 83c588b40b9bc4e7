package layerweft.model.copula;

import java.util.List;
import layerweft.model.random.KeyedStream;

/** Chooses a component by each year's first draw; the common scale is the logit ln U − ln(1 − U), exact at both ends. */
final class MixtureSampler extends YearSampler {
    private final List<Double> weights;
    private final List<YearSampler> components;

    MixtureSampler(List<Double> weights, List<YearSampler> components, int dimension) {
        super(dimension);
        this.weights = weights;
        this.components = components;
    }

    @Override
    Drawer drawer(KeyedStream stream) {
        int d = dimension();
        int last = components.size() - 1;
        double[] upTo = new double[last + 1];
        Drawer[] drawers = new Drawer[last + 1];
        double sum = 0;
        for (int k = 0; k <= last; k++) {
            sum += weights.get(k);
            upTo[k] = sum;
            drawers[k] = components.get(k).drawer(stream);
        }
        return (scores, year) -> {
            double choice = stream.nextDouble();
            int k = 0;
            while (k < last && choice >= upTo[k]) {
                k++;
            }
            drawers[k].draw(scores, year);
            YearSampler chosen = components.get(k);
            for (int i = 0; i < d; i++) {
                double score = scores[i][year];
                scores[i][year] = score(i, chosen.uniform(i, score), chosen.complement(i, score));
            }
        };
    }

    @Override
    public double score(int i, double p, double q) {
        return Math.log(p) - Math.log(q);
    }

    @Override
    public double uniform(int i, double score) {
        return 1 / (1 + Math.exp(-score));
    }

    @Override
    public double complement(int i, double score) {
        return 1 / (1 + Math.exp(score));
    }
}
