package layerweft.engine.simulation;

import java.util.List;
import layerweft.figures.Figure;

/**
 * What each peril brings of an annual amount, in all years and in the bad ones. A year's layer loss is shared out in proportion to what the perils
 * brought of the year's sum of occurrence losses, so that the parts add up to the whole in every year.
 *
 * @param badFrom bad years are those with at least this amount
 * @param badChance part of the years that are bad
 * @param expected by peril, of the mean amount; adds up to the mean of the sample
 * @param bad by peril, of the mean amount of bad years; adds up to it
 * @param expectedShare by peril, adds up to 1; undefined where the amount is always 0
 * @param badShare by peril, adds up to 1; undefined where the amount is always 0
 */
public record PerilShares(double badFrom, double badChance, List<Figure> expected, List<Figure> bad, List<Figure> expectedShare, List<Figure> badShare) {

    public PerilShares {
        expected = List.copyOf(expected);
        bad = List.copyOf(bad);
        expectedShare = List.copyOf(expectedShare);
        badShare = List.copyOf(badShare);
    }
}
