package layerweft.engine.transform;

/**
 * A law on the lattice below a given one in increasing convex order, by fusing mass: from cells on both sides of a lattice point so much
 * is taken that its mean is the point (a fusion lowers a law in convex order, Elton &amp; Hill 1992). Going up the lattice, the mass of a cell
 * that its lower point does not use goes to its upper point; what is left below the cap, where nothing lies above to balance it, is
 * rounded down. Against the law with mass spread the gap is of second order in the step.
 */
final class FusedLaw {

    private FusedLaw() {
    }

    /**
     * @param hit P(o &gt; 0)
     * @param mean average of P(o &gt; x) over cell k
     * @param reaches P(o ≥ (k+1)h)
     * @param passes P(o &gt; (k+1)h); at the cap the same as reaches
     * @return P(o' &gt; kh), k = 0..cells−1
     */
    static double[] survival(double hit, double[] mean, double[] reaches, double[] passes) {
        int cells = mean.length;
        double[] mass = new double[cells + 1];
        double restMass = 0;
        double restMean = 0;
        for (int k = 0; k < cells; k++) {
            // cell k lies strictly between points k and k+1; offsets are in steps above point k
            double inside = (k == 0 ? hit : passes[k - 1]) - reaches[k];
            double offset = inside > 0 ? Math.min(1, Math.max(0, (mean[k] - reaches[k]) / inside)) : 0;
            mass[k + 1] += reaches[k] - (k == cells - 1 ? 0 : passes[k]);
            if (k == 0) {
                restMass = inside;
                restMean = offset;
                continue;
            }
            // restMass of cell k−1 lies 1 − restMean below point k; balance it with mass from cell k
            double needed = offset > 0 ? restMass * (1 - restMean) / offset : Double.POSITIVE_INFINITY;
            if (inside <= 0 && restMass <= 0) {
                continue;
            }
            if (needed <= inside) {
                mass[k] += restMass + needed;
                restMass = inside - needed;
                restMean = offset;
            } else {
                // too little above: balance only a part, the rest goes down to the point below its cell
                double balanced = restMass > 0 && restMean < 1 ? Math.min(restMass, inside * offset / (1 - restMean)) : 0;
                mass[k] += balanced + inside;
                mass[k - 1] += restMass - balanced;
                restMass = 0;
                restMean = 0;
            }
        }
        mass[cells - 1] += restMass;
        double[] survival = new double[cells];
        double above = mass[cells];
        for (int k = cells - 1; k >= 0; k--) {
            // rounding may not carry the sum of the masses beyond the probability of a loss
            survival[k] = Math.min(hit, above);
            above += mass[k];
        }
        return survival;
    }
}
