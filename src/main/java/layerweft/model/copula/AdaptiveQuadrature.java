package layerweft.model.copula;

import java.util.function.DoubleUnaryOperator;

/**
 * Integration over a finite interval by the Gauss-Kronrod pair of 7 and 15 points (Piessens et al. 1983, QUADPACK), halving where the
 * two disagree: integrands here are smooth but may be narrow, which the uniform refinement of the library's rules would pay for.
 */
final class AdaptiveQuadrature {
    private static final double[] NODES = {0.991455371120812639206854697526329, 0.949107912342758524526189684047851,
        0.864864423359769072789712788640926, 0.741531185599394439863864773280788, 0.586087235467691130294144691258403,
        0.405845151377397166906606412076961, 0.207784955007898467600689403773245, 0};
    private static final double[] KRONROD = {0.022935322010529224963732008058970, 0.063092092629978553290700663189204,
        0.104790010322250183839876322541518, 0.140653259715525918745189590510238, 0.169004726639267902826583426598550,
        0.190350578064785409913256402421014, 0.204432940075298892414161999234649, 0.209482141084727828012999174891714};
    private static final double[] GAUSS = {0.129484966168869693270611432679082, 0.279705391489276667901467771423780,
        0.381830050505118944950369775488975, 0.417959183673469387755102040816327};
    private static final int DEEPEST = 18;

    private AdaptiveQuadrature() {
    }

    /**
     * ∫ f over [low, high].
     *
     * @param absolute bound for the disagreement of the two rules in each part; the stronger rule, whose value counts, is much nearer
     *     (QUADPACK estimates its error by (200 · disagreement)^1.5)
     * @param relative alternative bound, relative to the part's own integral; where f is itself a quadrature, it has to be the more exact
     */
    static double integrate(DoubleUnaryOperator f, double low, double high, double absolute, double relative) {
        return high > low ? part(f, low, high, absolute, relative, DEEPEST) : 0;
    }

    private static double part(DoubleUnaryOperator f, double low, double high, double absolute, double relative, int depth) {
        double centre = 0.5 * (low + high);
        double half = 0.5 * (high - low);
        double atCentre = f.applyAsDouble(centre);
        double kronrod = KRONROD[7] * atCentre;
        double gauss = GAUSS[3] * atCentre;
        for (int k = 0; k < 7; k++) {
            double both = f.applyAsDouble(centre - half * NODES[k]) + f.applyAsDouble(centre + half * NODES[k]);
            kronrod += KRONROD[k] * both;
            if (k % 2 == 1) {
                gauss += GAUSS[k / 2] * both;
            }
        }
        double error = half * Math.abs(kronrod - gauss);
        if (depth == 0 || error <= absolute || error <= relative * half * Math.abs(kronrod) || half <= Math.ulp(centre) * 8) {
            return half * kronrod;
        }
        return part(f, low, centre, absolute, relative, depth - 1) + part(f, centre, high, absolute, relative, depth - 1);
    }
}
