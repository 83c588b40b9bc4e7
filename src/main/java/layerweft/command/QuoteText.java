package layerweft.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.SortedMap;
import layerweft.figures.BuyerPosition;
import layerweft.figures.Dependences;
import layerweft.figures.Engine;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.figures.LayerTermsText;
import layerweft.figures.Loadings;
import layerweft.figures.PositionStatistics;
import layerweft.figures.ReturnPeriods;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.Pricing;
import layerweft.study.Quote;

/** A quote as text that can be pasted into a mail: aligned columns, units, errors beside the figures, notes at the end. */
final class QuoteText {
    private final Quote quote;
    private final Buyer buyer;
    private final StringBuilder text = new StringBuilder();

    private QuoteText(Quote quote) {
        this.quote = quote;
        this.buyer = quote.treaty().programme().buyer();
    }

    static String of(Quote quote) {
        return new QuoteText(quote).write();
    }

    private String write() {
        heading();
        losses();
        premiums();
        curves();
        whole();
        buyerPosition();
        notes();
        return text.toString();
    }

    private void heading() {
        Portfolio portfolio = quote.treaty().portfolio();
        line(portfolio.name() + ": " + quote.treaty().programme().name());
        line(money() + ". Layers at their placed shares. " + Dependences.inWords(portfolio) + ".");
        line(String.format(Locale.ROOT, "%,d years simulated, seed %d. ± is one standard error%s.", quote.settings().years(),
                quote.settings().seed(), anyTransform() ? ", for transform layers the error estimate" : ""));
    }

    private void losses() {
        section("Layers");
        TextTable table = new TextTable("", "terms", "placed", "expected loss", "", "std. deviation", "", "loss on line", "", "attaches", "exhausts",
                "events/year", "engine");
        for (int j = 0; j < quote.layers().size(); j++) {
            LayerFigures f = quote.layers().get(j);
            Layer layer = quote.treaty().layer(j);
            table.row(f.name(), LayerTermsText.of(layer.terms()), FigureText.plainPercent(layer.share()), FigureText.value(f.expectedLoss()),
                    FigureText.error(f.expectedLoss()), FigureText.value(f.standardDeviation()), FigureText.error(f.standardDeviation()),
                    FigureText.percent(f.lossOnLine()), FigureText.percentError(f.lossOnLine()), FigureText.oneIn(f.attachmentProbability()),
                    FigureText.oneIn(f.exhaustionProbability()), FigureText.value(f.expectedEvents()), f.engine().label());
        }
        text.append(table);
    }

    private void premiums() {
        Pricing pricing = quote.treaty().programme().pricing();
        section("Premium (" + Loadings.inWords(pricing.loading()) + "; brokerage " + FigureText.plainPercent(pricing.brokerage())
                + ", expenses " + FigureText.plainPercent(pricing.expenses()) + ")");
        TextTable table = new TextTable("", "expected + loading", "", "paid-up factor", "", "technical premium", "", "rate on line", "quoted",
                "rate on line", "quoted/technical", "payback, years");
        for (LayerFigures f : quote.layers()) {
            table.row(f.name(), FigureText.value(f.netPremium()), FigureText.error(f.netPremium()), FigureText.value(f.paidUpFactor()),
                    FigureText.error(f.paidUpFactor()), FigureText.value(f.technicalPremium()), FigureText.error(f.technicalPremium()),
                    FigureText.percent(f.technicalRateOnLine()), quoted(f.quotedPremium(), false), quoted(f.quotedRateOnLine(), true),
                    againstTechnical(f), FigureText.value(new Figure(round(f.payback().value()), 0)));
        }
        text.append(table);
    }

    private static double round(double years) {
        return Double.isFinite(years) ? Math.round(years * 10) / 10.0 : years;
    }

    private static String quoted(Double value, boolean percent) {
        if (value == null) {
            return "—";
        }
        return percent ? FigureText.percent(Figure.exact(value)) : FigureText.value(Figure.exact(value));
    }

    private static String againstTechnical(LayerFigures f) {
        if (f.quotedPremium() == null || !(f.technicalPremium().value() > 0) || f.technicalPremium().infinite()) {
            return "—";
        }
        return String.format(Locale.ROOT, "%+.1f %%", 100 * (f.quotedPremium() / f.technicalPremium().value() - 1));
    }

