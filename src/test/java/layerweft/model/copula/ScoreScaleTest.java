package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A score and its uniform are each other's inverse, at both ends of the unit interval. */
class ScoreScaleTest {

    static Stream<Copula> copulas() {
        List<Copula> all = new ArrayList<>(List.of(new Independence(), new Comonotonic(), new Countermonotonic()));
        for (CopulaFamily family : CopulaFamily.withStrength()) {
            for (double tau : new double[]{0, 1e-6, 0.1, 0.5, 0.9, 0.99}) {
                all.add(family.at(tau));
            }
            if (family.tauRange(2).contains(-0.5)) {
                all.add(family.at(-0.5));
                all.add(family.at(-0.99));
            }
        }
        all.add(Student.ofKendallTau(0.3, 1e6));
        all.add(GroupedArchimedean.of(ArchimedeanFamily.GUMBEL, false, new Group(1, List.of(), List.of(new Group(2, List.of(1), List.of())))));
        all.add(GroupedArchimedean.of(ArchimedeanFamily.CLAYTON, true, new Group(1, List.of(), List.of(new Group(2, List.of(1), List.of())))));
        all.add(new MixtureCopula(List.of(0.5, 0.5), List.of(new Comonotonic(), Gaussian.ofKendallTau(0.2))));
        return all.stream();
    }

    @ParameterizedTest
    @MethodSource("copulas")
    void scoreAndUniformAreInverse(Copula copula) {
        ScoreSampler sampler = copula.sampler(2);
        for (int i = 0; i < 2; i++) {
            assertEquals(Double.NEGATIVE_INFINITY, sampler.score(i, 0, 1));
            assertEquals(Double.POSITIVE_INFINITY, sampler.score(i, 1, 0));
            assertEquals(0, sampler.uniform(i, Double.NEGATIVE_INFINITY));
            assertEquals(1, sampler.complement(i, Double.NEGATIVE_INFINITY));
            assertEquals(1, sampler.uniform(i, Double.POSITIVE_INFINITY));
            assertEquals(0, sampler.complement(i, Double.POSITIVE_INFINITY));
            double last = Double.NEGATIVE_INFINITY;
            for (double p : new double[]{1e-300, 1e-100, 1e-20, 1e-9, 1e-3, 0.2, 0.49, 0.5}) {
                double score = sampler.score(i, p, 1 - p);
                assertTrue(score > last, "rising at " + p);
                last = score;
                // |ln p| · 2^-52 is what a score on a logarithmic scale can hold
                assertEquals(p, sampler.uniform(i, score), 2e-12 * p, "near 0");
                assertEquals(1 - p, sampler.complement(i, score), 1e-13);
            }
            for (double q : new double[]{0.5, 0.49, 0.2, 1e-3, 1e-9, 1e-20, 1e-100, 1e-300}) {
                double score = sampler.score(i, 1 - q, q);
                assertTrue(score >= last, "rising at 1 - " + q);
                last = score;
                assertEquals(q, sampler.complement(i, score), 2e-12 * q, "near 1");
                assertEquals(1 - q, sampler.uniform(i, score), 1e-13);
            }
        }
    }
}
