package layerweft.figures;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;
import layerweft.figures.PremiumBuildUp.Inputs;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.Pricing;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class PremiumBuildUpTest {
    private static final Inputs INPUTS = new Inputs(4, 9, 25, 5.5, 0.3);

    private static Pricing pricing(Loading loading) {
        return new Pricing(loading, 0.10, 0.05, true);
    }

    /**
     * Sundt (1991), "On excess of loss reinsurance with reinstatements", premium equation (from memory): full-limit losses, Poisson
     * count of mean 1, L = 1, one reinstatement at 100 %: P = (d_0 + d_1)/(1 + d_0), recomputed 0.549200652879; free: d_0 + d_1.
     */
    @Test
    void paidReinstatementsLowerTheUpfrontPremiumAsSundtHasIt() {
        double d0 = 1 - Math.exp(-1);
        double d1 = 1 - 2 * Math.exp(-1);
        assertEquals(0.549200652879, PremiumBuildUp.of(Pricing.PLAIN, new Inputs(d0 + d1, 1, 1, 1, d0)).upfront(), 1e-12);
        assertEquals(0.896361676486, PremiumBuildUp.of(Pricing.PLAIN, new Inputs(d0 + d1, 1, 1, 1, 0)).upfront(), 1e-12);
    }

    @Test
    void upfrontAndReinstatementPremiumsTogetherBringTheGrossPremium() {
        PremiumBuildUp build = PremiumBuildUp.of(pricing(new Loading.StandardDeviation(0.25)), INPUTS);
        assertEquals(4 + 0.25 * 9, build.net(), 1e-12);
        assertEquals(build.net() / 0.85, build.gross(), 1e-12);
        assertEquals(build.gross(), build.upfront() * 1.3, 1e-12);
    }

    @Test
    void brokerageCanLeaveReinstatementPremiumsAlone() {
        PremiumBuildUp build = PremiumBuildUp.of(new Pricing(new Loading.None(), 0.10, 0.05, false), INPUTS);
        assertEquals(4, build.upfront() * 0.85 + build.upfront() * 0.3 * 0.95, 1e-12);
    }

    @Test
    void eachPrincipleAddsItsOwnLoading() {
        assertEquals(4, PremiumBuildUp.of(pricing(new Loading.None()), INPUTS).net());
        assertEquals(4 + 0.01 * 81, PremiumBuildUp.of(pricing(new Loading.Variance(0.01)), INPUTS).net(), 1e-12);
        assertEquals(4 + 0.08 * 21, PremiumBuildUp.of(pricing(new Loading.CostOfCapital(0.08, 0.99)), INPUTS).net(), 1e-12);
        assertEquals(5.5, PremiumBuildUp.of(pricing(new Loading.ProportionalHazard(1.2)), INPUTS).net());
        assertEquals(5.5, PremiumBuildUp.of(pricing(new Loading.Wang(0.3)), INPUTS).net());
    }

    @Test
    void aLoadingOfNothingOnAnInfiniteDeviationIsNothing() {
        assertEquals(4, PremiumBuildUp.of(pricing(new Loading.StandardDeviation(0)), new Inputs(4, Double.POSITIVE_INFINITY, 0, 0, 0)).net());
        double infinite = Double.POSITIVE_INFINITY;
        assertEquals(infinite, PremiumBuildUp.of(pricing(new Loading.CostOfCapital(0.1, 0.9)), new Inputs(infinite, infinite, infinite, 0, 0)).net());
    }

    static Stream<Loading> loadings() {
        return Stream.of(new Loading.None(), new Loading.StandardDeviation(0.25), new Loading.Variance(0.01), new Loading.CostOfCapital(0.08, 0.99),
                new Loading.ProportionalHazard(1.2), new Loading.Wang(0.3));
    }

    @ParameterizedTest
    @MethodSource("loadings")
    void slopesAreTheDerivativesOfTheUpfrontPremium(Loading loading) {
        PremiumBuildUp.Slopes s = PremiumBuildUp.of(pricing(loading), INPUTS).slopes();
        assertEquals(slope(x -> premium(loading, new Inputs(x, 9, 25, 5.5, 0.3)), 4), s.byExpectedLoss(), 1e-6);
        assertEquals(slope(x -> premium(loading, new Inputs(4, x, 25, 5.5, 0.3)), 9), s.byStandardDeviation(), 1e-6);
        assertEquals(slope(x -> premium(loading, new Inputs(4, 9, x, 5.5, 0.3)), 25), s.byTail(), 1e-6);
        assertEquals(slope(x -> premium(loading, new Inputs(4, 9, 25, x, 0.3)), 5.5), s.byDistorted(), 1e-6);
        assertEquals(slope(x -> premium(loading, new Inputs(4, 9, 25, 5.5, x)), 0.3), s.byReinstatementFactor(), 1e-6);
    }

    private static double premium(Loading loading, Inputs inputs) {
        return PremiumBuildUp.of(pricing(loading), inputs).upfront();
    }

    private static double slope(DoubleUnaryOperator f, double x) {
        return (f.applyAsDouble(x + 1e-5) - f.applyAsDouble(x - 1e-5)) / 2e-5;
    }
}
