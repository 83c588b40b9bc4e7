package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.linear.EigenDecomposition;

/**
 * Fewer nodes for the same joint law. Along a row of nodes the conditional laws of the counts move with one variable x, the conditional
 * expected number of events. The nodes are a discrete measure in x; they are replaced by its Gauss rule (Golub &amp; Welsch 1969) with the
 * conditional laws' least-squares polynomials in x. With m nodes E[s_i s_j] then lacks exactly E[e_i e_j], e the residuals of degree
 * m − 1 in mean square. Where a polynomial does not do, a row is halved.
 */
final class GaussNodes {
    private static final int MOST = 20;
    private static final int FEWEST = 5;
    /** Rows of fewer nodes are not halved. */
    private static final int SPLIT = 32;
    private final LatentNodes nodes;
    private final double[] x;
    private final double each;
    private final double perWeight;
    private final List<Double> weights = new ArrayList<>();
    private final List<double[][]> laws = new ArrayList<>();
    private double error;

    private GaussNodes(LatentNodes nodes, double budget) {
        this.nodes = nodes;
        this.x = expectedEvents(nodes);
        this.each = 0.5 * budget / Math.max(20, nodes.size() / 10.0);
        this.perWeight = 0.5 * budget;
    }

    /** @param budget for the error of any joint probability of the counts */
    static LatentNodes of(LatentNodes nodes, double budget) {
        return new GaussNodes(nodes, budget).reduced();
    }

    private LatentNodes reduced() {
        for (int start = 0; start < x.length;) {
            int end = start + 1;
            double direction = end < x.length ? Math.signum(x[end] - x[start]) : 0;
            while (end < x.length && (x[end] - x[end - 1]) * direction >= 0) {
                end++;
            }
            row(start, end);
            start = end;
        }
        double[] w = weights.stream().mapToDouble(Double::doubleValue).toArray();
        double[][][] survival = new double[nodes.perils()][w.length][];
        for (int i = 0; i < survival.length; i++) {
            for (int k = 0; k < w.length; k++) {
                survival[i][k] = laws.get(k)[i];
            }
        }
        return new LatentNodes(w, survival, nodes.error() + error);
    }

    /** Conditional expected numbers of events, of each peril with the sign in which it moves with the one that moves most. */
    private static double[] expectedEvents(LatentNodes nodes) {
        int size = nodes.size();
        double[][] means = new double[nodes.perils()][size];
        int widest = 0;
        double most = -1;
        for (int i = 0; i < means.length; i++) {
            double low = Double.POSITIVE_INFINITY;
            double high = Double.NEGATIVE_INFINITY;
            for (int k = 0; k < size; k++) {
                means[i][k] = Arrays.stream(nodes.survival()[i][k]).sum();
                low = Math.min(low, means[i][k]);
                high = Math.max(high, means[i][k]);
            }
            if (high - low > most) {
                most = high - low;
                widest = i;
            }
        }
        double[] x = new double[size];
        for (double[] mean : means) {
            double together = 0;
            for (int k = 1; k < size; k++) {
                together += (mean[k] - mean[k - 1]) * (means[widest][k] - means[widest][k - 1]);
            }
            for (int k = 0; k < size; k++) {
                x[k] += together < 0 ? -mean[k] : mean[k];
            }
        }
        return x;
    }

    private void row(int start, int end) {
        double mass = 0;
        boolean positive = true;
        for (int k = start; k < end; k++) {
            mass += nodes.weights()[k];
            positive &= nodes.weights()[k] >= 0;
        }
        if (end - start < FEWEST || !positive || mass <= 0) {
            keep(start, end);
            return;
        }
        Polynomials polynomials = new Polynomials(start, end, mass);
        if (polynomials.reach(perWeight * mass + each)) {
            error += polynomials.cost();
            polynomials.gauss();
        } else if (end - start < SPLIT) {
            keep(start, end);
        } else {
            int middle = (start + end) / 2;
            row(start, middle);
            row(middle, end);
        }
    }

    private void keep(int start, int end) {
        for (int k = start; k < end; k++) {
            if (nodes.weights()[k] != 0) {
                weights.add(nodes.weights()[k]);
                double[][] law = new double[nodes.perils()][];
                for (int i = 0; i < law.length; i++) {
                    law[i] = nodes.survival()[i][k];
                }
                laws.add(law);
            }
        }
    }

    /** Orthonormal polynomials in x of the measure on a row of nodes, and the conditional laws' coefficients in them. */
    private final class Polynomials {
        private final int start;
        private final int size;
        private final double mass;
        private final double[] probability;
        private final double[] z;
        private final List<Double> diagonal = new ArrayList<>();
        private final List<Double> beside = new ArrayList<>();
        private double[] before;
        private double[] now;
        /** Degree × peril × threshold. */
        private final List<double[][]> coefficients = new ArrayList<>();
        /** E[e²] by peril and threshold. */
        private final double[][] residual;

