package layerweft.study;

import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Correlation;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;

/**
 * Copulas whose pairs differ, made stronger or weaker as a whole: the correlations of a matrix, the τ of an Archimedean copula and of its
 * groups, and each component of a mixture are multiplied by one factor.
 *
 * @param perils number of perils joined, at least 2
 */
record PairScaling(Copula copula, int perils) {
    /** Part of the way to the strongest copula there is, at which the scaling stops. */
    private static final double SHORT_OF_END = 0.99;

    /** The mean of the pairs' τ. */
    double mean() {
        return taus().average().orElseThrow();
    }

    double lowest() {
        return taus().min().orElseThrow();
    }

    double highest() {
        return taus().max().orElseThrow();
    }

    private DoubleStream taus() {
        return IntStream.range(0, perils).boxed().flatMap(j -> IntStream.range(0, j).mapToObj(i -> copula.kendallTau(i, j)))
                .mapToDouble(Double::doubleValue);
    }

    /** The copula with all its strengths times a factor from 0 to {@link #mostFactor}. */
    PairScaling by(double factor) {
        return new PairScaling(scaled(copula, factor), perils);
    }

    /** How far the strengths can be multiplied with the copula still admissible; infinite where there is none that can be. */
    double mostFactor() {
        return mostFactor(copula);
    }

    private double mostFactor(Copula of) {
        if (of instanceof Gaussian gaussian) {
            return mostFactor(gaussian.correlation());
        }
        if (of instanceof Student student) {
            return mostFactor(student.correlation());
        }
        if (of instanceof MixtureCopula mixture) {
            return mixture.components().stream().mapToDouble(this::mostFactor).min().orElseThrow();
        }
        if (!(of instanceof Archimedean || of instanceof GroupedArchimedean)) {
            return Double.POSITIVE_INFINITY;
        }
        PairScaling alone = new PairScaling(of, perils);
        double strongest = Math.max(Math.abs(alone.lowest()), alone.highest());
        return strongest == 0 ? Double.POSITIVE_INFINITY : SHORT_OF_END / strongest;
    }

    /** (1 − f)·I + f·R has the eigenvalues 1 − f(1 − λ): none below 0 as long as f ≤ 1/(1 − λ_min), which keeps every |ρ| ≤ 1 as well. */
    private double mostFactor(Correlation correlation) {
        EigenDecomposition eigen = new EigenDecomposition(new Array2DRowRealMatrix(correlation.matrix(perils)));
        double least = Arrays.stream(eigen.getRealEigenvalues()).min().orElseThrow();
        return least >= 1 ? Double.POSITIVE_INFINITY : SHORT_OF_END / (1 - least);
    }

    private Copula scaled(Copula of, double factor) {
        if (of instanceof Gaussian gaussian) {
            return Gaussian.ofCorrelation(scaled(gaussian.correlation(), factor));
        }
        if (of instanceof Student student) {
            return Student.ofCorrelation(scaled(student.correlation(), factor), student.degreesOfFreedom());
        }
        if (of instanceof Archimedean one) {
            return Archimedean.ofKendallTau(one.family(), one.survival(), factor * one.kendallTau(0, 1));
        }
        if (of instanceof GroupedArchimedean grouped) {
            return GroupedArchimedean.of(grouped.family(), grouped.survival(), scaled(grouped.family(), grouped.root(), factor));
        }
        if (of instanceof MixtureCopula mixture) {
            List<Copula> components = mixture.components().stream().map(component -> scaled(component, factor)).toList();
            return new MixtureCopula(mixture.weights(), components);
        }
        return of;
    }

    private static Group scaled(ArchimedeanFamily family, Group group, double factor) {
        return Group.ofKendallTau(family, factor * family.tauOf(group.theta()), group.members(),
                group.groups().stream().map(inner -> scaled(family, inner, factor)).toList());
    }

    private double[][] scaled(Correlation correlation, double factor) {
        double[][] matrix = correlation.matrix(perils);
        for (int i = 0; i < perils; i++) {
            for (int j = 0; j < perils; j++) {
                matrix[i][j] = i == j ? 1 : factor * matrix[i][j];
            }
        }
        return matrix;
    }
}
