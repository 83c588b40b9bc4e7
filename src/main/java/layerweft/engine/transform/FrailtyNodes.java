package layerweft.engine.transform;

import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Generator;

/**
 * Nodes over the frailty V of an Archimedean copula: P(N_i ≤ n | v) = exp(−v ψ⁻¹(F_i(n))) (Marshall &amp; Olkin 1988), for the survival
 * version P(N_i &gt; n | v) = exp(−v ψ⁻¹(1 − F_i(n))).
 */
final class FrailtyNodes {
    /** exp(−e^x): 1 within 1e-13 below, under 1e-16 above. */
    private static final double FLAT_BELOW = -30;
    private static final double FLAT_ABOVE = 3.62;
    /** The error is measured at some of the joint probabilities, and is oscillating: others may be larger. */
    private static final double SAFETY = 4;

    private FrailtyNodes() {
    }

    static LatentNodes of(ArchimedeanFamily family, double theta, Generator generator, boolean survival, CountMargin[] margins,
            double error) {
        double[][] logInverse = logInverses(generator, survival, margins);
        FrailtyRule rule = rule(family, theta, logInverse, error);
        double[][][] conditional = new double[margins.length][rule.logs().length][];
        for (int i = 0; i < margins.length; i++) {
            for (int k = 0; k < rule.logs().length; k++) {
                conditional[i][k] = conditional(logInverse[i], rule.logs()[k], survival);
            }
        }
        return new LatentNodes(rule.weights(), conditional, SAFETY * measured(generator, rule, logInverse));
    }

    /** The rule that {@link #of} takes its nodes from. */
    static FrailtyRule rule(ArchimedeanFamily family, double theta, Generator generator, boolean survival, CountMargin[] margins,
            double error) {
        return rule(family, theta, logInverses(generator, survival, margins), error);
    }

    private static FrailtyRule rule(ArchimedeanFamily family, double theta, double[][] logInverse, double error) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (double[] logs : logInverse) {
            for (double a : logs) {
                if (!Double.isInfinite(a)) {
                    least = Math.min(least, a);
                    most = Math.max(most, a);
                }
            }
        }
        return most == Double.NEGATIVE_INFINITY ? FrailtyRule.of(family, theta, FLAT_BELOW, FLAT_ABOVE, error)
                : FrailtyRule.of(family, theta, FLAT_BELOW - most, FLAT_ABOVE - least, error);
    }

    private static double[][] logInverses(Generator generator, boolean survival, CountMargin[] margins) {
        double[][] logs = new double[margins.length][];
        for (int i = 0; i < margins.length; i++) {
            logs[i] = logInverse(generator, survival, margins[i]);
        }
        return logs;
    }

    static double[] logInverse(Generator generator, boolean survival, CountMargin margin) {
        double[] a = new double[margin.size()];
        for (int n = 0; n < a.length; n++) {
            a[n] = survival ? generator.logInverse(margin.survival()[n], margin.cdf()[n])
                    : generator.logInverse(margin.cdf()[n], margin.survival()[n]);
        }
        return a;
    }

    static double[] conditional(double[] logInverse, double logFrailty, boolean survival) {
        double[] s = new double[logInverse.length];
        for (int n = 0; n < s.length; n++) {
            double x = logFrailty + logInverse[n];
            if (x > FLAT_ABOVE) {
                s[n] = survival ? 0 : 1;
            } else if (x < FLAT_BELOW - 10) {
                s[n] = survival ? 1 : 0;
            } else {
                s[n] = survival ? Math.exp(-Math.exp(x)) : -Math.expm1(-Math.exp(x));
            }
        }
        return s;
    }

    /** Error of joint probabilities that a rule for these counts makes. */
    static double error(Generator generator, FrailtyRule rule, boolean survival, CountMargin[] margins) {
        return SAFETY * measured(generator, rule, logInverses(generator, survival, margins));
    }

    /**
     * The largest |Σ w_k exp(−v_k t) − ψ(t)| over the t of every single threshold and of thresholds of all perils at once: both sides are
     * joint probabilities of counts, and ψ is exact.
     */
    private static double measured(Generator generator, FrailtyRule rule, double[][] logInverse) {
        double worst = 0;
        int longest = 0;
        for (double[] a : logInverse) {
            longest = Math.max(longest, a.length);
            for (double lnT : a) {
                worst = Math.max(worst, difference(generator, rule, lnT));
            }
        }
        for (int n = 0; n < longest; n++) {
            double lnT = Double.NEGATIVE_INFINITY;
            for (double[] a : logInverse) {
                if (a.length > 0) {
                    double next = a[Math.min(n, a.length - 1)];
                    double high = Math.max(lnT, next);
                    lnT = Double.isInfinite(high) ? high : high + Math.log1p(Math.exp(Math.min(lnT, next) - high));
                }
            }
            worst = Math.max(worst, difference(generator, rule, lnT));
        }
        return worst;
    }

    private static double difference(Generator generator, FrailtyRule rule, double lnT) {
        double deficit = 0;
        for (int k = 0; k < rule.logs().length; k++) {
            double x = lnT + rule.logs()[k];
            deficit += rule.weights()[k] * (x > FLAT_ABOVE ? 1 : x < FLAT_BELOW - 10 ? 0 : -Math.expm1(-Math.exp(x)));
        }
        return Math.abs(deficit - generator.complementOfLog(lnT));
    }
}
