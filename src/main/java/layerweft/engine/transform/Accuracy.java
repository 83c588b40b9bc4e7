package layerweft.engine.transform;

import layerweft.model.Check;

/**
 * How closely layers are priced.
 *
 * @param relative error wanted of an expected loss, as a part of the layer's limit (L, or M where there is no L)
 * @param mostCells cells of the finest lattice, the bound on time and memory; an error that is still too large there is reported as it is
 * @param brackets whether the guaranteed range of the expected loss is wanted, which takes as long as all figures together
 */
public record Accuracy(double relative, int mostCells, boolean brackets) {

    /** A millionth of the limit, at most 65,536 cells. */
    public static final Accuracy USUAL = new Accuracy(1e-6, 1 << 16, true);

    /** The usual figures, without guaranteed ranges: for a price that has to follow a hand. */
    public static final Accuracy LIVE = new Accuracy(USUAL.relative, USUAL.mostCells, false);

    public Accuracy {
        new Check().that(relative >= 1e-12 && relative <= 1e-2, "relative", relative, "from 1e-12 to 0.01")
                .that(mostCells >= 256 && mostCells <= 1 << 24, "mostCells", mostCells, "from 256 to 16777216")
                .orThrow();
    }

    public static Accuracy of(double relative) {
        return new Accuracy(relative, USUAL.mostCells, USUAL.brackets);
    }

    /** Error wanted of the joint probabilities of counts. */
    double ofProbabilities() {
        return relative * 1e-3;
    }

    /** Counts are cut where this part of their probability is left. */
    double ofCounts() {
        return relative * 1e-6;
    }
}
