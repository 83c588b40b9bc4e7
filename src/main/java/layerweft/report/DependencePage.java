package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import layerweft.engine.bounds.LayerRange;
import layerweft.figures.Dependences;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.model.portfolio.Portfolio;
import layerweft.report.ReportInput.OfProgramme;
import layerweft.report.ReportModel.Section;
import layerweft.study.BadYears;
import layerweft.study.Bounds;
import layerweft.study.LayerSweep;
import layerweft.study.SweepPoint;
import layerweft.study.SweepRequest;

/** How much of the price hangs on the dependence: bad years together, families and strengths, and what no dependence can pass. */
final class DependencePage {
    private static final List<Double> YEARS = List.of(10.0, 50.0, 100.0);
    private static final double ORDERED_BY = 50;
    private static final int COLUMNS = 5;

    private final OfProgramme programme;
    private final Portfolio portfolio;
    private final List<Block> blocks = new ArrayList<>();

    private DependencePage(OfProgramme programme) {
        this.programme = programme;
        this.portfolio = programme.treaty().portfolio();
    }

    static Section of(OfProgramme programme, String title) {
        DependencePage page = new DependencePage(programme);
        page.blocks.add(new Block.Paragraph(Dependences.inWords(page.portfolio) + "."));
        if (programme.sweep() == null) {
            page.blocks.add(new Block.Paragraph("With one peril there is no dependence between perils."));
        } else {
            page.badYears();
            page.sweep();
            page.bounds();
        }
        return new Section(title, page.blocks);
    }

    private void badYears() {
        Copula copula = portfolio.dependence().copula();
        List<List<Cell>> pairs = new ArrayList<>();
        for (int i = 0; i < portfolio.perils().size(); i++) {
            for (int j = i + 1; j < portfolio.perils().size(); j++) {
                Copula pair = copula instanceof Independence ? copula : copula.pair(i, j);
                pairs.add(row(portfolio.perils().get(i).name() + " and " + portfolio.perils().get(j).name(), BadYears.of(pair, YEARS)));
            }
        }
        blocks.add(new Block.Heading("Bad years together"));
        blocks.add(new Table("Chance that both perils have a year at least as bad as their own 1-in-… year, as set", header("Pair"), pairs));
        double tau = copula instanceof Independence ? 0 : copula.kendallTau(0, 1);
        if (tau > 0) {
            List<List<Cell>> families = BadYears.ofFamilies(SweepRequest.USUAL_FAMILIES, tau, YEARS, ORDERED_BY).stream().map(b -> row(b.label(), b)).toList();
            blocks.add(new Table("The same for " + pairs.get(0).get(0).text() + " with other families at the same τ", header("Family"), families));
        }
        blocks.add(new Block.Note("Bad is meant of what the copula joins: the perils' annual " + portfolio.dependence().links().name().toLowerCase(Locale.ROOT)
                + ". λ_U is the limit of the chance that one is extreme when the other is."));
    }

    private static List<String> header(String first) {
        List<String> header = new ArrayList<>(List.of(first));
        YEARS.forEach(t -> header.add("1 in " + FigureText.plain(t)));
        header.addAll(List.of("Kendall's τ", "λ_U"));
        return header;
    }

    private static List<Cell> row(String name, BadYears b) {
        List<Cell> row = new ArrayList<>(List.of(Cell.words(name)));
        b.chances().forEach(chance -> row.add(Cell.oneIn(Figure.exact(chance))));
        row.add(Cell.number(Figure.exact(b.kendallTau())));
        row.add(Cell.number(Figure.exact(b.upperTail())));
        return row;
    }

    private void sweep() {
        blocks.add(new Block.Heading("Families and strengths"));
        for (LayerSweep layer : programme.sweep().layers()) {
            if (layer.still().isPresent()) {
                blocks.add(new Block.Paragraph(layer.name() + ": " + layer.still().get() + "."));
                continue;
            }
            List<Double> taus = layer.points().stream().map(SweepPoint::kendallTau).distinct().toList();
            List<CopulaFamily> families = layer.points().stream().map(SweepPoint::family).distinct().toList();
            List<String> header = new ArrayList<>(List.of("Family"));
            taus.forEach(tau -> header.add("τ " + FigureText.plain(tau)));
            List<List<Cell>> rows = new ArrayList<>();
            for (CopulaFamily family : families) {
                List<Cell> row = new ArrayList<>(List.of(Cell.words(family.label())));
                layer.of(family).forEach(point -> row.add(Cell.number(point.figures().expectedLoss())));
                rows.add(row);
            }
            blocks.addAll(new Table("Expected loss of " + layer.name() + ", in " + Report.money(portfolio), header, rows).narrow(COLUMNS));
        }
        blocks.add(new Block.Note("The same τ between all perils; at τ = 0 all families are independence (but for Student's, which keeps a dependence of the tails)."));
    }

    private void bounds() {
        List<List<Cell>> rows = new ArrayList<>();
        List<String> notes = new ArrayList<>();
        for (Bounds.Answer answer : programme.bounds().layers()) {
            LayerRange r = answer.range();
            List<Cell> row = new ArrayList<>(List.of(Cell.words(answer.name())));
            for (double value : r == null ? new double[] {Double.NaN, Double.NaN, Double.NaN, Double.NaN, Double.NaN, Double.NaN}
                    : new double[] {r.lowest(), r.attainedLow(), r.independent(), r.comonotone(), r.attainedHigh(), r.highest()}) {
                row.add(Cell.number(r == null ? Figure.UNDEFINED : new Figure(value, r.error())));
            }
            rows.add(row);
            if (answer.note() != null) {
                notes.add(answer.name() + ": " + answer.note() + ".");
            }
        }
        blocks.add(new Block.Heading("What no dependence passes"));
        blocks.addAll(new Table("Expected loss over every dependence, in " + Report.money(portfolio),
                List.of("Layer", "lowest, proven", "attained low", "independent", "rising together", "attained high", "highest, proven"), rows).narrow(COLUMNS + 1));
        if (!notes.isEmpty()) {
            blocks.add(new Block.Points(notes));
        }
    }
}
