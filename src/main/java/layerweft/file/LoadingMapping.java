package layerweft.file;

import static layerweft.file.Field.number;

import java.util.List;
import layerweft.file.Tagged.Kind;
import layerweft.model.treaty.Loading;

/** The kinds of loadings in a programme file, one line each. */
final class LoadingMapping {
    static final Tagged<Loading> LOADING = Tagged.of("loading", "principle", List.of(
            Kind.of("none", "No loading", Loading.None.class, Variant.of(v -> new Loading.None())),
            Kind.of("standardDeviation", "Standard deviation", Loading.StandardDeviation.class,
                    Variant.of(number("factor").of(Loading.StandardDeviation::factor), Loading.StandardDeviation::new)),
            Kind.of("variance", "Variance", Loading.Variance.class, Variant.of(number("factor").of(Loading.Variance::factor), Loading.Variance::new)),
            Kind.of("costOfCapital", "Cost of capital", Loading.CostOfCapital.class,
                    Variant.of(number("rate").of(Loading.CostOfCapital::rate), number("level").of(Loading.CostOfCapital::level), Loading.CostOfCapital::new)),
            Kind.of("proportionalHazard", "Proportional hazard transform", Loading.ProportionalHazard.class,
                    Variant.of(number("rho").of(Loading.ProportionalHazard::rho), Loading.ProportionalHazard::new)),
            Kind.of("wang", "Wang transform", Loading.Wang.class, Variant.of(number("lambda").of(Loading.Wang::lambda), Loading.Wang::new))));

    private LoadingMapping() {}
}
