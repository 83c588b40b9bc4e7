package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.AhrensDieterMarsagliaTsangGammaSampler;
import org.apache.commons.rng.sampling.distribution.SharedStateContinuousSampler;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/** Correlated t variates Z_i/√(W/ν) with one chi-square W for all; the score is the variate. The normals come before W. */
final class StudentSampler extends YearSampler {
    private final NormalSampler normals;
    private final double degreesOfFreedom;
    private final StudentScale scale;

    StudentSampler(Correlation correlation, double degreesOfFreedom, int dimension) {
        super(dimension);
        this.normals = new NormalSampler(correlation, dimension);
        this.degreesOfFreedom = degreesOfFreedom;
        this.scale = new StudentScale(degreesOfFreedom);
    }

    /** √(ν/W): for a shape ν/2 below 1 a gamma(shape + 1) times U^(1/shape), so that no tiny W is lost. */
    @Override
    Drawer drawer(KeyedStream stream) {
        Drawer drawer = normals.drawer(stream);
        double shape = degreesOfFreedom / 2;
        boolean small = shape < 1;
        SharedStateContinuousSampler gamma = AhrensDieterMarsagliaTsangGammaSampler.of(stream, small ? shape + 1 : shape, 1);
        ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
        int d = dimension();
        return (scores, year) -> {
            drawer.draw(scores, year);
            double factor = Math.sqrt(shape / gamma.sample());
            if (small) {
                factor *= Math.exp(exponential.sample() / degreesOfFreedom);
            }
            for (int i = 0; i < d; i++) {
                scores[i][year] *= factor;
            }
        };
    }

    @Override
    public double score(int i, double p, double q) {
        return scale.quantile(p, q);
    }

    @Override
    public double uniform(int i, double score) {
        return scale.cdf(score);
    }

    @Override
    public double complement(int i, double score) {
        return scale.survival(score);
    }
}
