package layerweft.engine.bounds;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.model.random.KeyedStream;
import org.apache.commons.math3.optim.MaxIter;
import org.apache.commons.math3.optim.linear.LinearConstraint;
import org.apache.commons.math3.optim.linear.LinearConstraintSet;
import org.apache.commons.math3.optim.linear.LinearObjectiveFunction;
import org.apache.commons.math3.optim.linear.NonNegativeConstraint;
import org.apache.commons.math3.optim.linear.Relationship;
import org.apache.commons.math3.optim.linear.SimplexSolver;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Small discrete margins: the exact extremes over all joint laws, by linear programming, lie between what is attained and what is proven. */
class LinearProgramTest {
    private static final int ATOMS = 4;

    static IntStream seeds() {
        return IntStream.range(0, 60);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void exactExtremesLieBetweenAttainedAndProven(int seed) {
        KeyedStream random = new KeyedStream(seed);
        int d = 2 + seed % 2;
        double[][] values = new double[d][];
        double[][] chances = new double[d][];
        Margin[] margins = new Margin[d];
        double deductible = seed % 5 == 0 ? 0 : random.nextInt(40);
        AnnualLayer layer = new AnnualLayer(deductible, seed % 3 == 0 ? Double.POSITIVE_INFINITY : 1 + random.nextInt(50));
        int most = (int) Math.min(40, layer.end() + 1);
        for (int i = 0; i < d; i++) {
            values[i] = IntStream.range(0, ATOMS).mapToDouble(k -> random.nextInt(most)).distinct().sorted().toArray();
            chances[i] = IntStream.range(0, values[i].length).mapToDouble(k -> 1 + random.nextInt(9)).toArray();
            double total = Arrays.stream(chances[i]).sum();
            chances[i] = Arrays.stream(chances[i]).map(p -> p / total).toArray();
        }
        for (int i = 0; i < d; i++) {
            margins[i] = margin(values[i], chances[i]);
        }
        double lowest = extreme(values, chances, layer, GoalType.MINIMIZE);
        double highest = extreme(values, chances, layer, GoalType.MAXIMIZE);
        LayerRange range = SumRange.of(margins, layer, independent(values, chances, layer), 0);
        String what = "seed " + seed + ": " + Arrays.deepToString(values) + Arrays.deepToString(chances) + layer + range + " exact " + lowest
                + " to " + highest;
        double slack = 1e-9 * (1 + highest);
        assertTrue(new LowerDual(margins, layer).bound() <= lowest + slack, what);
        assertTrue(new UpperDual(margins, layer).bound() >= highest - slack, what);
        assertTrue(range.lowest() <= lowest + slack && lowest <= range.attainedLow() + slack, what);
        assertTrue(range.attainedHigh() <= highest + slack && highest <= range.highest() + slack, what);
        // slices of a few atoms are coarse; what is found comes near nevertheless
        double near = 0.02 * (1 + highest);
        assertEquals(lowest, range.attainedLow(), near, what);
        assertEquals(highest, range.attainedHigh(), near, what);
    }

    private static Margin margin(double[] values, double[] chances) {
        double[] above = new double[values.length];
        for (int k = values.length - 2; k >= 0; k--) {
            above[k] = above[k + 1] + chances[k + 1];
        }
        return Margin.of(values, above);
    }

    private static double independent(double[][] values, double[][] chances, AnnualLayer layer) {
        double sum = 0;
        for (int[] at : joint(values)) {
            double p = 1;
            double s = 0;
            for (int i = 0; i < at.length; i++) {
                p *= chances[i][at[i]];
                s += values[i][at[i]];
            }
            sum += p * layer.loss(s);
        }
        return sum;
    }

    private static double extreme(double[][] values, double[][] chances, AnnualLayer layer, GoalType goal) {
        List<int[]> joint = joint(values);
        double[] losses = joint.stream().mapToDouble(at -> {
            double s = 0;
            for (int i = 0; i < at.length; i++) {
                s += values[i][at[i]];
            }
            return layer.loss(s);
        }).toArray();
        List<LinearConstraint> constraints = new ArrayList<>();
        for (int i = 0; i < values.length; i++) {
            for (int k = i == 0 ? 0 : 1; k < values[i].length; k++) {
                int peril = i;
                int atom = k;
                double[] row = joint.stream().mapToDouble(at -> at[peril] == atom ? 1 : 0).toArray();
                constraints.add(new LinearConstraint(row, Relationship.EQ, chances[i][k]));
            }
        }
        return new SimplexSolver().optimize(new MaxIter(10_000), new LinearObjectiveFunction(losses, 0), new LinearConstraintSet(constraints),
                goal, new NonNegativeConstraint(true)).getValue();
    }

    private static List<int[]> joint(double[][] values) {
        List<int[]> all = new ArrayList<>(List.of(new int[0]));
        for (double[] own : values) {
            List<int[]> longer = new ArrayList<>();
            for (int[] at : all) {
                for (int k = 0; k < own.length; k++) {
                    int[] next = Arrays.copyOf(at, at.length + 1);
                    next[at.length] = k;
                    longer.add(next);
                }
            }
            all = longer;
        }
        return all;
    }
}
