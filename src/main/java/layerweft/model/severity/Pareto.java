package layerweft.model.severity;

public record Pareto(double threshold, double alpha) implements SeverityModel {
    public double cdf(double x) { throw new UnsupportedOperationException(); }
    public double survival(double x) { throw new UnsupportedOperationException(); }
    public double atom(double x) { throw new UnsupportedOperationException(); }
    public double quantile(double p) { throw new UnsupportedOperationException(); }
    public double survivalQuantile(double q) { throw new UnsupportedOperationException(); }
    public double mean() { throw new UnsupportedOperationException(); }
    public double limitedMean(double x) { throw new UnsupportedOperationException(); }
    public double limitedSecondMoment(double x) { throw new UnsupportedOperationException(); }
    public double upperEnd() { throw new UnsupportedOperationException(); }
    public SeveritySampler sampler() { throw new UnsupportedOperationException(); }
}
