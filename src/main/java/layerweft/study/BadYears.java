package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;

/**
 * How often two perils have a bad year at once: both at least as bad as their own 1-in-T year, under one copula. With u = 1 − 1/T the chance is
 * 1 − 2u + C(u, u), which for independent perils is 1/T².
 *
 * @param label of the copula
 * @param kendallTau between the two
 * @param upperTail λ_U
 * @param lowerTail λ_L
 * @param chances of both, in the order of {@code returnPeriods}
 */
public record BadYears(String label, double kendallTau, double upperTail, double lowerTail, List<Double> returnPeriods, List<Double> chances) {

    public BadYears {
        returnPeriods = List.copyOf(returnPeriods);
        chances = List.copyOf(chances);
    }

    /** @param pair of two variables */
    public static BadYears of(Copula pair, List<Double> returnPeriods) {
        return new BadYears(pair.label(), pair instanceof Independence ? 0 : pair.kendallTau(0, 1), pair.upperTail(0, 1), pair.lowerTail(0, 1), returnPeriods,
                returnPeriods.stream().map(years -> bothBeyond(pair, years)).toList());
    }

    /** The families at one τ, and independence, the most frequent joint bad years at one return period first; families that cannot have the τ are left out. */
    public static List<BadYears> ofFamilies(List<CopulaFamily> families, double kendallTau, List<Double> returnPeriods, double orderedBy) {
        List<BadYears> rows = new ArrayList<>();
        for (CopulaFamily family : families) {
            if (family.tauRange(2).contains(kendallTau)) {
                rows.add(of(family.at(kendallTau), returnPeriods));
            }
        }
        rows.add(of(new Independence(), returnPeriods));
        rows.sort((a, b) -> Double.compare(b.chance(orderedBy), a.chance(orderedBy)));
        return rows;
    }

    /** The chance that both have a year at least as bad as their 1-in-so-many year. */
    public static double bothBeyond(Copula pair, double years) {
        double u = 1 - 1 / years;
        return Math.max(0, 2 / years - 1 + pair.cdf(u, u));
    }

    /** The chance at one of the return periods. */
    public double chance(double years) {
        return chances.get(returnPeriods.indexOf(years));
    }

    /** How many times as often as if the perils were independent. */
    public double timesIndependent(double years) {
        return chance(years) * years * years;
    }
}
