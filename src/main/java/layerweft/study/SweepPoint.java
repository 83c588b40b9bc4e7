package layerweft.study;

import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.copula.CopulaFamily;

/**
 * One layer under one family at one strength.
 *
 * @param lift of the expected loss against independence, φ(τ)/φ(0) − 1, a fraction; undefined where φ(0) is 0 or infinite
 * @param value the figure that is swept
 * @param valueLift its lift
 * @param slope its dφ/dτ, in the figure's unit for τ from 0 to 1; undefined where too few simulated points say it
 * @param check the same layer simulated apart; null where not asked for
 */
public record SweepPoint(
        CopulaFamily family, double kendallTau, LayerFigures figures, Figure lift,
        Figure value, Figure valueLift, Figure slope, LayerFigures check) {}
