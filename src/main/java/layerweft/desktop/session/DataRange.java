package layerweft.desktop.session;

import layerweft.model.Check;

/** The range of τ that the data leave open. */
public record DataRange(double low, double high) {
    public DataRange {
        new Check().within("low", low, -1, 1).within("high", high, low, 1).orThrow();
    }
}