    private void curves() {
        section("Recovered once in … years: the year's total, and from the year's largest event");
        List<String> header = new ArrayList<>(List.of(""));
        ReturnPeriods.inOrder(buyer).forEach(t -> header.addAll(List.of(FigureText.plain(t), "")));
        header.addAll(List.of("tail mean " + FigureText.plainPercent(buyer.tailLevel()), ""));
        TextTable table = new TextTable(header.toArray(String[]::new));
        for (LayerFigures f : quote.layers()) {
            table.row(cells(f.name() + ", total", f.aggregate(), f.tailValueAtRisk()));
            table.row(cells(f.name() + ", event", f.occurrence(), null));
        }
        text.append(table);
    }

    private void whole() {
        section("The whole programme, losses only");
        List<String> header = new ArrayList<>(List.of("", "mean", "", "std. deviation", ""));
        ReturnPeriods.inOrder(buyer).forEach(t -> header.addAll(List.of("1 in " + FigureText.plain(t), "")));
        header.addAll(List.of("tail mean " + FigureText.plainPercent(buyer.tailLevel()), ""));
        TextTable table = new TextTable(header.toArray(String[]::new));
        position(table, "gross", quote.whole().gross());
        position(table, "ceded", quote.whole().ceded());
        position(table, "net", quote.whole().net());
        text.append(table);
    }

    private void position(TextTable table, String side, PositionStatistics p) {
        String[] moments = {FigureText.value(p.mean()), FigureText.error(p.mean()), FigureText.value(p.standardDeviation()),
            FigureText.error(p.standardDeviation())};
        table.row(cells(side + ", year", ReturnPeriods.of(p.valueAtRisk(), buyer), p.tailValueAtRisk(), moments));
        table.row(cells(side + ", largest event", ReturnPeriods.of(p.occurrenceValueAtRisk(), buyer), null, "", "", "", ""));
    }

    private static String[] cells(String name, SortedMap<Double, Figure> curve, Figure tail, String... before) {
        List<String> cells = new ArrayList<>(List.of(name));
        cells.addAll(List.of(before));
        for (Figure f : curve.values()) {
            cells.add(FigureText.value(f));
            cells.add(FigureText.error(f));
        }
        cells.add(tail == null ? "" : FigureText.value(tail));
        cells.add(tail == null ? "" : FigureText.error(tail));
        return cells.toArray(String[]::new);
    }

    private void buyerPosition() {
        BuyerPosition b = quote.buyer();
        section("For the buyer (quoted premiums, technical where none is quoted)");
        TextTable table = new TextTable("", money(), "");
        table.row("upfront premium", FigureText.value(b.upfrontPremium()), FigureText.error(b.upfrontPremium()));
        table.row("expected reinstatement premium", FigureText.value(b.reinstatementPremium()), FigureText.error(b.reinstatementPremium()));
        table.row("expected recoveries", FigureText.value(b.expectedRecoveries()), FigureText.error(b.expectedRecoveries()));
        table.row("cost of cover", FigureText.value(b.costOfCover()), FigureText.error(b.costOfCover()));
        table.row("expected net position", FigureText.value(b.netPosition()), FigureText.error(b.netPosition()));
        table.row("relief of standard deviation", FigureText.value(b.reliefOfStandardDeviation()), FigureText.error(b.reliefOfStandardDeviation()));
        b.reliefOfValueAtRisk().forEach((level, relief) -> table.row("relief of value at risk " + FigureText.plainPercent(level),
                FigureText.value(relief), FigureText.error(relief)));
        table.row("relief of tail mean " + FigureText.plainPercent(buyer.tailLevel()), FigureText.value(b.reliefOfTailValueAtRisk()),
                FigureText.error(b.reliefOfTailValueAtRisk()));
        table.row("cost per unit of tail relief", FigureText.value(b.costPerUnitOfTailRelief()), FigureText.error(b.costPerUnitOfTailRelief()));
        text.append(table);
    }

    private void notes() {
        section("Notes");
        for (int j = 0; j < quote.layers().size(); j++) {
            for (String note : quote.notes().get(j)) {
                line("* " + quote.layers().get(j).name() + ": " + note + ".");
            }
        }
        line("* A price supports qualified judgement; it does not replace it, and it defers to local regulation and licensed practice.");
    }

    private String money() {
        return (quote.treaty().portfolio().currency() + " " + quote.treaty().portfolio().unit()).strip();
    }

    private boolean anyTransform() {
        return quote.layers().stream().anyMatch(f -> f.engine() == Engine.TRANSFORM);
    }

    private void section(String title) {
        text.append('\n').append(title).append('\n');
    }

    private void line(String s) {
        text.append(s).append('\n');
    }
}
