package layerweft.study;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.copula.CopulaFamily;

/**
 * One layer of a sweep.
 *
 * @param still why the swept figure does not depend on the copula; empty where it does
 * @param refusals why some families were simulated, in plain words; empty where the transform priced all
 * @param independent the layer with independent perils
 * @param comonotone the layer with comonotonic perils: the ceiling of its expected loss where there is no annual limit,
 *     and the end that every family approaches as τ → 1
 * @param comonotoneValue the swept figure there
 * @param comonotoneLift its lift
 * @param points family by family in the order asked for, τ by τ
 */
public record LayerSweep(
        String name,
        Optional<String> still,
        List<String> refusals,
        LayerFigures independent,
        LayerFigures comonotone,
        Figure comonotoneValue,
        Figure comonotoneLift,
        List<SweepPoint> points) {

    public LayerSweep {
        refusals = List.copyOf(refusals);
        points = List.copyOf(points);
    }

    /**
     * How far apart the families are at one τ, in the figure's unit.
     *
     * @param lowest the smallest value over the families
     * @param highest the largest
     */
    public record Spread(double kendallTau, CopulaFamily lowestFamily, Figure lowest, CopulaFamily highestFamily, Figure highest) {

        /** Highest less lowest. */
        public Figure width() {
            return highest.minus(lowest);
        }
    }

    /** The points of one family, in the order of the request. */
    public List<SweepPoint> of(CopulaFamily family) {
        return points.stream().filter(p -> p.family().equals(family)).toList();
    }

    /** The spread at each τ of the request. */
    public List<Spread> spreads() {
        Comparator<SweepPoint> byValue = Comparator.comparingDouble(p -> p.value().value());
        return points.stream().mapToDouble(SweepPoint::kendallTau).distinct().mapToObj(tau -> {
            List<SweepPoint> there = points.stream().filter(p -> p.kendallTau() == tau).toList();
            SweepPoint lowest = there.stream().min(byValue).orElseThrow();
            SweepPoint highest = there.stream().max(byValue).orElseThrow();
            return new Spread(tau, lowest.family(), lowest.value(), highest.family(), highest.value());
        }).toList();
    }
}
