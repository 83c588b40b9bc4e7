package layerweft.desktop.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import layerweft.figures.BuyerPosition;
import layerweft.figures.Engine;
import layerweft.figures.LayerFigures;
import layerweft.figures.WholeStatistics;
import layerweft.model.treaty.Treaty;
import layerweft.study.LiveLayer;
import layerweft.study.Quote;

/**
 * The prices of one treaty, all of the same model.
 *
 * @param document from which the treaty was read
 * @param tau where its dependence stands
 * @param live layer by layer, in the order of the programme
 * @param valid false where the document on screen has faults, so that these are the figures of the last valid one
 * @param quote the long run behind, once it has come: its figures are those of {@code live}, and it has the whole treaty's
 */
public record LivePrices(Document document, Treaty treaty, TauState tau, List<LiveLayer> live, boolean valid, Optional<Quote> quote) {

    public LivePrices {
        live = List.copyOf(live);
    }

    /** The figures of each layer, in the order of the programme. */
    public List<LayerFigures> layers() {
        return live.stream().map(LiveLayer::figures).toList();
    }

    /** The engine of each layer. */
    public List<Engine> engines() {
        return live.stream().map(layer -> layer.figures().engine()).toList();
    }

    /** Gross, ceded and net; there once the long run has come. */
    public Optional<WholeStatistics> whole() {
        return quote.map(Quote::whole);
    }

    /** The buyer's figures; there once the long run has come. */
    public Optional<BuyerPosition> buyer() {
        return quote.map(Quote::buyer);
    }

    /** Whether a layer has come from a short simulation that a longer one will refine. */
    public boolean rough() {
        return quote.isEmpty() && live.stream().anyMatch(layer -> layer.simulatedBecause().isPresent());
    }

    LivePrices invalid() {
        return new LivePrices(document, treaty, tau, live, false, quote);
    }

    LivePrices validAgain() {
        return new LivePrices(document, treaty, tau, live, true, quote);
    }

    /** With the long run's figures: one run for all, so that layers and whole belong together. */
    LivePrices confirmed(Quote longRun) {
        List<LiveLayer> confirmed = new ArrayList<>();
        for (int j = 0; j < live.size(); j++) {
            confirmed.add(live.get(j).with(longRun.layers().get(j)));
        }
        return new LivePrices(document, treaty, tau, confirmed, valid, Optional.of(longRun));
    }
}
