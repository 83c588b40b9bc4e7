package layerweft.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.stream.Collectors;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.treaty.Buyer;
import layerweft.study.Comparison;
import layerweft.study.NetFigures;
import layerweft.study.Preference;
import layerweft.study.Structure;

/** A comparison as text. */
final class CompareText {
    private final Comparison found;
    private final Buyer buyer;
    private final StringBuilder text = new StringBuilder();

    private CompareText(Comparison found) {
        this.found = found;
        this.buyer = found.buyer();
    }

    static String of(Comparison found) {
        return new CompareText(found).text();
    }

    private String text() {
        String money = (found.portfolio().currency() + " " + found.portfolio().unit()).strip();
        text.append(found.portfolio().name()).append(", ").append(money).append('\n');
        text.append(String.format(Locale.ROOT, "%,d years simulated, seed %d, the same for all. ± is one standard error, of differences where they are shown.%n%n",
                found.settings().years(), found.settings().seed()));
        costs();
        positions();
        layers();
        differences();
        preferences();
        return text.toString();
    }

    private String name(int k) {
        return found.structures().get(k).programme().name();
    }

    private void costs() {
        TextTable table = new TextTable("cost", "upfront", "", "reinstatement", "", "recoveries", "", "cost of cover", "", "cost of risk", "", "per unit of relief", "",
                "reinsurer's return", "", "beaten");
        for (int k = 0; k < found.structures().size(); k++) {
            Structure s = found.structures().get(k);
            List<String> row = new ArrayList<>(List.of(s.programme().name()));
            for (Figure f : List.of(s.cost().upfrontPremium(), s.cost().reinstatementPremium(), s.cost().expectedRecoveries(), s.cost().costOfCover(), s.costOfRisk(),
                    s.costPerUnitOfTailRelief())) {
                row.add(FigureText.value(f));
                row.add(FigureText.error(f));
            }
            row.add(FigureText.percent(s.reinsurersReturn()));
            row.add(FigureText.percentError(s.reinsurersReturn()));
            row.add(found.undominated().contains(k) ? "no" : "yes");
            table.row(row.toArray(String[]::new));
        }
        text.append(table);
        text.append("Cost of cover: premiums less recoveries, expected. Cost of risk: expected net position and ").append(FigureText.plainPercent(buyer.capitalCost()))
                .append(" of what its tail\n(TVaR ").append(FigureText.plainPercent(buyer.tailLevel()))
                .append(") has beyond that. Beaten: another costs no more and keeps no more tail. Return: expected result on the tail recovered.\n\n");
    }

    private void positions() {
        table("net position, premiums included", List.of("gross"), List.of(found.gross()), Structure::net);
        table("relief: gross less net", List.of(), List.of(), Structure::relief);
    }

    private void table(String title, List<String> first, List<NetFigures> firstFigures, Function<Structure, NetFigures> of) {
        TextTable table = new TextTable(header(title));
        for (int k = 0; k < first.size(); k++) {
            table.row(row(first.get(k), firstFigures.get(k)));
        }
        found.structures().forEach(s -> table.row(row(s.programme().name(), of.apply(s))));
        text.append(table).append('\n');
    }

    private String[] header(String title) {
        List<String> header = new ArrayList<>(List.of(title, "mean", "", "std dev", ""));
        for (double level : buyer.levels()) {
            header.add("1 in " + FigureText.plain(Math.round(1 / (1 - level) * 1e6) / 1e6));
            header.add("");
        }
        header.add("TVaR " + FigureText.plainPercent(buyer.tailLevel()));
        header.add("");
        return header.toArray(String[]::new);
    }

    private static String[] row(String name, NetFigures net) {
        List<String> row = new ArrayList<>(List.of(name));
        List<Figure> figures = new ArrayList<>(List.of(net.mean(), net.standardDeviation()));
        figures.addAll(net.valueAtRisk().values());
        figures.add(net.tailValueAtRisk());
        for (Figure f : figures) {
            row.add(FigureText.value(f));
            row.add(FigureText.error(f));
        }
        return row.toArray(String[]::new);
    }

    private void layers() {
        TextTable table = new TextTable("what each layer is worth", "cost of cover", "", "relief of std dev", "", "relief of TVaR", "", "cost per unit", "");
        for (Structure s : found.structures()) {
            for (Structure.LayerWorth worth : s.worths()) {
                List<String> row = new ArrayList<>(List.of(s.programme().name() + " / " + worth.layer()));
                for (Figure f : List.of(worth.costOfCover(), worth.relief().standardDeviation(), worth.relief().tailValueAtRisk(), worth.costPerUnitOfTailRelief())) {
                    row.add(FigureText.value(f));
                    row.add(FigureText.error(f));
                }
                table.row(row.toArray(String[]::new));
            }
        }
        text.append(table).append("The net position without the layer less the net position with it.\n\n");
    }

    private void differences() {
        TextTable table = new TextTable(header("difference of net positions"));
        found.pairs().forEach(pair -> table.row(row(name(pair.first()) + " less " + name(pair.second()), pair.net())));
        text.append(table).append('\n');
    }

    private void preferences() {
        for (Preference p : Preference.of(found)) {
            text.append("By ").append(p.measure().words()).append(", ").append(p.family().label()).append(": ")
                    .append(p.spans().stream().map(span -> span(p, span)).collect(Collectors.joining("; "))).append(".\n");
        }
    }

    private String span(Preference preference, Preference.Span span) {
        String names = span.best().stream().map(this::name).collect(Collectors.joining(" or "));
        if (preference.spans().size() == 1) {
            return names + " at every τ";
        }
        boolean last = span.equals(preference.spans().get(preference.spans().size() - 1));
        return names + (last ? " above τ " + tau(span.from()) : " below τ " + tau(span.to()));
    }

    private static String tau(double tau) {
        return FigureText.plain(Math.round(tau * 1000) / 1000.0);
    }
}
