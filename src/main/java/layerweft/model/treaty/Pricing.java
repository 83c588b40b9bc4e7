package layerweft.model.treaty;

import layerweft.model.Check;

/**
 * How an upfront premium is made from a layer's figures.
 *
 * @param brokerage part of the premium paid to the broker, in [0, 1)
 * @param expenses part of the premium for the reinsurer's expenses, in [0, 1)
 * @param brokerageOnReinstatements whether brokerage is taken from reinstatement premiums too
 */
public record Pricing(Loading loading, double brokerage, double expenses, boolean brokerageOnReinstatements) {

    public static final Pricing PLAIN = new Pricing(new Loading.None(), 0, 0, true);

    public Pricing {
        new Check().that(loading != null, "loading", "nothing", "a loading")
                .that(brokerage >= 0 && brokerage < 1, "brokerage", brokerage, "at least 0 and below 1")
                .that(expenses >= 0 && expenses < 1, "expenses", expenses, "at least 0 and below 1")
                .that(!(brokerage + expenses >= 1), "", "brokerage and expenses of " + (brokerage + expenses) + " together",
                        "brokerage and expenses below 1 together")
                .orThrow();
    }
}
