package layerweft.figures;

import java.util.SortedMap;
import java.util.TreeMap;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;

/**
 * A layer's figures as shown: money at the layer's share, in the portfolio's unit; ratios and chances do not depend on the share.
 *
 * @param bracket guaranteed range of the expected loss, null where the engine has none
 * @param lossOnLine E[Y] by the occurrence limit, by the annual limit where there is no other; undefined where there is neither
 * @param expectedEvents events a year that hit the layer
 * @param paidUpFactor 1 + Σ c_k E[u_k]
 * @param netPremium expected loss and loading
 * @param technicalPremium the upfront premium P
 * @param technicalRateOnLine P by the line
 * @param quotedPremium at share; null where none is quoted
 * @param quotedRateOnLine null where none is quoted or there is no line
 * @param payback years, 1/(rate on line) of the quoted premium, of the technical one where none is quoted
 * @param valueAtRisk of the year's recovery, by level
 * @param tailValueAtRisk at the buyer's tail level
 * @param occurrence the year's largest recovery from one event, by return period in years
 * @param aggregate the year's recovery, by return period in years
 */
public record LayerFigures(
        String name,
        Engine engine,
        Figure expectedLoss,
        Bracket bracket,
        Figure standardDeviation,
        Figure lossOnLine,
        Figure attachmentProbability,
        Figure exhaustionProbability,
        Figure expectedEvents,
        Figure paidUpFactor,
        Figure netPremium,
        Figure technicalPremium,
        Figure technicalRateOnLine,
        Double quotedPremium,
        Double quotedRateOnLine,
        Figure payback,
        SortedMap<Double, Figure> valueAtRisk,
        Figure tailValueAtRisk,
        SortedMap<Double, Figure> occurrence,
        SortedMap<Double, Figure> aggregate) {

    /** Puts share and ratios on an engine's statistics. */
    public static LayerFigures of(Layer layer, Buyer buyer, LayerStatistics s) {
        LayerTerms terms = layer.terms();
        double share = layer.share();
        double line = terms.line();
        Figure rate = s.technicalPremium().over(line);
        Double quoted = layer.premium() == null ? null : layer.premium() * share;
        Double quotedRate = layer.premium() == null || line == Double.POSITIVE_INFINITY ? null : layer.premium() / line;
        Figure paidUp = new Figure(1 + s.reinstatementFactor().value(), s.reinstatementFactor().error());
        return new LayerFigures(layer.name(), s.engine(), s.expectedLoss().times(share), s.bracket() == null ? null : s.bracket().times(share),
                s.standardDeviation().times(share), s.expectedLoss().over(line), s.attachmentProbability(), s.exhaustionProbability(),
                s.expectedEvents(), paidUp, s.netPremium().times(share), s.technicalPremium().times(share), rate, quoted, quotedRate,
                payback(quotedRate == null ? rate : Figure.exact(quotedRate)), times(s.valueAtRisk(), share), s.tailValueAtRisk().times(share),
                byReturnPeriod(s.occurrenceValueAtRisk(), buyer, share), byReturnPeriod(s.valueAtRisk(), buyer, share));
    }

    /** The premium that the buyer pays upfront: the quoted one, the technical one where none is quoted. */
    public Figure premium() {
        return quotedPremium == null ? technicalPremium : Figure.exact(quotedPremium);
    }

    /** Expected reinstatement premium, P·Σ c_k E[u_k]; nothing where there is nothing to reinstate, also where the premium is infinite. */
    public Figure reinstatementPremium() {
        double factor = paidUpFactor.value() - 1;
        if (factor == 0 && premium().infinite()) {
            return Figure.exact(0);
        }
        return new Figure(premium().value() * factor, premium().error() * factor + premium().value() * paidUpFactor.error());
    }

    /** What the layer is expected to cost its buyer: P·(1 + Σ c_k E[u_k]) − E[Y]. */
    public Figure costOfCover() {
        return premium().plus(reinstatementPremium()).minus(expectedLoss);
    }

    private static Figure payback(Figure rateOnLine) {
        if (!rateOnLine.defined() || rateOnLine.value() == 0) {
            return Figure.UNDEFINED;
        }
        double years = 1 / rateOnLine.value();
        return new Figure(years, rateOnLine.error() * years * years);
    }

    private static SortedMap<Double, Figure> times(SortedMap<Double, Figure> figures, double factor) {
        SortedMap<Double, Figure> scaled = new TreeMap<>();
        figures.forEach((level, figure) -> scaled.put(level, figure.times(factor)));
        return scaled;
    }

    private static SortedMap<Double, Figure> byReturnPeriod(SortedMap<Double, Figure> byLevel, Buyer buyer, double factor) {
        return times(ReturnPeriods.of(byLevel, buyer), factor);
    }
}
