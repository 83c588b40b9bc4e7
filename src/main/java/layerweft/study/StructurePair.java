package layerweft.study;

import java.util.List;
import layerweft.figures.Figure;

/**
 * Two structures against each other: the first less the second, from the same years, with the errors of the differences.
 *
 * @param first position in the comparison
 * @param second position in the comparison
 * @param net differences of the net positions' figures
 * @param costOfCover difference of the costs of cover
 * @param costOfRisk difference of the costs of risk
 * @param breakEvens by expected cost and by cost of risk
 */
public record StructurePair(int first, int second, NetFigures net, Figure costOfCover, Figure costOfRisk, List<BreakEven> breakEvens) {

    public StructurePair {
        breakEvens = List.copyOf(breakEvens);
    }
}
