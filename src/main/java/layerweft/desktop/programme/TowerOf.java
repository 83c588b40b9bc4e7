package layerweft.desktop.programme;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import layerweft.desktop.picture.Tower;
import layerweft.desktop.session.LivePrices;
import layerweft.engine.simulation.PerilShares;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.portfolio.Peril;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;
import layerweft.study.Drivers;
import layerweft.study.LimitUse;

/** A priced treaty as a tower: heights are subject losses, before the quota share, so that they stand against the haze. */
final class TowerOf {

    private TowerOf() {}

    /**
     * @param uses of the limits, as far as they are known; those of a layer that is now called otherwise are not shown
     * @param drivers null where not known
     * @param largest the year's largest event by return period
     */
    static Tower treaty(LivePrices prices, List<LimitUse> uses, Drivers drivers, SortedMap<Double, Double> largest) {
        Treaty treaty = prices.treaty();
        List<Tower.Layer> layers = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            layers.add(layer(prices, j, uses, drivers));
        }
        return new Tower(perils(treaty), layers, haze(largest));
    }

    /** A programme that has no layer yet. */
    static Tower empty(Treaty treaty, SortedMap<Double, Double> largest) {
        return new Tower(treaty == null ? List.of() : perils(treaty), List.of(), haze(largest));
    }

    private static List<String> perils(Treaty treaty) {
        return treaty.portfolio().perils().stream().map(Peril::name).toList();
    }

    private static List<Tower.Mark> haze(SortedMap<Double, Double> largest) {
        List<Tower.Mark> marks = new ArrayList<>();
        largest.forEach((years, amount) -> {
            if (amount > 0 && (marks.isEmpty() || amount > marks.get(marks.size() - 1).amount())) {
                marks.add(new Tower.Mark(amount, years));
            }
        });
        return marks;
    }

    private static Tower.Layer layer(LivePrices prices, int j, List<LimitUse> uses, Drivers drivers) {
        Treaty treaty = prices.treaty();
        Layer layer = treaty.layer(j);
        LayerTerms terms = layer.terms();
        boolean eventTerms = terms.occurrenceLimit() < Double.POSITIVE_INFINITY || terms.retention() > 0 || terms.hasFranchise();
        boolean ofYear = !eventTerms && terms.hasAnnualTerms();
        double q = terms.quotaShare();
        double line = terms.occurrenceLimit();
        boolean limited = line < Double.POSITIVE_INFINITY;
        double retention = ofYear ? terms.deductible() : terms.retention();
        double limit = ofYear ? terms.annualLimit() : line;
        double kept = limited ? terms.deductible() / line : 0;
        double limits = limited ? terms.annualLimit() / line : 1;
        List<Integer> before = layer.inuring().stream().map(treaty.programme()::indexOf).toList();
        return new Tower.Layer(layer.name(), words(layer, terms), ofYear, retention / q, limit / q, terms.hasFranchise() ? terms.franchise() / q : Double.NaN, kept, limits,
                reinstatements(layer), uses(layer.name(), uses), shares(treaty, j, drivers), prices.layers().get(j).lossOnLine().value(), before);
    }

    private static int reinstatements(Layer layer) {
        if (layer.annual().limit() < Double.POSITIVE_INFINITY) {
            return Tower.BY_ANNUAL_LIMIT;
        }
        return layer.reinstatements() == null ? Tower.UNLIMITED : layer.reinstatements().size();
    }

    private static List<Double> uses(String name, List<LimitUse> uses) {
        return uses.stream().filter(u -> u.name().equals(name)).findFirst().map(u -> u.uses().stream().map(f -> Math.max(0, f.value())).toList()).orElse(List.of());
    }

    /** A peril that is covered but whose share is not known yet has a thin thread. */
    private static List<Double> shares(Treaty treaty, int j, Drivers drivers) {
        int perils = treaty.portfolio().perils().size();
        boolean known = drivers != null && j < drivers.layers().size() && drivers.treaty().layer(j).name().equals(treaty.layer(j).name())
                && drivers.treaty().portfolio().perils().size() == perils;
        PerilShares found = known ? drivers.layers().get(j) : null;
        List<Double> shares = new ArrayList<>();
        for (int i = 0; i < perils; i++) {
            Figure share = found == null ? Figure.exact(0) : found.expectedShare().get(i);
            shares.add(!treaty.cover(j).covers(i) ? Double.NaN : share.defined() ? share.value() : 0);
        }
        return shares;
    }

    /** The terms as one says them: 60 xs 40, 2 at 100 %. */
    static String words(Layer layer, LayerTerms terms) {
        boolean limited = terms.occurrenceLimit() < Double.POSITIVE_INFINITY;
        String year = limitWords(layer.annual().limit()) + " xs " + FigureText.groupedPlain(layer.annual().deductible());
        if (!limited && terms.retention() == 0 && !terms.hasFranchise()) {
            return year + " in the year";
        }
        StringBuilder words = new StringBuilder(limitWords(terms.occurrenceLimit()));
        words.append(terms.hasFranchise() ? " from " + FigureText.groupedPlain(terms.franchise()) + " on" : " xs " + FigureText.groupedPlain(terms.retention()));
        if (layer.reinstatements() != null) {
            int n = layer.reinstatements().size();
            words.append(n == 0 ? ", none" : ", " + n + " at " + FigureText.plainPercent(layer.reinstatements().get(0)));
        }
        if (layer.annual().deductible() > 0 || layer.annual().limit() < Double.POSITIVE_INFINITY) {
            words.append(", year ").append(year);
        }
        return words.toString();
    }

    private static String limitWords(double limit) {
        return limit < Double.POSITIVE_INFINITY ? FigureText.groupedPlain(limit) : "unlimited";
    }
}
