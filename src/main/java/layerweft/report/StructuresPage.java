package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.treaty.Buyer;
import layerweft.report.ReportModel.Section;
import layerweft.study.Comparison;
import layerweft.study.NetFigures;
import layerweft.study.Preference;
import layerweft.study.Structure;

/** The programmes side by side, from the same years. */
final class StructuresPage {
    private static final int COLUMNS = 4;

    private final Comparison found;
    private final Buyer buyer;
    private final String money;
    private final List<Block> blocks = new ArrayList<>();

    private StructuresPage(Comparison found) {
        this.found = found;
        this.buyer = found.buyer();
        this.money = Report.money(found.portfolio());
    }

    static Section of(Comparison found) {
        StructuresPage page = new StructuresPage(found);
        page.costs();
        page.positions();
        page.worths();
        page.preferences();
        return new Section("Structures", page.blocks);
    }

    private String name(int k) {
        return found.structures().get(k).programme().name();
    }

    private void costs() {
        List<List<Cell>> rows = new ArrayList<>();
        for (int k = 0; k < found.structures().size(); k++) {
            Structure s = found.structures().get(k);
            rows.add(List.of(Cell.words(name(k)), Cell.number(s.cost().upfrontPremium()), Cell.number(s.cost().reinstatementPremium()),
                    Cell.number(s.cost().expectedRecoveries()), Cell.number(s.cost().costOfCover()), Cell.number(s.costOfRisk()), Cell.number(s.costPerUnitOfTailRelief()),
                    Cell.percent(s.reinsurersReturn()), Cell.words(found.undominated().contains(k) ? "no" : "yes")));
        }
        blocks.addAll(new Table("Cost, in " + money, List.of("Programme", "upfront premium", "reinstatement premium", "recoveries", "cost of cover", "cost of risk",
                "per unit of relief", "reinsurer's return", "beaten"), rows).narrow(COLUMNS));
        blocks.add(new Block.Note("Cost of cover: premiums less recoveries, expected. Cost of risk: expected net position and " + FigureText.plainPercent(buyer.capitalCost())
                + " of what its tail mean (" + FigureText.plainPercent(buyer.tailLevel()) + ") has beyond that. Beaten: another costs no more and keeps no more tail. Return: "
                + "expected result of the reinsurer on the tail recovered. Return periods, tail level and cost of capital are those of the first programme."));
    }

    private void positions() {
        List<List<Cell>> net = new ArrayList<>(List.of(row("without reinsurance", found.gross())));
        found.structures().forEach(s -> net.add(row(s.programme().name(), s.net())));
        table("Net position: losses less recoveries, with premiums, in " + money, net);
        table("Relief: gross less net, in " + money, found.structures().stream().map(s -> row(s.programme().name(), s.relief())).toList());
        table("Differences of net positions, from the same years, in " + money,
                found.pairs().stream().map(p -> row(name(p.first()) + " less " + name(p.second()), p.net())).toList());
    }

    private void table(String title, List<List<Cell>> rows) {
        List<String> header = new ArrayList<>(List.of("Programme", "mean", "standard deviation"));
        for (double level : buyer.levels()) {
            header.add("1 in " + FigureText.plain(Math.round(1 / (1 - level) * 1e6) / 1e6));
        }
        header.add("tail mean " + FigureText.plainPercent(buyer.tailLevel()));
        blocks.addAll(new Table(title, header, rows).narrow(COLUMNS));
    }

    private static List<Cell> row(String name, NetFigures net) {
        List<Figure> figures = new ArrayList<>(List.of(net.mean(), net.standardDeviation()));
        figures.addAll(net.valueAtRisk().values());
        figures.add(net.tailValueAtRisk());
        List<Cell> row = new ArrayList<>(List.of(Cell.words(name)));
        figures.forEach(f -> row.add(Cell.number(f)));
        return row;
    }

    private void worths() {
        List<List<Cell>> rows = new ArrayList<>();
        for (Structure s : found.structures()) {
            for (Structure.LayerWorth worth : s.worths()) {
                rows.add(List.of(Cell.words(s.programme().name() + " / " + worth.layer()), Cell.number(worth.costOfCover()), Cell.number(worth.relief().standardDeviation()),
                        Cell.number(worth.relief().tailValueAtRisk()), Cell.number(worth.costPerUnitOfTailRelief())));
            }
        }
        blocks.add(new Table("What each layer is worth: the net position without it less the position with it, in " + money,
                List.of("Layer", "cost of cover", "relief of standard deviation", "relief of tail mean", "cost per unit"), rows));
    }

    private void preferences() {
        List<String> sentences = Preference.of(found).stream().map(p -> "By " + p.measure().words() + ", " + p.family().label() + ": "
                + p.spans().stream().map(span -> span(p, span)).collect(Collectors.joining("; ")) + ".").toList();
        if (!sentences.isEmpty()) {
            blocks.add(new Block.Heading("Which is cheaper at which strength of dependence"));
            blocks.add(new Block.Points(sentences));
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
