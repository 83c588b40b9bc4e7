package layerweft.engine.simulation;

import layerweft.model.frequency.CountTable;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * What any simulation of the four perils has to do at least: the frailty, the exponentials, the uniforms and counts, and the severity
 * draws with their powers and exponentials. No terms, no bookkeeping: the losses are only added up.
 */
final class BareLoop {
    private final double[][] cdf;

    BareLoop(Portfolio portfolio) {
        cdf = new double[portfolio.perils().size()][];
        for (int i = 0; i < cdf.length; i++) {
            Peril peril = portfolio.perils().get(i);
            CountTable table = CountTable.of(peril.frequency());
            cdf[i] = new double[table.size()];
            for (int n = 0; n < cdf[i].length; n++) {
                cdf[i][n] = table.cdf(n);
            }
        }
    }

    double run(long seed, int years) {
        KeyedStream stream = new KeyedStream(seed);
        ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
        ZigguratSampler.NormalizedGaussian normal = ZigguratSampler.NormalizedGaussian.of(stream);
        double alpha = 1 - FourPerils.TAU;
        double sigma = Math.sqrt(Math.log1p(2.1 * 2.1));
        double mu = Math.log(14) - sigma * sigma / 2;
        double sum = 0;
        for (int y = 0; y < years; y++) {
            double phi = Math.PI * stream.nextOpen();
            double w = exponential.sample();
            double v = Math.sin(alpha * phi) / Math.pow(Math.sin(phi), 1 / alpha)
                    * Math.pow(Math.sin((1 - alpha) * phi) / w, (1 - alpha) / alpha);
            for (int k = count(0, v, alpha, exponential); k > 0; k--) {
                sum += Math.min(Math.exp(mu + sigma * normal.sample()), 900);
            }
            for (int k = count(1, v, alpha, exponential); k > 0; k--) {
                sum += Math.min(5 * Math.pow(stream.nextOpen(), -1 / 1.6), 600);
            }
            for (int k = count(2, v, alpha, exponential); k > 0; k--) {
                sum += Math.min(2 + 6 * (Math.pow(stream.nextOpen(), -0.3) - 1) / 0.3, 300);
            }
            for (int k = count(3, v, alpha, exponential); k > 0; k--) {
                sum += Math.min(10 * Math.pow(stream.nextOpen(), -1 / 1.1), 1000);
            }
        }
        return sum;
    }

    private int count(int peril, double v, double alpha, ZigguratSampler.Exponential exponential) {
        double u = Math.exp(-Math.pow(exponential.sample() / v, alpha));
        double[] table = cdf[peril];
        int n = 0;
        while (n < table.length && u > table[n]) {
            n++;
        }
        return n;
    }
}
