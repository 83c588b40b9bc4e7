package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import layerweft.figures.BuyerPosition;
import layerweft.figures.Dependences;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.figures.LayerTermsText;
import layerweft.model.treaty.Layer;
import layerweft.report.ReportInput.OfProgramme;
import layerweft.report.ReportModel.Section;
import layerweft.study.LayerSweep;
import layerweft.study.Quote;

/** The first page: what is bought, what it costs, what it takes away, and how much of that hangs on the dependence. */
final class SummaryPage {

    private SummaryPage() {}

    static Section of(ReportInput input) {
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Block.Paragraph(Dependences.inWords(input.portfolio()) + "."));
        for (OfProgramme programme : input.programmes()) {
            Quote quote = programme.quote();
            if (input.programmes().size() > 1) {
                blocks.add(new Block.Heading(programme.treaty().programme().name()));
            }
            blocks.add(new Block.Points(sentences(programme)));
            blocks.add(layers(quote));
        }
        blocks.add(new Block.Note("± is one standard error of a simulated figure, the error estimate of a computed one. Money of a layer is at its placed share. "
                + "Digits follow the error."));
        blocks.add(new Block.Heading("Care"));
        blocks.add(new Block.Paragraph(MethodPage.CARE));
        return new Section("Summary", blocks);
    }

    private static List<String> sentences(OfProgramme programme) {
        BuyerPosition b = programme.quote().buyer();
        double tail = programme.treaty().programme().buyer().tailLevel();
        List<String> sentences = new ArrayList<>();
        sentences.add("Upfront premium " + shown(b.upfrontPremium()) + ", expected reinstatement premium " + shown(b.reinstatementPremium())
                + ", expected recoveries " + shown(b.expectedRecoveries()) + ": the cover costs " + shown(b.costOfCover()) + " a year on average.");
        sentences.add("The mean of the year's losses beyond the " + FigureText.plainPercent(tail) + " level falls from "
                + shown(programme.quote().whole().gross().tailValueAtRisk()) + " gross to " + shown(programme.quote().whole().net().tailValueAtRisk()) + " net.");
        if (programme.sweep() != null) {
            sentences.add(reach(programme));
        }
        return sentences;
    }

    /** The layer that dependence can move most, and how far. */
    private static String reach(OfProgramme programme) {
        LayerSweep most = null;
        for (LayerSweep layer : programme.sweep().layers()) {
            double lift = Math.abs(layer.comonotoneLift().value());
            if (lift > 0 && Double.isFinite(lift) && (most == null || lift > Math.abs(most.comonotoneLift().value()))) {
                most = layer;
            }
        }
        if (most == null) {
            return "Dependence between the perils moves the expected loss of no layer.";
        }
        return "Dependence matters most for " + most.name() + ": its expected loss is " + shown(most.independent().expectedLoss())
                + " with independent perils and " + shown(most.comonotone().expectedLoss()) + " with perils that rise and fall together.";
    }

    static String shown(Figure figure) {
        String error = FigureText.error(figure);
        return (FigureText.value(figure) + (error.isEmpty() ? "" : " " + error)).replace('-', '−');
    }

    private static Table layers(Quote quote) {
        List<List<Cell>> rows = new ArrayList<>();
        for (int j = 0; j < quote.layers().size(); j++) {
            LayerFigures f = quote.layers().get(j);
            Layer layer = quote.treaty().layer(j);
            rows.add(List.of(Cell.words(f.name()), Cell.words(LayerTermsText.of(layer.terms())), Cell.number(f.expectedLoss()), Cell.percent(f.lossOnLine()),
                    Cell.number(f.technicalPremium()), f.quotedPremium() == null ? Cell.words("—") : Cell.number(Figure.exact(f.quotedPremium()))));
        }
        return new Table("Amounts in " + Report.money(quote.treaty().portfolio()),
                List.of("Layer", "terms", "expected loss", "loss on line", "technical premium", "quoted premium"), rows);
    }
}
