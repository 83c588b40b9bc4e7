package layerweft.model.copula;

/**
 * The distribution function of a pair with negative dependence, of the two families that have one.
 *
 * @param family Clayton or Frank
 * @param strength a = −θ &gt; 0
 */
record NegativePair(ArchimedeanFamily family, double strength) {

    double cdf(double u, double v) {
        if (u == 0 || v == 0) {
            return 0;
        }
        return family == ArchimedeanFamily.CLAYTON ? clayton(u, v) : frank(u, v);
    }

    /** Frank's is its own; Clayton's is u + v − 1 + C(1 − u, 1 − v). */
    double survival(double u, double v) {
        if (family == ArchimedeanFamily.FRANK || u == 0 || v == 0) {
            return cdf(u, v);
        }
        return Math.max(0, Math.min(Math.min(u, v), u + v - 1 + cdf(1 - u, 1 - v)));
    }

    /** max(u^a + v^a − 1, 0)^(1/a). */
    private double clayton(double u, double v) {
        // u^a + v^a − 1 = 1 − (1 − u^a) − (1 − v^a)
        double sum = 1 + Math.expm1(strength * Math.log(u)) + Math.expm1(strength * Math.log(v));
        return sum <= 0 ? 0 : Math.pow(sum, 1 / strength);
    }

    /** ln(1 + (e^au − 1)(e^av − 1)/(e^a − 1))/a: positive terms only. */
    private double frank(double u, double v) {
        return LogScale.softplus(LogScale.logExpm1(strength * u) + LogScale.logExpm1(strength * v) - LogScale.logExpm1(strength)) / strength;
    }
}
