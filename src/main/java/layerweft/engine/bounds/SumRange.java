package layerweft.engine.bounds;

/** The range of E[min((ΣA_i − D)+, M)] over all joint laws of discrete margins. */
final class SumRange {

    private SumRange() {}

    /**
     * @param margins at least two, capped where {@link AnnualLayer#cap()} says
     * @param independent the value for independent margins
     */
    static LayerRange of(Margin[] margins, AnnualLayer layer, double independent, double error) {
        AttainedValues found = new AttainedValues(margins, layer);
        double comonotone = ParallelRun.comonotone(margins, layer);
        double low = Math.min(Math.min(independent, comonotone), found.low());
        double high = Math.max(Math.max(independent, comonotone), found.high());
        if (margins.length == 2) {
            double counter = ParallelRun.countermonotone(margins[0], margins[1], layer);
            low = Math.min(low, counter);
            high = Math.max(high, counter);
        }
        boolean convex = !layer.limited();
        boolean concave = layer.deductible() == 0;
        boolean sharpLow = concave || (convex && margins.length == 2);
        boolean sharpHigh = convex || (concave && margins.length == 2);
        // where a bound is known to be sharp the law that reaches it is among those tried
        double lowest = sharpLow ? low : Math.min(low, new LowerDual(margins, layer).bound());
        double highest = sharpHigh ? high : Math.max(high, new UpperDual(margins, layer).bound());
        return new LayerRange(lowest, low, independent, comonotone, high, highest, error, false);
    }
}
