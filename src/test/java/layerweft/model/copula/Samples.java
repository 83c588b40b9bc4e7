package layerweft.model.copula;

import java.util.Arrays;
import java.util.stream.Stream;
import layerweft.model.random.KeyedStream;

/** Years drawn from a copula, and what can be read from them. */
record Samples(ScoreSampler sampler, double[][] scores, int years) {

    static Samples draw(Copula copula, int dimension, int years, long seed) {
        ScoreSampler sampler = copula.sampler(dimension);
        double[][] scores = new double[dimension][years];
        sampler.draw(new KeyedStream(seed), 0, years, scores);
        return new Samples(sampler, scores, years);
    }

    /** All families and versions, of every strength that is asked for. */
    static Stream<CopulaFamily> families() {
        return Stream.concat(CopulaFamily.withStrength().stream(), Stream.of(CopulaFamily.parse("student:0.5")));
    }

    /** Share of the years with U_i ≤ u_i for all i. */
    double joint(double... u) {
        double[] limits = new double[u.length];
        for (int i = 0; i < u.length; i++) {
            limits[i] = sampler.score(i, u[i], 1 - u[i]);
        }
        int count = 0;
        for (int y = 0; y < years; y++) {
            boolean below = true;
            for (int i = 0; i < u.length && below; i++) {
                below = scores[i][y] <= limits[i];
            }
            count += below ? 1 : 0;
        }
        return (double) count / years;
    }

    /** Standard errors between the share seen and a probability; 0 for a sure event that is seen so. */
    double deviation(double probability, double... u) {
        double gap = Math.abs(joint(u) - probability);
        double error = Math.sqrt(probability * (1 - probability) / years);
        return gap <= 0.5 / years ? 0 : gap / error;
    }

    double[] uniforms(int i) {
        return Arrays.stream(scores[i]).map(s -> sampler.uniform(i, s)).toArray();
    }

    /** √n times the Kolmogorov-Smirnov distance of a margin from the uniform law. */
    double kolmogorovSmirnov(int i) {
        double[] u = uniforms(i);
        Arrays.sort(u);
        double distance = 0;
        for (int k = 0; k < years; k++) {
            distance = Math.max(distance, Math.max((k + 1.0) / years - u[k], u[k] - (double) k / years));
        }
        return distance * Math.sqrt(years);
    }

    /** Kendall's τ of the first years. */
    double kendallTau(int i, int j, int count) {
        long sum = 0;
        for (int a = 0; a < count; a++) {
            for (int b = 0; b < a; b++) {
                sum += Math.signum((scores[i][a] - scores[i][b])) * Math.signum(scores[j][a] - scores[j][b]) > 0 ? 1 : -1;
            }
        }
        return sum / (count * (count - 1) / 2.0);
    }
}
