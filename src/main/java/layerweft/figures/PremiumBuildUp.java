package layerweft.figures;

import layerweft.model.treaty.Loading;
import layerweft.model.treaty.Pricing;

/**
 * From the law of a layer's annual loss to its upfront premium, at 100 %: net = E[Y] + loading, gross = net/(1 − brokerage − expenses),
 * and P·(1 + Σ c_k E[u_k]) = gross (Sundt 1991). Where brokerage is not taken from reinstatement premiums,
 * P·(1 − b − e) + P·Σ c_k E[u_k]·(1 − e) = net.
 *
 * @param expectedLoss E[Y]
 * @param net E[Y] and the loading
 * @param gross net with brokerage and expenses on every premium: what upfront and reinstatement premiums must bring together
 * @param upfront P
 * @param divisor net/P: what a unit of upfront premium leaves with its reinstatement premium after brokerage and expenses
 * @param slopes how P moves with what it is made of, for error propagation
 */
public record PremiumBuildUp(double expectedLoss, double net, double gross, double upfront, double divisor, Slopes slopes) {

    /**
     * What a premium is made of, at 100 %. Members that the principle does not use may be NaN.
     *
     * @param expectedLoss E[Y]
     * @param standardDeviation σ(Y)
     * @param tail TVaR of Y at the loading's level (cost of capital)
     * @param distorted the distorted mean of Y (proportional hazard, Wang)
     * @param reinstatementFactor Σ c_k E[u_k]
     */
    public record Inputs(double expectedLoss, double standardDeviation, double tail, double distorted, double reinstatementFactor) {}

    /** Partial derivatives of the upfront premium by its {@link Inputs}; 0 for those that the principle does not use. */
    public record Slopes(double byExpectedLoss, double byStandardDeviation, double byTail, double byDistorted, double byReinstatementFactor) {}

    public static PremiumBuildUp of(Pricing pricing, Inputs in) {
        double net;
        double byMean = 1;
        double bySd = 0;
        double byTail = 0;
        double byDistorted = 0;
        Loading loading = pricing.loading();
        if (loading instanceof Loading.StandardDeviation sd) {
            net = in.expectedLoss() + product(sd.factor(), in.standardDeviation());
            bySd = sd.factor();
        } else if (loading instanceof Loading.Variance variance) {
            net = in.expectedLoss() + product(variance.factor(), in.standardDeviation() * in.standardDeviation());
            bySd = 2 * variance.factor() * in.standardDeviation();
        } else if (loading instanceof Loading.CostOfCapital capital) {
            net = Double.isInfinite(in.expectedLoss()) ? in.expectedLoss()
                    : in.expectedLoss() + product(capital.rate(), in.tail() - in.expectedLoss());
            byMean = 1 - capital.rate();
            byTail = capital.rate();
        } else if (loading instanceof Loading.ProportionalHazard || loading instanceof Loading.Wang) {
            net = in.distorted();
            byMean = 0;
            byDistorted = 1;
        } else {
            net = in.expectedLoss();
        }
        double kept = 1 - pricing.brokerage() - pricing.expenses();
        double keptOfReinstatements = pricing.brokerageOnReinstatements() ? kept : 1 - pricing.expenses();
        double divisor = kept + in.reinstatementFactor() * keptOfReinstatements;
        double upfront = net / divisor;
        Slopes slopes = new Slopes(byMean / divisor, bySd / divisor, byTail / divisor, byDistorted / divisor,
                -upfront * keptOfReinstatements / divisor);
        return new PremiumBuildUp(in.expectedLoss(), net, upfront * (1 + in.reinstatementFactor()), upfront, divisor, slopes);
    }

    /** A loading of 0 times an infinite figure is no loading. */
    private static double product(double factor, double value) {
        return factor == 0 ? 0 : factor * value;
    }
}
