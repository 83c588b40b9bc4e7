package layerweft.figures;

import layerweft.model.copula.Copula;
import layerweft.model.copula.Independence;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Portfolio;

/** The dependence of a portfolio in words. */
public final class Dependences {

    private Dependences() {}

    public static String inWords(Portfolio portfolio) {
        Copula copula = portfolio.dependence().copula();
        int perils = portfolio.perils().size();
        if (perils == 1) {
            return "One peril";
        }
        if (copula instanceof Independence) {
            return "Perils independent";
        }
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < perils; i++) {
            for (int j = 0; j < i; j++) {
                least = Math.min(least, copula.kendallTau(i, j));
                most = Math.max(most, copula.kendallTau(i, j));
            }
        }
        String tau = most - least < 5e-4 ? tau(least) : tau(least) + " to " + tau(most);
        String linked = portfolio.dependence().links() == Dependence.Links.COUNTS ? "Annual counts" : "Annual totals";
        return linked + " joined by " + copula.label() + ", Kendall's τ " + tau;
    }

    private static String tau(double tau) {
        return FigureText.value(new Figure(tau, Math.abs(tau) < 5e-4 ? 0 : 0.001));
    }
}
