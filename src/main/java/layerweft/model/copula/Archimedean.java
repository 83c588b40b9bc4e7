package layerweft.model.copula;

public record Archimedean(Object family, double theta, boolean survival) implements Copula {
    public String label() { throw new UnsupportedOperationException(); }
    public void requireDimension(int d) { throw new UnsupportedOperationException(); }
    public double cdf(double... u) { throw new UnsupportedOperationException(); }
    public double kendallTau(int i, int j) { throw new UnsupportedOperationException(); }
    public double upperTail(int i, int j) { throw new UnsupportedOperationException(); }
    public double lowerTail(int i, int j) { throw new UnsupportedOperationException(); }
    public ScoreSampler sampler(int d) { throw new UnsupportedOperationException(); }
}
