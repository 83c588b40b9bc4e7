package layerweft.figures;

/** The programme as a whole: losses before, to and after reinsurance. */
public record WholeStatistics(PositionStatistics gross, PositionStatistics ceded, PositionStatistics net) {}
