package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.figures.Loadings;
import layerweft.model.treaty.Pricing;
import layerweft.report.ReportModel.Section;
import layerweft.study.Quote;

/** From the expected loss to the upfront premium, step by step, and against the quoted premium. */
final class PremiumPage {
    private static final int COLUMNS = 4;

    private final Quote quote;
    private final Pricing pricing;
    private final List<List<Cell>> rows = new ArrayList<>();

    private PremiumPage(Quote quote) {
        this.quote = quote;
        this.pricing = quote.treaty().programme().pricing();
    }

    static Section of(Quote quote, String title) {
        return new PremiumPage(quote).section(title);
    }

    private Section section(String title) {
        money("expected loss", LayerFigures::expectedLoss);
        money("+ loading", f -> f.netPremium().infinite() ? f.netPremium() : f.netPremium().minus(f.expectedLoss()));
        money("= expected loss and loading", LayerFigures::netPremium);
        money("+ brokerage", f -> brokerage(f));
        money("+ expenses", f -> f.technicalPremium().times(f.paidUpFactor().value() * pricing.expenses()));
        money("= all premiums, expected", f -> f.technicalPremium().times(f.paidUpFactor().value()));
        money("− expected reinstatement premium", f -> f.technicalPremium().times(f.paidUpFactor().value() - 1));
        money("= technical premium, upfront", LayerFigures::technicalPremium);
        row("paid-up factor: all premiums by the upfront one", f -> Cell.number(f.paidUpFactor()));
        row("technical rate on line", f -> Cell.percent(f.technicalRateOnLine()));
        row("quoted premium", f -> f.quotedPremium() == null ? Cell.words("—") : Cell.number(Figure.exact(f.quotedPremium())));
        row("quoted rate on line", f -> f.quotedRateOnLine() == null ? Cell.words("—") : Cell.percent(Figure.exact(f.quotedRateOnLine())));
        row("quoted by technical, less 1", PremiumPage::againstTechnical);
        row("payback, years", f -> Cell.number(f.payback()));
        List<String> header = new ArrayList<>(List.of("Step"));
        quote.layers().forEach(f -> header.add(f.name()));
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Block.Paragraph("Principle: " + Loadings.inWords(pricing.loading()) + ". Brokerage " + FigureText.plainPercent(pricing.brokerage())
                + (pricing.brokerageOnReinstatements() ? " of all premiums" : " of the upfront premium only") + ", expenses " + FigureText.plainPercent(pricing.expenses())
                + " of all premiums."));
        blocks.addAll(new Table("Amounts in " + Report.money(quote.treaty().portfolio()) + ", at the placed shares", header, rows).narrow(COLUMNS));
        blocks.add(new Block.Note("Upfront premium P solves P·(1 + Σ c_k E[u_k]) = all premiums, with c_k the premium rate and u_k the used part of reinstatement k "
                + "(Sundt 1991). Reinstatement premium is expected, not paid upfront. Errors of brokerage, expenses and sums are those of P alone. Payback is 1 by the rate on line."));
        return new Section(title, blocks);
    }

    private Figure brokerage(LayerFigures f) {
        return f.technicalPremium().times(pricing.brokerage() * (pricing.brokerageOnReinstatements() ? f.paidUpFactor().value() : 1));
    }

    private static Cell againstTechnical(LayerFigures f) {
        if (f.quotedPremium() == null || !(f.technicalPremium().value() > 0) || f.technicalPremium().infinite()) {
            return Cell.words("—");
        }
        double ratio = f.quotedPremium() / f.technicalPremium().value();
        return Cell.percent(new Figure(ratio - 1, ratio * f.technicalPremium().error() / f.technicalPremium().value()));
    }

    private void money(String step, Function<LayerFigures, Figure> of) {
        row(step, f -> Cell.number(of.apply(f)));
    }

    private void row(String step, Function<LayerFigures, Cell> of) {
        List<Cell> row = new ArrayList<>(List.of(Cell.words(step)));
        quote.layers().forEach(f -> row.add(of.apply(f)));
        rows.add(row);
    }
}
