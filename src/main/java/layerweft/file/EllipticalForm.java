package layerweft.file;

import java.util.List;
import layerweft.model.copula.Correlation;
import layerweft.model.copula.CorrelationMatrix;
import layerweft.model.copula.EqualCorrelation;

/** What a file says of the correlation of an elliptical copula: Kendall's τ of every pair, or a matrix. */
final class EllipticalForm {
    private static final int NEIGHBOURS = 8;

    private EllipticalForm() {}

    /** τ = (2/π) asin ρ, and of its neighbours the one that gives exactly this ρ back; null for a matrix. */
    static Double tau(Correlation correlation) {
        if (!(correlation instanceof EqualCorrelation equal)) {
            return null;
        }
        double near = 2 / Math.PI * Math.asin(equal.value());
        double below = near;
        double above = near;
        for (int k = 0; k < NEIGHBOURS; k++) {
            if (rho(below) == equal.value()) {
                return below;
            }
            if (rho(above) == equal.value() && above <= 1) {
                return above;
            }
            below = Math.nextDown(below);
            above = Math.nextUp(above);
        }
        return near;
    }

    private static double rho(double tau) {
        return Math.sin(Math.PI / 2 * tau);
    }

    /** Null where all pairs have one ρ. */
    static List<List<Double>> rows(Correlation correlation) {
        return correlation instanceof CorrelationMatrix matrix ? matrix.rows() : null;
    }
}
