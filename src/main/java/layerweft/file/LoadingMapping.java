package layerweft.file;

import static layerweft.file.Field.number;

import java.util.List;
import layerweft.file.Tagged.Kind;
import layerweft.model.treaty.Loading;

/** The kinds of loadings in a programme file, one line each. */
final class LoadingMapping {
    static final Tagged<Loading> LOADING = Tagged.of("loading", "principle", List.of(
            Kind.of("none", Variant.of(v -> new Loading.None())),
            Kind.of("standardDeviation", Variant.of(number("factor"), Loading.StandardDeviation::new)),
            Kind.of("variance", Variant.of(number("factor"), Loading.Variance::new)),
            Kind.of("costOfCapital", Variant.of(number("rate"), number("level"), Loading.CostOfCapital::new)),
            Kind.of("proportionalHazard", Variant.of(number("rho"), Loading.ProportionalHazard::new)),
            Kind.of("wang", Variant.of(number("lambda"), Loading.Wang::new))));

    private LoadingMapping() {}
}
