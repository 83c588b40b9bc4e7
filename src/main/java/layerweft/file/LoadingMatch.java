package layerweft.file;

import layerweft.file.KindTable.Match;
import layerweft.model.treaty.Loading;

/** Loadings that are usual to start from: the kinds have no figure in common that one could keep for another. */
final class LoadingMatch {
    private LoadingMatch() {}

    static Match<Loading> to(String kind) {
        Loading loading = switch (kind) {
            case "standardDeviation" -> new Loading.StandardDeviation(0.2);
            case "variance" -> new Loading.Variance(0.005);
            case "costOfCapital" -> new Loading.CostOfCapital(0.06, 0.99);
            case "proportionalHazard" -> new Loading.ProportionalHazard(1.25);
            case "wang" -> new Loading.Wang(0.3);
            default -> new Loading.None();
        };
        return new Match<>(loading, loading instanceof Loading.None ? "No loading: the net premium is the expected loss."
                : "Usual values to start from; the loadings have no figure in common that could be kept.");
    }
}
