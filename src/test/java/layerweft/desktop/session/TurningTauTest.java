package layerweft.desktop.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import layerweft.file.FileTree;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.study.DependenceStrength.Kind;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Turning the one τ of the window, for every way in which a file may give its dependence. */
class TurningTauTest {

    private static FileTree portfolio(Session session) {
        return session.document().get().portfolio();
    }

    private static Copula copula(Session session) {
        assertTrue(session.faults().isEmpty(), session.faults()::toString);
        return session.treaty().get().portfolio().dependence().copula();
    }

    @Test
    void aFileWithoutDependenceTakesUpGumbel() {
        Session session = Sessions.of(Sessions.twoPerils(null));
        assertEquals(Kind.INDEPENDENT, session.tau().get().kind());
        session.setTau(0.25, null);
        assertEquals(Map.of("links", "counts", "copula", Map.of("family", "gumbel", "kendallTau", 0.25)), portfolio(session).get("dependence"));
    }

    @Test
    void thetaIsReplacedByTau() {
        Session session = Sessions.of(Sessions.twoPerils(Map.of("family", "clayton", "theta", 2.0)));
        assertEquals(0.5, session.tau().get().tau(), 1e-12);
        session.setTau(0.4, null);
        assertEquals(Map.of("family", "clayton", "kendallTau", 0.4), portfolio(session).get("dependence.copula"));
    }

    @ParameterizedTest
    @CsvSource({"gumbel, -0.5, 0", "gumbel, 2, 0.99", "frank, -0.5, -0.5", "frank, -2, -0.99", "gaussian, 1, 0.99", "clayton, -0.3, -0.3"})
    void tauStopsWhereTheFamilyStops(String family, double wished, double reached) {
        Session session = Sessions.of(Sessions.twoPerils(Map.of("family", family, "kendallTau", 0.2)));
        session.setTau(wished, null);
        assertEquals(reached, copula(session).kendallTau(0, 1), 1e-9);
    }

    @Test
    void theStopBelowZeroIsSaidInWords() {
        assertEquals("", Sessions.of(Sessions.twoPerils(Sessions.gumbel(0.2))).tau().get().leftStop());
        assertEquals("−1 opposed", Sessions.of(Sessions.twoPerils(Map.of("family", "frank", "kendallTau", 0.2))).tau().get().leftStop());
        Session three = Sessions.of(Sessions.matrix(0.5, 0.5, 0.5));
        // equicorrelation of three: rho of at least -1/2, tau = 2/pi asin(-1/2) = -1/3
        assertEquals("stops at −0.33 with 3 perils", three.tau().get().leftStop());
    }

    @Test
    void aMatrixOfEqualPairsIsOneTau() {
        Session session = Sessions.of(Sessions.matrix(0.5, 0.5, 0.5));
        assertEquals(Kind.ONE_TAU, session.tau().get().kind());
        session.setTau(0.2, null);
        assertEquals(Map.of("family", "gaussian", "kendallTau", 0.2), portfolio(session).get("dependence.copula"));
    }

    @Test
    void pairsOfAMatrixAreScaledTogether() {
        Session session = Sessions.of(Sessions.matrix(0.6, 0.3, 0.15));
        assertEquals(Kind.PAIRS, session.tau().get().kind());
        double mean = session.tau().get().tau();
        session.setTau(mean / 2, null);
        Copula turned = copula(session);
        assertEquals(mean / 2, session.tau().get().tau(), 1e-5);
        List<?> row = (List<?>) portfolio(session).get("dependence.copula.correlation[0]");
        assertEquals(2, (double) row.get(1) / (double) row.get(2), 1e-4);
        assertTrue(turned.kendallTau(0, 1) < 0.41);
    }

    @Test
    void pairsKeepTheirProportionsThroughAWholeDrag() {
        Session session = Sessions.of(Sessions.matrix(0.6, 0.3, 0.15));
        double mean = session.tau().get().tau();
        Document before = session.document().get();
        Object drag = new Object();
        for (double tau : new double[] {0.1, 0.01, 0, 0.05, 0.3, 1, 0.2, mean}) {
            session.setTau(tau, drag);
            copula(session);
        }
        List<?> row = (List<?>) portfolio(session).get("dependence.copula.correlation[0]");
        assertEquals(0.6, (double) row.get(1), 1e-5);
        assertEquals(0.3, (double) row.get(2), 1e-5);
        session.setTau(0.2, new Object());
        assertTrue(Strengths.only(before, session.document().get()), "the curve of the proportions stays");
        session.undo();
        session.undo();
        assertEquals(0.6, portfolio(session).number("dependence.copula.correlation[0][1]"));
    }

