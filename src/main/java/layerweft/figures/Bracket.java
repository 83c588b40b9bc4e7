package layerweft.figures;

/** A guaranteed range: the true value lies in [low, high] whatever the error estimates say. */
public record Bracket(double low, double high) {

    public Bracket times(double factor) {
        return new Bracket(low * factor, high * factor);
    }

    public boolean contains(double value) {
        return value >= low && value <= high;
    }
}
