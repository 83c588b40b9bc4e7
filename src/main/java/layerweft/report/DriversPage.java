package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import layerweft.engine.simulation.PerilShares;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.portfolio.Peril;
import layerweft.report.ReportModel.Section;
import layerweft.study.Drivers;

/** Which perils bring a layer's loss, in all years and in bad ones. */
final class DriversPage {
    private static final int COLUMNS = 5;

    private DriversPage() {}

    static Section of(Drivers drivers, String title) {
        String level = FigureText.plainPercent(drivers.treaty().programme().buyer().tailLevel());
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Block.Paragraph("A year's layer loss is shared out in proportion to what the perils brought of the year's sum of occurrence losses, so that "
                + "the shares of a line add up. Bad years are those from the value at risk at " + level + " on."));
        List<String> header = new ArrayList<>(List.of("Layer"));
        drivers.treaty().portfolio().perils().stream().map(Peril::name).forEach(header::add);
        List<List<Cell>> all = new ArrayList<>();
        List<List<Cell>> bad = new ArrayList<>();
        for (int j = 0; j < drivers.layers().size(); j++) {
            add(all, bad, drivers.treaty().layer(j).name(), drivers.layers().get(j));
        }
        add(all, bad, "kept by the buyer", drivers.kept());
        blocks.addAll(new Table("Share of the expected loss", header, all).narrow(COLUMNS));
        blocks.addAll(new Table("Share in bad years", header, bad).narrow(COLUMNS));
        return new Section(title, blocks);
    }

    private static void add(List<List<Cell>> all, List<List<Cell>> bad, String name, PerilShares shares) {
        all.add(row(name, shares.expectedShare()));
        bad.add(row(name, shares.badShare()));
    }

    private static List<Cell> row(String name, List<Figure> shares) {
        List<Cell> row = new ArrayList<>(List.of(Cell.words(name)));
        shares.forEach(share -> row.add(Cell.percent(share)));
        return row;
    }
}
