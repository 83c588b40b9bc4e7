package layerweft.model.copula;

import java.util.Arrays;
import java.util.OptionalDouble;
import java.util.function.DoubleBinaryOperator;
import java.util.stream.IntStream;

/** The coordinates of a point of the unit cube that are below 1: a distribution function depends on no others. */
record OpenCoordinates(double[] u, int[] indices) {

    static OpenCoordinates of(double[] u) {
        return new OpenCoordinates(u, IntStream.range(0, u.length).filter(i -> u[i] < 1).toArray());
    }

    /** Whether a coordinate is 0, and so the distribution function. */
    boolean impossible() {
        return Arrays.stream(u).anyMatch(x -> x == 0);
    }

    /** Their quantiles, by a function of p and 1 − p. */
    double[] quantiles(DoubleBinaryOperator quantile) {
        return Arrays.stream(indices).mapToDouble(i -> quantile.applyAsDouble(u[i], 1 - u[i])).toArray();
    }

    double[][] correlation(Correlation correlation) {
        return Arrays.stream(indices)
                .mapToObj(i -> Arrays.stream(indices).mapToDouble(j -> correlation.rho(i, j)).toArray())
                .toArray(double[][]::new);
    }

    OptionalDouble common(Correlation correlation) {
        return indices.length == 0 ? OptionalDouble.of(0) : correlation.common(u.length);
    }
}
