package layerweft.model.copula;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleBinaryOperator;

/**
 * The density c(u, v) = ∂²C/∂u∂v of a pair copula, in closed form. A pair that has none everywhere (comonotonic, countermonotonic, ρ = ±1, Clayton at θ = −1)
 * has no density here.
 */
public final class PairDensity {

    private PairDensity() {
    }

    /**
     * @param pair of two variables
     * @return a function of u and v, each in (0, 1)
     */
    public static Optional<DoubleBinaryOperator> of(Copula pair) {
        if (pair instanceof Independence) {
            return Optional.of((u, v) -> 1);
        }
        if (pair instanceof Gaussian gaussian) {
            return EllipticalDensity.of(gaussian.correlation().rho(0, 1), Double.POSITIVE_INFINITY);
        }
        if (pair instanceof Student student) {
            return EllipticalDensity.of(student.correlation().rho(0, 1), student.degreesOfFreedom());
        }
        if (pair instanceof Archimedean archimedean) {
            return ArchimedeanDensity.of(archimedean);
        }
        if (pair instanceof GroupedArchimedean grouped) {
            return ArchimedeanDensity.of(grouped.pair(0, 1));
        }
        return pair instanceof MixtureCopula mixture ? mixed(mixture) : Optional.empty();
    }

    private static Optional<DoubleBinaryOperator> mixed(MixtureCopula mixture) {
        List<Optional<DoubleBinaryOperator>> parts = mixture.components().stream().map(c -> of(c.pair(0, 1))).toList();
        if (parts.stream().anyMatch(Optional::isEmpty)) {
            return Optional.empty();
        }
        return Optional.of((u, v) -> {
            double sum = 0;
            for (int k = 0; k < parts.size(); k++) {
                sum += mixture.weights().get(k) * parts.get(k).orElseThrow().applyAsDouble(u, v);
            }
            return sum;
        });
    }
}
