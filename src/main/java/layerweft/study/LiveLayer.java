package layerweft.study;

import java.util.List;
import java.util.Optional;
import layerweft.figures.LayerFigures;

/**
 * One layer as it is priced while somebody changes the treaty.
 *
 * @param figures by the transform, or by a short simulation where it cannot price the layer
 * @param simulatedBecause why it is simulated, in plain words; empty where the transform priced it
 * @param unmoved why no figure of the layer depends on the copula between the perils; empty where some do
 * @param notes what a reader should know of the layer
 */
public record LiveLayer(LayerFigures figures, Optional<String> simulatedBecause, Optional<String> unmoved, List<String> notes) {
    public LiveLayer {
        notes = List.copyOf(notes);
    }

    /** The same layer with figures from a longer run. */
    public LiveLayer with(LayerFigures other) {
        return new LiveLayer(other, simulatedBecause, unmoved, notes);
    }
}
