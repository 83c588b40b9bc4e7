package layerweft.model.treaty;

import layerweft.model.Check;

/** How the net premium of a layer is found from the law of its annual loss Y. */
public sealed interface Loading {

    /** Net premium E[Y]. */
    record None() implements Loading {}

    /** Net premium E[Y] + factor·σ(Y). */
    record StandardDeviation(double factor) implements Loading {
        public StandardDeviation {
            new Check().notNegative("factor", factor).orThrow();
        }
    }

    /** Net premium E[Y] + factor·σ²(Y); the factor is per unit of money. */
    record Variance(double factor) implements Loading {
        public Variance {
            new Check().notNegative("factor", factor).orThrow();
        }
    }

    /** Net premium E[Y] + rate·(TVaR_level(Y) − E[Y]). */
    record CostOfCapital(double rate, double level) implements Loading {
        public CostOfCapital {
            new Check().notNegative("rate", rate).between("level", level, 0, 1).orThrow();
        }
    }

    /** Net premium ∫S(y)^(1/ρ) dy (Wang 1995, "Insurance pricing and increased limits ratemaking by proportional hazards transforms"). */
    record ProportionalHazard(double rho) implements Loading {
        public ProportionalHazard {
            new Check().that(rho >= 1 && rho < Double.POSITIVE_INFINITY, "rho", rho, "a finite number of at least 1").orThrow();
        }
    }

    /** Net premium ∫Φ(Φ⁻¹(S(y)) + λ) dy (Wang 2000, "A class of distortion operators for pricing financial and insurance risks"). */
    record Wang(double lambda) implements Loading {
        public Wang {
            new Check().finite("lambda", lambda).orThrow();
        }
    }
}
