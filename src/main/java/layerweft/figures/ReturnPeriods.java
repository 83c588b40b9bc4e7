package layerweft.figures;

import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import layerweft.model.treaty.Buyer;

/** Exceedance curves as practitioners read them: the amount at a return period T is the value at risk at 1 − 1/T. */
public final class ReturnPeriods {

    private ReturnPeriods() {}

    /** The buyer's return periods in years, rising, each once: the order of {@link #of}. */
    public static List<Double> inOrder(Buyer buyer) {
        return buyer.returnPeriods().stream().sorted().distinct().toList();
    }

    /** Amounts by the buyer's return periods in years, from amounts by level. */
    public static SortedMap<Double, Figure> of(SortedMap<Double, Figure> byLevel, Buyer buyer) {
        SortedMap<Double, Figure> curve = new TreeMap<>();
        for (double years : buyer.returnPeriods()) {
            curve.put(years, byLevel.get(Buyer.levelOf(years)));
        }
        return curve;
    }
}
