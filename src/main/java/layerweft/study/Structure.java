package layerweft.study;

import java.util.List;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.figures.ProgrammeCost;
import layerweft.model.treaty.Programme;

/**
 * What one programme does for its buyer. Money is in the portfolio's unit, layers at their shares.
 *
 * @param layers figures of the layers, each by the engine that prices it best
 * @param net the buyer's year: gross losses less recoveries, with premiums upfront and for reinstatement
 * @param relief gross less net
 * @param costPerUnitOfTailRelief cost of cover by relief of the tail value at risk; undefined without relief
 * @param costOfRisk E[net position] + capital cost·(TVaR − E)
 * @param reinsurersCapital TVaR − E of what is recovered in a year: what a reinsurer of the whole programme would hold for it
 * @param reinsurersReturn expected result after brokerage and expenses by that capital; undefined without capital
 * @param worths what each layer is worth, in the order of the programme
 */
public record Structure(
        Programme programme,
        List<LayerFigures> layers,
        ProgrammeCost cost,
        NetFigures net,
        NetFigures relief,
        Figure costPerUnitOfTailRelief,
        Figure costOfRisk,
        Figure reinsurersCapital,
        Figure reinsurersReturn,
        List<LayerWorth> worths) {

    public Structure {
        layers = List.copyOf(layers);
        worths = List.copyOf(worths);
    }

    /**
     * What a layer is worth inside its programme: the position without it less the position with it, its premium counted.
     *
     * @param relief negative means what it adds
     * @param costPerUnitOfTailRelief cost of the layer by its relief of the tail value at risk; undefined without relief
     */
    public record LayerWorth(String layer, Figure costOfCover, NetFigures relief, Figure costPerUnitOfTailRelief) {}
}
