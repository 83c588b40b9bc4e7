package layerweft.model.copula;

/** Three correlated standard normals: given the first, the other two are a bivariate normal pair; quadrature over the first. */
final class ThreeNormals {

    private ThreeNormals() {
    }

    static double cdf(double[] x, double[][] correlation) {
        for (int i = 0; i < 3; i++) {
            int j = (i + 1) % 3;
            int k = (i + 2) % 3;
            double rho = correlation[i][j];
            // two of the three are one, or each other's negative: what is left is a pair
            if (rho >= 1) {
                return NormalProbability.pair(Math.min(x[i], x[j]), x[k], correlation[i][k]);
            }
            if (rho <= -1) {
                return x[i] <= -x[j] ? 0 : Math.max(0, NormalProbability.pair(x[i], x[k], correlation[i][k])
                        - NormalProbability.pair(-x[j], x[k], correlation[i][k]));
            }
        }
        double first = correlation[0][1];
        double second = correlation[0][2];
        double ownFirst = Math.sqrt(1 - first * first);
        double ownSecond = Math.sqrt(1 - second * second);
        double rest = Math.max(-1, Math.min(1, (correlation[1][2] - first * second) / (ownFirst * ownSecond)));
        return NormalProbability.overNormal(
                z -> NormalProbability.pair((x[1] - first * z) / ownFirst, (x[2] - second * z) / ownSecond, rest), x[0]);
    }
}
