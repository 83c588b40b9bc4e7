package layerweft.study;

import java.util.List;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.NetPositions;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.LayerFigures;
import layerweft.model.Check;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/**
 * Programmes side by side on one portfolio, from the same years. All are looked at with the eyes of the first programme's buyer: its return
 * periods, tail level and cost of capital.
 *
 * @param gross without any reinsurance
 * @param pairs each structure with each later one
 */
public record Comparison(
        Portfolio portfolio, Buyer buyer, SimulationSettings settings, NetFigures gross, List<Structure> structures, List<StructurePair> pairs) {
    /** Programmes that can be compared at once. */
    public static final int MOST = 50;

    public Comparison {
        structures = List.copyOf(structures);
        pairs = List.copyOf(pairs);
    }

    /**
     * Compares.
     *
     * @param families of the break-evens; none for no break-evens
     * @throws layerweft.model.InadmissibleException if there are fewer than two programmes, two of one name, one that does not fit the
     *     portfolio or whose premium is not finite
     * @throws java.util.concurrent.CancellationException if the control stops it
     */
    public static Comparison of(Portfolio portfolio, List<Programme> programmes, List<CopulaFamily> families, SimulationSettings settings,
            RunControl control) {
        Check check = new Check().that(programmes.size() >= 2 && programmes.size() <= MOST, "programmes", programmes.size(), "from 2 to " + MOST);
        Families.check(check, families);
        for (int k = 0; k < programmes.size(); k++) {
            String name = programmes.get(k).name();
            check.that(programmes.subList(0, k).stream().noneMatch(p -> p.name().equals(name)), "programmes[" + k + "].name",
                    "\"" + name + "\" a second time", "a name of its own for each programme");
        }
        check.orThrow();
        return new ComparisonRun(portfolio, programmes, families, settings, control).comparison();
    }

    /** What the net positions of a programme are made of. */
    static NetPositions.Structure structure(Treaty treaty, List<LayerFigures> layers) {
        return new NetPositions.Structure(treaty, layers.stream().mapToDouble(layer -> layer.premium().value()).toArray());
    }

    /**
     * Positions of the structures that no other beats: none has both a cost of cover and a tail value at risk that are no higher, one of them
     * lower.
     */
    public List<Integer> undominated() {
        return IntStream.range(0, structures.size()).filter(k -> structures.stream().noneMatch(other -> beats(other, structures.get(k)))).boxed().toList();
    }

    private static boolean beats(Structure a, Structure b) {
        double cost = a.cost().costOfCover().value() - b.cost().costOfCover().value();
        double tail = a.net().tailValueAtRisk().value() - b.net().tailValueAtRisk().value();
        return cost <= 0 && tail <= 0 && (cost < 0 || tail < 0);
    }
}
