package layerweft.file;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.Exponential;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;

/**
 * Portfolios and programmes with the names of a faulty file and nothing else of it. What is wrong between objects, such as a name used
 * twice, is found on them in the same round as what is wrong within the objects.
 */
final class StandIns {
    private static final String ANY_NAME = "any";

    private StandIns() {}

    /** Null where a name cannot be read; faults between the perils are added. */
    static Portfolio portfolio(Node.Members root, Faults faults) {
        List<String> names = PortfolioMapping.names(root.get("perils"), Limits.PERILS);
        if (names.isEmpty() || names.contains(null) || !(root.get("perils") instanceof Node.Elements list)) {
            return null;
        }
        List<Peril> perils = new ArrayList<>();
        for (int i = 0; i < names.size(); i++) {
            EventLoss loss = eventLoss((Node.Members) list.items().get(i), FieldPath.item("perils", i), faults);
            if (loss == null || names.get(i).isBlank() || names.get(i).contains("/")) {
                return null;
            }
            perils.add(new Peril(names.get(i), new Poisson(1), loss));
        }
        try {
            return new Portfolio(ANY_NAME, "", "", perils, Dependence.NONE);
        } catch (InadmissibleException e) {
            faults.add(root, "", e);
            return null;
        }
    }

    private static EventLoss eventLoss(Node.Members peril, String path, Faults faults) {
        List<String> names = PortfolioMapping.names(peril.get("subPerils"), Limits.SUB_PERILS);
        if (names.isEmpty()) {
            return new EventLoss.Single(new Exponential(1));
        }
        if (names.stream().anyMatch(n -> n == null || n.isBlank() || n.contains("/"))) {
            return null;
        }
        try {
            return new EventLoss.Split(names.stream().map(n -> new SubPeril(n, 1, new Exponential(1))).toList(), new Independence());
        } catch (InadmissibleException e) {
            faults.add(peril, path, e);
            return null;
        }
    }

    /** Null where a name cannot be read; faults between the layers are added. */
    static Programme programme(Node.Members root, Faults faults) {
        List<String> names = PortfolioMapping.names(root.get("layers"), Limits.LAYERS);
        if (!(root.get("layers") instanceof Node.Elements list) || names.isEmpty() || names.stream().anyMatch(n -> n == null || n.isBlank())) {
            return null;
        }
        List<Layer> layers = new ArrayList<>();
        for (int j = 0; j < names.size(); j++) {
            Node.Members layer = (Node.Members) list.items().get(j);
            layers.add(new Layer(names.get(j), texts(layer.get("perils")), OccurrenceTerms.NONE, AnnualTerms.NONE, null, 1, 1, false,
                    texts(layer.get("inuring")), null));
        }
        try {
            return new Programme(ANY_NAME, layers, Pricing.PLAIN, Buyer.USUAL);
        } catch (InadmissibleException e) {
            faults.add(root, "", e);
            return null;
        }
    }

    /** A list of texts; empty if it is anything else. */
    private static List<String> texts(Node node) {
        if (!(node instanceof Node.Elements list) || !list.items().stream().allMatch(Node.Text.class::isInstance)) {
            return List.of();
        }
        return list.items().stream().map(item -> ((Node.Text) item).text()).toList();
    }
}
