/** The range of a layer's expected loss over every dependence between the perils: comonotone sums, dual bounds, rearrangement. */
package layerweft.engine.bounds;
