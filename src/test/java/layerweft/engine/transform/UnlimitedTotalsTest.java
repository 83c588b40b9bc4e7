package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import layerweft.figures.Figure;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Binomial;
import layerweft.model.portfolio.Dependence;
import layerweft.model.severity.Lognormal;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Without an annual limit the second moment of joined totals reaches beyond the lattice, and is right to the error stated. */
class UnlimitedTotalsTest {

    static Stream<Arguments> sums() {
        return Stream.of(1.0, 2.0).flatMap(sigma -> Stream.of(
                Arguments.of(sigma, new Comonotonic(), sigma), Arguments.of(sigma, new Countermonotonic(), -sigma), Arguments.of(sigma, new Independence(), 0.0)));
    }

    /** Var of LN(0, 1) + LN(0, σ²) with E[XY] = exp((1 + σ²)/2 + k), k the covariance of the logarithms: closed form. */
    @ParameterizedTest
    @MethodSource("sums")
    void standardDeviationOfTwoLognormals(double sigma, Copula copula, double k) {
        var treaty = Models.treaty(List.of(Models.peril("1", new Binomial(1, 1), new Lognormal(0, 1)), Models.peril("2", new Binomial(1, 1), new Lognormal(0, sigma))),
                new Dependence(Dependence.Links.ANNUAL_TOTALS, copula), Models.stopLoss(Double.POSITIVE_INFINITY, 0));
        double square = sigma * sigma;
        double variance = Math.expm1(1) * Math.exp(1) + Math.expm1(square) * Math.exp(square) + 2 * Math.exp((1 + square) / 2) * Math.expm1(k);
        Figure deviation = new TransformEngine(treaty, Accuracy.USUAL).price(0).standardDeviation();
        assertEquals(Math.sqrt(variance), deviation.value(), deviation.error(), deviation::toString);
        assertEquals(Math.sqrt(variance), deviation.value(), 0.005 * deviation.value(), deviation::toString);
        assertTrue(deviation.error() < 0.2 * deviation.value(), deviation::toString);
    }
}
