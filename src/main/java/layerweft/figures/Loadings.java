package layerweft.figures;

import layerweft.model.treaty.Loading;

/** The loading principles in words. */
public final class Loadings {

    private Loadings() {}

    public static String inWords(Loading loading) {
        if (loading instanceof Loading.StandardDeviation sd) {
            return "loading " + FigureText.plain(sd.factor()) + " × standard deviation";
        }
        if (loading instanceof Loading.Variance v) {
            return "loading " + FigureText.plain(v.factor()) + " × variance";
        }
        if (loading instanceof Loading.CostOfCapital c) {
            return "loading " + FigureText.plain(c.rate()) + " × (tail mean " + FigureText.plain(c.level()) + " − expected loss)";
        }
        if (loading instanceof Loading.ProportionalHazard ph) {
            return "proportional hazard, ρ = " + FigureText.plain(ph.rho());
        }
        if (loading instanceof Loading.Wang w) {
            return "Wang transform, λ = " + FigureText.plain(w.lambda());
        }
        return "no loading";
    }
}
