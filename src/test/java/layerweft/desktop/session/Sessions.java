package layerweft.desktop.session;

import java.util.List;
import java.util.Map;
import java.util.Set;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.file.FileTree;

/** Small sessions that compute on the calling thread and at once. */
final class Sessions {
    /** A run behind that is over in milliseconds. */
    static final SimulationSettings SHORT = new SimulationSettings(2_000, 1, 1);

    private Sessions() {}

    /** Two perils and one aggregate layer, quick to price. */
    static Document twoPerils(Map<String, ?> copula) {
        FileTree portfolio = FileTree.parse("portfolio", """
                {"format": "layerweft/portfolio/1", "name": "Two perils", "currency": "EUR", "unit": "million", "perils": [
                  {"name": "a", "frequency": {"model": "poisson", "mean": 1}, "severity": {"model": "exponential", "mean": 10}},
                  {"name": "b", "frequency": {"model": "poisson", "mean": 2}, "severity": {"model": "exponential", "mean": 5}}]}
                """);
        FileTree programme = FileTree.parse("programme", """
                {"format": "layerweft/programme/1", "name": "One layer", "layers": [
                  {"name": "Aggregate", "annual": {"deductible": 30, "limit": 20}}]}
                """);
        FileTree joined = copula == null ? portfolio : portfolio.set("dependence.links", "counts").set("dependence.copula", copula);
        return new Document(joined, programme, null, null);
    }

    /** With prices, without curves and the run behind. */
    static Session of(Document document) {
        return new Session(document, Background.immediateWithout(Set.of(Pricing.FIRST_ANSWER, Pricing.CURVES, Pricing.LONG_RUN)), SHORT);
    }

    /** With all that a session computes. */
    static Session complete(Document document) {
        return new Session(document, Background.immediate(), SHORT);
    }

    static Map<String, Object> gumbel(double tau) {
        return Map.of("family", "gumbel", "kendallTau", tau);
    }

    /** Three perils in the place of two, joined by a matrix. */
    static Document matrix(double... upper) {
        Document two = twoPerils(Map.of("family", "gaussian", "correlation", List.of(List.of(1.0, upper[0], upper[1]),
                List.of(upper[0], 1.0, upper[2]), List.of(upper[1], upper[2], 1.0))));
        return two.withPortfolio(p -> p.insert("perils", 2, Map.of("name", "c", "frequency", Map.of("model", "poisson", "mean", 1.5),
                "severity", Map.of("model", "exponential", "mean", 8))));
    }
}