    @Test
    void groupsAreScaledTogether() {
        Document grouped = Sessions.matrix(0, 0, 0).withPortfolio(p -> p.set("dependence.copula", Map.of("family", "gumbel", "theta", 1.25,
                "groups", List.of(Map.of("perils", List.of("a", "b"), "kendallTau", 0.5)))));
        Session session = Sessions.of(grouped);
        assertEquals(Kind.PAIRS, session.tau().get().kind());
        assertEquals("Gumbel, groups", session.tau().get().copula());
        // theta 1.25 is tau 0.2: pairs 0.5, 0.2, 0.2 with the mean 0.3
        assertEquals(0.3, session.tau().get().tau(), 1e-9);
        session.setTau(0.15, null);
        Copula turned = copula(session);
        assertEquals(0.25, turned.kendallTau(0, 1), 1e-5);
        assertEquals(0.1, turned.kendallTau(0, 2), 1e-5);
    }

    @Test
    void mixturesAreScaledInEachComponent() {
        Session session = Sessions.of(Sessions.twoPerils(Map.of("mixture", List.of(
                Map.of("weight", 0.5, "copula", Sessions.gumbel(0.6)),
                Map.of("weight", 0.5, "copula", Map.of("family", "clayton", "kendallTau", 0.2))))));
        assertEquals(Kind.PAIRS, session.tau().get().kind());
        session.setTau(session.tau().get().tau() * 0.7, null);
        copula(session);
        double first = portfolio(session).number("dependence.copula.mixture[0].copula.kendallTau");
        double second = portfolio(session).number("dependence.copula.mixture[1].copula.kendallTau");
        assertTrue(first < 0.6 && first > 0.3, () -> "first " + first);
        assertEquals(3, first / second, 1e-4);
    }

    @Test
    void aComonotoneFileTakesUpGumbelOnTheWayDown() {
        Session session = Sessions.of(Sessions.twoPerils(Map.of("family", "comonotonic")));
        assertEquals(Kind.FIXED, session.tau().get().kind());
        session.setTau(0.8, null);
        assertEquals(Sessions.gumbel(0.8), portfolio(session).get("dependence.copula"));
    }

    @Test
    void onePerilHasNothingToTurn() {
        Document one = Sessions.twoPerils(null).withPortfolio(p -> p.remove("perils[1]"));
        Session session = Sessions.of(one);
        assertFalse(session.tau().get().turns());
        session.setTau(0.5, null);
        session.stepFamily(1);
        assertFalse(session.unsaved().get());
    }

    @Test
    void familiesAreSteppedThroughAtTheSameTau() {
        Session session = Sessions.of(Sessions.twoPerils(Sessions.gumbel(0.3)));
        session.stepFamily(1);
        assertEquals(Map.of("family", "clayton", "kendallTau", 0.3, "survival", true), portfolio(session).get("dependence.copula"));
        session.stepFamily(-1);
        session.stepFamily(3);
        assertEquals(Map.of("family", "student", "kendallTau", 0.3, "degreesOfFreedom", 4.0), portfolio(session).get("dependence.copula"));
        session.stepFamily(-3);
        assertEquals(Sessions.gumbel(0.3), portfolio(session).get("dependence.copula"));
    }

    @Test
    void aFamilyWithoutNegativeTauBeginsAtZero() {
        Session session = Sessions.of(Sessions.twoPerils(Map.of("family", "frank", "kendallTau", -0.4)));
        session.setFamily(CopulaFamily.parse("gumbel"));
        assertEquals(0, copula(session).kendallTau(0, 1), 1e-12);
    }

    @Test
    void aMatrixStaysBetweenNormalAndStudent() {
        Session session = Sessions.of(Sessions.matrix(0.6, 0.3, 0.15));
        session.setFamily(CopulaFamily.parse("student:4"));
        copula(session);
        assertEquals(0.6, portfolio(session).number("dependence.copula.correlation[0][1]"));
        session.setFamily(CopulaFamily.parse("gaussian"));
        copula(session);
        assertFalse(portfolio(session).has("dependence.copula.degreesOfFreedom"));
        session.setFamily(CopulaFamily.parse("gumbel"));
        copula(session);
        assertFalse(portfolio(session).has("dependence.copula.correlation"));
    }

    @Test
    void groupsStayBetweenArchimedeanFamilies() {
        Document grouped = Sessions.matrix(0, 0, 0).withPortfolio(p -> p.set("dependence.copula", Map.of("family", "gumbel", "theta", 1.25,
                "survival", true, "groups", List.of(Map.of("perils", List.of("a", "b"), "theta", 2.0)))));
        Session session = Sessions.of(grouped);
        session.setFamily(CopulaFamily.parse("joe"));
        Copula joe = copula(session);
        assertEquals("joe", joe.label());
        assertEquals(0.5, joe.kendallTau(0, 1), 1e-5);
        assertEquals(0.2, joe.kendallTau(0, 2), 1e-5);
    }
}
