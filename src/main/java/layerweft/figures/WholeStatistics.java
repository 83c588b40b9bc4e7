package layerweft.figures;

import java.util.List;

/** The programme as a whole: losses before, to and after reinsurance. */
public record WholeStatistics(PositionStatistics gross, PositionStatistics ceded, PositionStatistics net) {

    /**
     * The same with the layers' own expected losses as the mean of what is ceded, so that gross less ceded is net, and the layers add up, to the
     * last digit.
     */
    public WholeStatistics withCeded(List<LayerFigures> layers) {
        Figure mean = Figure.exact(0);
        for (LayerFigures layer : layers) {
            mean = mean.plus(layer.expectedLoss());
        }
        boolean open = gross.mean().infinite() && mean.infinite();
        return new WholeStatistics(gross, ceded.withMean(mean), open ? net : net.withMean(gross.mean().minus(mean)));
    }
}