        Polynomials(int start, int end, double mass) {
            this.start = start;
            this.size = end - start;
            this.mass = mass;
            probability = new double[size];
            z = new double[size];
            before = new double[size];
            now = new double[size];
            double low = Math.min(x[start], x[end - 1]);
            double range = Math.max(Math.abs(x[end - 1] - x[start]), 1e-300);
            for (int k = 0; k < size; k++) {
                probability[k] = nodes.weights()[start + k] / mass;
                z[k] = (x[start + k] - low) / range;
                now[k] = 1;
            }
            residual = new double[nodes.perils()][];
            for (int i = 0; i < residual.length; i++) {
                double[] squares = new double[nodes.survival()[i][start].length];
                double[] mean = new double[squares.length];
                for (int k = 0; k < size; k++) {
                    double[] s = nodes.survival()[i][start + k];
                    for (int n = 0; n < s.length; n++) {
                        mean[n] += probability[k] * s[n];
                    }
                }
                for (int k = 0; k < size; k++) {
                    double[] s = nodes.survival()[i][start + k];
                    for (int n = 0; n < s.length; n++) {
                        squares[n] += probability[k] * (s[n] - mean[n]) * (s[n] - mean[n]);
                    }
                }
                residual[i] = squares;
            }
            project();
        }

        int degree() {
            return coefficients.size() - 1;
        }

        private void project() {
            double[][] c = new double[nodes.perils()][];
            double recurrence = 0;
            for (int k = 0; k < size; k++) {
                recurrence += probability[k] * z[k] * now[k] * now[k];
            }
            diagonal.add(recurrence);
            for (int i = 0; i < c.length; i++) {
                c[i] = new double[residual[i].length];
                for (int k = 0; k < size; k++) {
                    double part = probability[k] * now[k];
                    double[] s = nodes.survival()[i][start + k];
                    for (int n = 0; n < s.length; n++) {
                        c[i][n] += part * s[n];
                    }
                }
                if (!coefficients.isEmpty()) {
                    for (int n = 0; n < c[i].length; n++) {
                        residual[i][n] = Math.max(0, residual[i][n] - c[i][n] * c[i][n]);
                    }
                }
            }
            coefficients.add(c);
        }

        /** Raises the degree until the cost is allowed; false where that would take more nodes than it is worth. */
        boolean reach(double allowed) {
            int most = Math.min(MOST, (2 * size + 2) / 3);
            double earlier = Double.POSITIVE_INFINITY;
            double before = Double.POSITIVE_INFINITY;
            double cost = cost();
            while (cost > allowed) {
                int more = (int) Math.ceil(2 * Math.log(cost / allowed) / Math.log(earlier / cost));
                boolean hopeless = degree() >= 4 && (cost >= earlier || degree() + more > 1.2 * most);
                if (hopeless || degree() + 1 >= most || !raise()) {
                    return false;
                }
                earlier = before;
                before = cost;
                cost = cost();
            }
            return true;
        }

        /** The next degree; false where the measure has none. */
        boolean raise() {
            double a = diagonal.get(degree());
            double b = beside.isEmpty() ? 0 : beside.get(beside.size() - 1);
            double[] next = new double[size];
            double norm = 0;
            for (int k = 0; k < size; k++) {
                next[k] = (z[k] - a) * now[k] - b * before[k];
                norm += probability[k] * next[k] * next[k];
            }
            norm = Math.sqrt(norm);
            if (!(norm > 1e-10)) {
                return false;
            }
            for (int k = 0; k < size; k++) {
                next[k] /= norm;
            }
            beside.add(norm);
            before = now;
            now = next;
            project();
            return true;
        }

        /** Σ over pairs of perils of E|e_i e_j|, and as much again for three and more perils at once. */
        double cost() {
            double sum = 0;
            double squares = 0;
            for (double[] peril : residual) {
                double largest = 0;
                for (double square : peril) {
                    largest = Math.max(largest, square);
                }
                sum += Math.sqrt(largest);
                squares += largest;
            }
            return mass * (sum * sum - squares);
        }

        void gauss() {
            int m = degree() + 1;
            double[] points = {diagonal.get(0)};
            if (m > 1) {
                points = new EigenDecomposition(diagonal.stream().mapToDouble(Double::doubleValue).toArray(),
                        beside.stream().mapToDouble(Double::doubleValue).toArray()).getRealEigenvalues();
            }
            for (double point : points) {
                double[] p = values(point, m);
                double squares = 0;
                for (double value : p) {
                    squares += value * value;
                }
                weights.add(mass / squares);
                double[][] law = new double[nodes.perils()][];
                for (int i = 0; i < law.length; i++) {
                    law[i] = new double[residual[i].length];
                    for (int q = 0; q < m; q++) {
                        double[] c = coefficients.get(q)[i];
                        for (int n = 0; n < law[i].length; n++) {
                            law[i][n] += p[q] * c[n];
                        }
                    }
                }
                laws.add(law);
            }
        }

        private double[] values(double point, int m) {
            double[] p = new double[m];
            p[0] = 1;
            for (int q = 1; q < m; q++) {
                double lower = q > 1 ? beside.get(q - 2) * p[q - 2] : 0;
                p[q] = ((point - diagonal.get(q - 1)) * p[q - 1] - lower) / beside.get(q - 1);
            }
            return p;
        }
    }
}
