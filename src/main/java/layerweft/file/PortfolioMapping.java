package layerweft.file;

import static layerweft.file.Field.number;
import static layerweft.file.Field.optional;
import static layerweft.file.Field.required;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Independence;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;

/** The objects of a portfolio file. */
final class PortfolioMapping {
    static final String FORMAT = "layerweft/portfolio/1";

    /** Fields of the format that this version does not read. */
    static final List<String> LOSS_TABLES = List.of("eventLossTable", "yearLossTable", "years");

    private static final Field<String> NAME = required("name", Scalars.TEXT);

    private static final Shape<SubPeril> SUB_PERIL = Shape.of("subPeril",
            Variant.of(NAME.of(SubPeril::name), number("chance", 1.0).of(SubPeril::chance),
                    required("severity", SeverityMapping.SEVERITY).of(SubPeril::severity), SubPeril::new));
    private static final TwoWay<Peril> PERIL = TwoWay.of(FieldType.OBJECT, PortfolioMapping::peril, PortfolioMapping::write);
    private static final TwoWay<Dependence.Links> LINKS = TwoWay.of(FieldType.TEXT, PortfolioMapping::links,
            links -> links == Dependence.Links.COUNTS ? "counts" : "annualTotals");

    private PortfolioMapping() {}

    static Portfolio read(Node.Members root, Faults faults) {
        return portfolio(names(root.get("perils"), Limits.PERILS)).read(root, "", faults);
    }

    static Node write(Portfolio portfolio) {
        return portfolio(portfolio.perils().stream().map(Peril::name).toList()).write(portfolio);
    }

    private static Node write(Peril peril) {
        return peril(peril.eventLoss() instanceof EventLoss.Split split ? split.subPerils().stream().map(SubPeril::name).toList() : List.of())
                .write(peril);
    }

    /** The shapes of all objects of the file. */
    static List<Shape<?>> shapes() {
        List<Shape<?>> shapes = new ArrayList<>(List.of(portfolio(List.of()), peril(List.of()), SUB_PERIL, dependence(List.of())));
        shapes.addAll(FrequencyMapping.FREQUENCY.shapes());
        shapes.addAll(SeverityMapping.SEVERITY.shapes());
        shapes.addAll(CopulaMapping.shapes());
        return shapes;
    }

    private static Shape<Portfolio> portfolio(List<String> perils) {
        Field<String> currency = required("currency", Scalars.TEXT);
        Field<String> unit = required("unit", Scalars.TEXT);
        Field<List<Peril>> list = required("perils", Lists.notEmpty(Lists.of(PERIL, Limits.PERILS), "at least one peril"));
        Field<Dependence> dependence = optional("dependence", dependence(perils), Dependence.NONE);
        return Shape.of("portfolio", Variant.of(
                v -> new Portfolio(v.get(NAME), v.get(currency), v.get(unit), v.get(list), v.get(dependence)),
                required("format", Scalars.constant(FORMAT)).of(portfolio -> FORMAT), NAME.of(Portfolio::name), currency.of(Portfolio::currency),
                unit.of(Portfolio::unit), list.of(Portfolio::perils), dependence.of(Portfolio::dependence)));
    }

    private static Peril peril(Node node, String path, Faults faults) {
        if (node instanceof Node.Members object && LOSS_TABLES.stream().anyMatch(t -> object.get(t) != null)) {
            for (String table : LOSS_TABLES) {
                if (object.get(table) != null) {
                    faults.add(object.fields().get(table).namePlace(), FieldPath.field(path, table), "a loss table",
                            "frequency with severity or subPerils; this version does not read loss tables yet");
                }
            }
            return null;
        }
        List<String> subPerils = node instanceof Node.Members object ? names(object.get("subPerils"), Limits.SUB_PERILS) : List.of();
        return peril(subPerils).read(node, path, faults);
    }

    private static Shape<Peril> peril(List<String> subPerils) {
        var frequency = required("frequency", FrequencyMapping.FREQUENCY);
        var severity = required("severity", SeverityMapping.SEVERITY);
        var parts = required("subPerils", Lists.notEmpty(Lists.of(SUB_PERIL, Limits.SUB_PERILS), "at least one sub-peril"));
        Field<Copula> copula = optional("subPerilCopula", CopulaMapping.of(subPerils), new Independence());
        return Shape.of("peril",
                Variant.of(NAME.of(Peril::name), frequency.of(Peril::frequency),
                        severity.of(p -> p.eventLoss() instanceof EventLoss.Single single ? single.severity() : null),
                        (name, counts, losses) -> new Peril(name, counts, new EventLoss.Single(losses))),
                Variant.of(NAME.of(Peril::name), frequency.of(Peril::frequency),
                        parts.of(p -> p.eventLoss() instanceof EventLoss.Split split ? split.subPerils() : null),
                        copula.of(p -> p.eventLoss() instanceof EventLoss.Split split ? split.copula() : null),
                        (name, counts, split, joined) -> new Peril(name, counts, new EventLoss.Split(split, joined))));
    }

    private static Shape<Dependence> dependence(List<String> perils) {
        return Shape.of("dependence", Variant.of(required("links", LINKS).of(Dependence::links),
                required("copula", CopulaMapping.of(perils)).of(Dependence::copula), Dependence::new));
    }

    private static Dependence.Links links(Node node, String path, Faults faults) {
        String given = node instanceof Node.Text text ? text.text() : "";
        return switch (given) {
            case "counts" -> Dependence.Links.COUNTS;
            case "annualTotals" -> Dependence.Links.ANNUAL_TOTALS;
            default -> {
                faults.wrongType(node, path, "counts or annualTotals");
                yield null;
            }
        };
    }

    /** The names of the objects of a list, null for a name that is not there; empty where there is no list or a longer one. */
    static List<String> names(Node list, int most) {
        List<String> names = new ArrayList<>();
        if (list instanceof Node.Elements elements && elements.items().size() <= most) {
            for (Node item : elements.items()) {
                names.add(item instanceof Node.Members object && object.get("name") instanceof Node.Text text ? text.text() : null);
            }
        }
        return names;
    }
}
