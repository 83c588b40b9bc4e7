package layerweft.study;

import java.util.Optional;
import layerweft.figures.Figure;

/**
 * What one step of one assumption does to a figure.
 *
 * @param lever what kind of assumption
 * @param subject the peril it is about; empty for the dependence between all
 * @param step what was changed, in words
 * @param value the figure after the step
 * @param change the figure after less before; its error adds those of both, which for simulations with the same random numbers is more than
 *     it is
 * @param reach how far the assumption as a whole can move the figure, where that has ends
 * @param perStandardError the change for one standard error of the assumption, where its evidence is known
 */
public record Sensitivity(
        Lever lever, String subject, String step, Figure value, Figure change, Optional<Reach> reach, Optional<Figure> perStandardError) {

    /** Kinds of assumptions. */
    public enum Lever {
        /** Kendall's τ at the same family. */
        STRENGTH("strength", "strength of dependence"),
        /** The family at the same τ. */
        FAMILY("family", "family of the copula"),
        /** Mean number of events a year: {@link FrequencyStress}. */
        FREQUENCY("frequency", "frequency"),
        /** The size of all losses: {@link SeverityScale}. */
        SEVERITY("severity", "severity"),
        /** The tail at the same mean: {@link TailStress}. */
        TAIL("tail", "tail");

        private final String label;
        private final String words;

        Lever(String label, String words) {
            this.label = label;
            this.words = words;
        }

        /** As written in files. */
        public String label() {
            return label;
        }

        /** As said to a reader. */
        public String words() {
            return words;
        }
    }

    /**
     * The figure at the two ends of an assumption.
     *
     * @param lowest name of the end at which the figure is lowest
     * @param highest name of the end at which it is highest
     */
    public record Reach(String lowest, Figure atLowest, String highest, Figure atHighest) {}
}
