package layerweft.desktop.quote;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import layerweft.desktop.session.FigureShown;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.Pricing;
import layerweft.report.chart.BuildUpChart;
import layerweft.report.chart.BuildUpChart.Kind;
import layerweft.report.chart.BuildUpChart.Step;

/** A layer's premium as bars: from the expected loss over the loading and the charges to the upfront premium, and the quoted one beside it. */
final class PremiumSteps {

    private PremiumSteps() {}

    /** @param part of the figures shown: 1 at the placed share, 1/share at 100 % */
    static BuildUpChart chart(LayerFigures layer, Pricing pricing, double part) {
        double loss = layer.expectedLoss().value() * part;
        double net = layer.netPremium().value() * part;
        double upfront = layer.technicalPremium().value() * part;
        double reinstatement = upfront * (layer.paidUpFactor().value() - 1);
        double gross = upfront + reinstatement;
        double expenses = pricing.expenses() * gross;
        double brokerage = pricing.brokerage() * (pricing.brokerageOnReinstatements() ? gross : upfront);
        List<Step> steps = new ArrayList<>();
        steps.add(new Step("Expected layer loss", "E[Y]", Kind.LOSS, 0, loss, text(layer.expectedLoss().times(part)), true));
        steps.add(new Step("Loading", loading(pricing.loading(), layer, part), Kind.PART, loss, net, change(layer.netPremium().times(part), net - loss), false));
        steps.add(new Step("Brokerage", FigureText.plainPercent(pricing.brokerage()) + (pricing.brokerageOnReinstatements() ? " of gross" : " of the upfront premium"),
                Kind.PART, net, net + brokerage, change(layer.technicalPremium().times(part), brokerage), false));
        steps.add(new Step("Expenses", FigureText.plainPercent(pricing.expenses()) + " of gross", Kind.PART, net + brokerage, net + brokerage + expenses,
                change(layer.technicalPremium().times(part), expenses), false));
        steps.add(new Step("Gross, over the year", "net, brokerage and expenses", Kind.TOTAL, 0, gross,
                text(new Figure(gross, layer.technicalPremium().error() * part * layer.paidUpFactor().value())), true));
        steps.add(new Step("Reinstatement premiums", "expected; paid-up factor " + FigureText.value(layer.paidUpFactor()), Kind.EXPECTED, gross, upfront,
                change(layer.technicalPremium().times(part), -reinstatement), false));
        steps.add(new Step("Technical upfront premium", rate("rate on line ", layer.technicalRateOnLine()), Kind.PREMIUM, 0, upfront,
                text(layer.technicalPremium().times(part)), true));
        if (layer.quotedPremium() != null) {
            double quoted = layer.quotedPremium() * part;
            steps.add(new Step("Quoted premium", layer.quotedRateOnLine() == null ? "" : rate("rate on line ", Figure.exact(layer.quotedRateOnLine())), Kind.QUOTED, 0, quoted,
                    FigureText.groupedPlain(Double.parseDouble(String.format(Locale.ROOT, "%.6g", quoted))), true));
        }
        return new BuildUpChart("From expected loss to upfront premium of " + layer.name(), steps);
    }

    private static String text(Figure figure) {
        return FigureShown.of(figure, "").value();
    }

    private static String change(Figure like, double difference) {
        return FigureShown.of(like, "").change(difference);
    }

    private static String rate(String words, Figure rate) {
        return rate.defined() ? words + FigureShown.percent(rate).text() : "";
    }

    private static String loading(Loading loading, LayerFigures layer, double part) {
        if (loading instanceof Loading.StandardDeviation k) {
            return FigureText.plain(k.factor()) + " × standard deviation " + text(layer.standardDeviation().times(part));
        }
        if (loading instanceof Loading.Variance k) {
            return FigureText.plain(k.factor()) + " × variance, at 100 %";
        }
        if (loading instanceof Loading.CostOfCapital c) {
            return FigureText.plainPercent(c.rate()) + " × (TVaR " + FigureText.plainPercent(c.level()) + " − E[Y])";
        }
        if (loading instanceof Loading.ProportionalHazard h) {
            return "proportional hazard, ρ " + FigureText.plain(h.rho());
        }
        if (loading instanceof Loading.Wang w) {
            return "Wang transform, λ " + FigureText.plain(w.lambda());
        }
        return "none";
    }
}
