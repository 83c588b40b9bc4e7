package layerweft.model.frequency;

public record Binomial(int trials, double chance) implements FrequencyModel {
    public double mean() { throw new UnsupportedOperationException(); }
    public double variance() { throw new UnsupportedOperationException(); }
    public double probability(int n) { throw new UnsupportedOperationException(); }
    public double cdf(int n) { throw new UnsupportedOperationException(); }
    public double survival(int n) { throw new UnsupportedOperationException(); }
    public int quantile(double p) { throw new UnsupportedOperationException(); }
    public int largest() { throw new UnsupportedOperationException(); }
    public org.apache.commons.math3.complex.Complex generatingFunction(org.apache.commons.math3.complex.Complex z) { throw new UnsupportedOperationException(); }
}
