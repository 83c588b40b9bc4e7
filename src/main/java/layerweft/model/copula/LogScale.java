package layerweft.model.copula;

/** Elementary functions of numbers held by their logarithms, exact at both ends and free of overflow. */
final class LogScale {
    /** Beyond this, e^-x is lost beside 1 in a double. */
    private static final double NEGLIGIBLE = 37;

    private LogScale() {
    }

    /** ln(1 + e^x). */
    static double softplus(double x) {
        return x > NEGLIGIBLE ? x : Math.log1p(Math.exp(x));
    }

    /** ln(e^y − 1), y ≥ 0. */
    static double logExpm1(double y) {
        return y > NEGLIGIBLE ? y : Math.log(Math.expm1(y));
    }

    /** ln(1 − e^−y), y ≥ 0 (Mächler 2012, "Accurately computing log(1 − exp(−|a|))": two branches that meet at ln 2). */
    static double log1mExp(double y) {
        return y < 0.6931471805599453 ? Math.log(-Math.expm1(-y)) : Math.log1p(-Math.exp(-y));
    }

    /** ln(1 − e^−t) at t = e^lnT. */
    static double log1mExpOfLog(double lnT) {
        return lnT < -NEGLIGIBLE ? lnT : log1mExp(Math.exp(lnT));
    }

    /** ln(−ln(1 − e^−y)), y ≥ 0. */
    static double logMinusLog1mExp(double y) {
        return y > NEGLIGIBLE ? -y : Math.log(-log1mExp(y));
    }

    /** −ln p, with q = 1 − p given apart. */
    static double minusLog(double p, double q) {
        return p < 0.5 ? -Math.log(p) : -Math.log1p(-q);
    }

    /** ln(e^a + e^b). */
    static double logAdd(double a, double b) {
        double high = Math.max(a, b);
        return Double.isInfinite(high) ? high : high + Math.log1p(Math.exp(Math.min(a, b) - high));
    }
}
