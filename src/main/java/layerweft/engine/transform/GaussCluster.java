package layerweft.engine.transform;

/** The Gauss rule with three points of a discrete measure: same weight and same moments up to the fifth (Stieltjes' procedure). */
final class GaussCluster {

    private GaussCluster() {
    }

    /**
     * @param logs ln v of the measure's points, of which first..end−1 are taken, four or more
     * @return {ln v_j, w_j}, rising in v
     */
    static double[][] threePoints(double[] logs, double[] weights, int first, int end) {
        int n = end - first;
        double unit = Math.exp(logs[first]);
        double[] x = new double[n];
        double mass = 0;
        double mean = 0;
        for (int k = 0; k < n; k++) {
            x[k] = Math.exp(logs[first + k]) / unit;
            mass += weights[first + k];
            mean += weights[first + k] * x[k];
        }
        mean /= mass;
        // monic orthogonal polynomials p1 = x − a0, p2 = (x − a1)p1 − b1, p3 = (x − a2)p2 − b2 p1
        double[] a = new double[3];
        double[] b = new double[3];
        a[0] = mean;
        double[] before = new double[n];
        double[] now = new double[n];
        java.util.Arrays.fill(now, 1);
        double norm = mass;
        for (int degree = 0; degree < 2; degree++) {
            double next = 0;
            double moment = 0;
            for (int k = 0; k < n; k++) {
                double p = (x[k] - a[degree]) * now[k] - (degree == 0 ? 0 : b[degree]) * before[k];
                before[k] = now[k];
                now[k] = p;
                next += weights[first + k] * p * p;
                moment += weights[first + k] * x[k] * p * p;
            }
            b[degree + 1] = next / norm;
            a[degree + 1] = moment / next;
            norm = next;
        }
        double[][] rule = new double[2][3];
        double[] roots = roots(a, b);
        for (int j = 0; j < 3; j++) {
            double p1 = roots[j] - a[0];
            double p2 = (roots[j] - a[1]) * p1 - b[1];
            rule[0][j] = Math.log(roots[j] * unit);
            rule[1][j] = mass / (1 + p1 * p1 / b[1] + p2 * p2 / (b[1] * b[2]));
        }
        return rule;
    }

    /** Roots of p3, all real: Viète's trigonometric form about their mean, then Newton's method. */
    private static double[] roots(double[] a, double[] b) {
        double centre = (a[0] + a[1] + a[2]) / 3;
        double u = a[0] - centre;
        double v = a[1] - centre;
        double w = a[2] - centre;
        double p = u * v + u * w + v * w - b[1] - b[2];
        double q = -u * v * w + b[1] * w + b[2] * u;
        double r = 2 * Math.sqrt(-p / 3);
        double angle = Math.acos(Math.max(-1, Math.min(1, 3 * q / (p * r)))) / 3;
        double[] roots = new double[3];
        for (int j = 0; j < 3; j++) {
            double t = r * Math.cos(angle - 2 * Math.PI * (2 - j) / 3);
            for (int step = 0; step < 3; step++) {
                t -= (t * t * t + p * t + q) / (3 * t * t + p);
            }
            roots[j] = centre + t;
        }
        java.util.Arrays.sort(roots);
        return roots;
    }
}
