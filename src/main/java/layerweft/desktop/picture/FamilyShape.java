package layerweft.desktop.picture;

import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;

/**
 * A family to be drawn on its tile.
 *
 * @param name as people say it
 * @param pair two variables at the present τ; null where the family cannot have it
 * @param upperTail λ_U
 * @param figure of the selected layer at the same τ, with its unit; empty where it is not known yet
 * @param current whether the figure is of this τ; otherwise it is the last known, and greyed
 * @param taken whether it is the family of the file
 * @param reason why it cannot be taken, in words; empty where it can
 */
public record FamilyShape(CopulaFamily family, String name, Copula pair, double upperTail, String figure, boolean current, boolean taken, String reason) {}
