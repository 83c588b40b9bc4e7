/**
 * Deterministic pricing of a treaty's layers, without noise.
 *
 * <p>The way of a layer's price: the event law of each peril in the layer ({@link layerweft.engine.transform.EventLaw}) goes to a lattice
 * with its mean kept in every cell; the joint law of the counts becomes a mixture of independent ones
 * ({@link layerweft.engine.transform.LatentNodes}), by quadrature over the copula's latent factor or exactly by differences of the copula;
 * {@link layerweft.engine.transform.JointDeficit} puts both together at every frequency; one inverse transform gives the annual sum's law
 * ({@link layerweft.engine.transform.LatticeSum}); {@link layerweft.engine.transform.LayerAnswer} refines lattices until the figures are
 * good enough and states their errors.
 *
 * <p>What is guaranteed: the bracket of the expected loss holds for the lattice without any condition (bounds in convex order, or rounding
 * down and up where parts of events or annual totals are joined); for wrap-around and rounding by bounds; for the latent factor by ten
 * times an error that is measured against known joint probabilities, or bounded.
 */
package layerweft.engine.transform;
