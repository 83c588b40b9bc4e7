package layerweft.file;

import static layerweft.file.Examples.PORTFOLIO;
import static layerweft.file.Examples.PROGRAMME;
import static layerweft.file.Examples.changed;
import static layerweft.file.Examples.faults;
import static layerweft.file.Examples.lines;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** One piece of a valid file changed: one fault, at the field, saying what was found. */
class FieldFaultTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            "alpha": 1.6                        | "alpha": "1.6"                        | perils[0].severity.alpha | "1.6"
            "alpha": 1.6                        | "alpha": null                         | perils[0].severity.alpha | null
            "alpha": 1.6                        | "alpha": [1]                          | perils[0].severity.alpha | a list
            "alpha": 1.6                        | "alpha": 1e999                        | perils[0].severity.alpha | 1e999
            "alpha": 1.6                        | "alpha": 1.6, "alpha": 2              | perils[0].severity.alpha | a second time
            "alpha": 1.6                        | "alpha": 1.6, "beta": 2               | perils[0].severity.beta  | an unknown field
            , "alpha": 1.6                      | ``                                    | perils[0].severity.alpha | nothing
            "trials": 3                         | "trials": 3.5                         | perils[1].frequency.trials | 3.5
            "trials": 3                         | "trials": 3e9                         | perils[1].frequency.trials | 3000000000
            "model": "pareto"                   | "model": "paretto"                    | perils[0].severity.model | "paretto"
            "model": "pareto"                   | "model": 7                            | perils[0].severity.model | 7
            "model": "pareto",                  | ``                                    | perils[0].severity.model | nothing
            "mean": 10, "cv": 2                 | "mean": 10, "sigma": 2                | perils[1].subPerils[0].severity | mean beside sigma
            "mean": 10, "cv": 2                 | "cap": 5                              | perils[1].subPerils[0].severity | none of them
            "mean": 10, "cv": 2                 | "mean": 10                            | perils[1].subPerils[0].severity.cv | nothing
            "chance": 0.4                       | "chance": 1.4                         | perils[1].subPerils[1].chance | 1.4
            "chance": 0.4                       | "chance": 0                           | perils[1].subPerils[1].chance | 0
            "name": "sea"                       | "name": "river"                       | perils[1].subPerils[1].name | a second time
            "name": "sea"                       | "name": "a/b"                         | perils[1].subPerils[1].name | "a/b"
            "name": "wind"                      | "name": "flood"                       | perils[1].name | "flood" a second time
            "name": "wind"                      | "name": " "                           | perils[0].name | " "
            "name": "wind"                      | "name": "a\\u001bb"                   | perils[0].name | "a\\u001Bb"
            "name": "wind"                      | "name": true                          | perils[0].name | true
            {"name": "wind"                     | {"severity": {"model": "exponential", "mean": 1}, "name": "wind" | perils[0].severity | a second time
            {"name": "wind",                    | {"subPerilCopula": {"family": "independence"}, "name": "wind", | perils[0] | subPerilCopula beside severity
            {"name": "wind",                    | {"eventLossTable": "events.csv", "name": "wind", | perils[0].eventLossTable | a loss table
            {"name": "wind",                    | {"yearLossTable": "years.csv", "name": "wind", | perils[0].yearLossTable | a loss table
            "currency": "EUR",                  | ``                                    | currency | nothing
            "unit": "million"                   | "unit": 6                             | unit | 6
            "links": "counts"                   | "links": "totals"                     | dependence.links | "totals"
            "links": "counts",                  | ``                                    | dependence.links | nothing
            "kendallTau": 0.3                   | "kendallTau": 1                       | dependence.copula.kendallTau | 1
            "kendallTau": 0.3                   | "kendallTau": 0.3, "theta": 2         | dependence.copula | kendallTau beside theta
            "kendallTau": 0.3                   | "theta": 0.5                          | dependence.copula.theta | 0.5
            "kendallTau": 0.3                   | "kendallTau": 0.3, "degreesOfFreedom": 4 | dependence.copula.degreesOfFreedom | an unknown field
            "kendallTau": 0.3                   | "survival": false                     | dependence.copula | none of them
            "kendallTau": 0.3                   | "kendallTau": 0.3, "survival": "yes"  | dependence.copula.survival | "yes"
            "kendallTau": 0.3                   | "kendallTau": 0.3, "groups": [{"perils": ["rain"], "kendallTau": 0.5}] | dependence.copula.groups[0].perils[0] | "rain"
            "kendallTau": 0.3                   | "kendallTau": 0.3, "groups": [{"perils": ["wind", "wind"], "kendallTau": 0.5}] | dependence.copula.groups[0].perils[1] | "wind"
            "kendallTau": 0.3                   | "kendallTau": 0.3, "groups": [{"perils": ["wind", "flood"], "kendallTau": 0.1}] | dependence.copula.groups[0] | kendallTau 0.1
            "kendallTau": 0.3                   | "kendallTau": 0.3, "groups": [{"kendallTau": 0.5}] | dependence.copula.groups[0].perils | none
            "family": "gumbel", "kendallTau": 0.3 | "family": "gaussian", "correlation": [[1, 0.5]] | dependence.copula.correlation[0] | 2 numbers
            "family": "gumbel", "kendallTau": 0.3 | "family": "gaussian", "correlation": [[1]] | dependence.copula.correlation | a matrix of 1 rows
            "family": "gumbel", "kendallTau": 0.3 | "family": "gaussian", "theta": 1, "kendallTau": 0.2 | dependence.copula.theta | an unknown field
            "family": "gumbel", "kendallTau": 0.3 | "family": "student", "kendallTau": 0.2 | dependence.copula.degreesOfFreedom | nothing
            "family": "gumbel", "kendallTau": 0.3 | "mixture": []                       | dependence.copula.mixture | 0 weights
            "family": "gumbel", "kendallTau": 0.3 | "mixture": [{"weight": 0.5, "copula": {"family": "independence"}}] | dependence.copula.mixture | sum 0.5
            "family": "gumbel", "kendallTau": 0.3 | "mixture": [], "family": "joe"      | dependence.copula | family beside mixture
            "family": "gumbel", "kendallTau": 0.3 | ``                                  | dependence.copula.family | nothing
            """)
    void aPortfolioIsRefusedAtTheField(String from, String to, String path, String found) {
        expectOne(PORTFOLIO, from, to, path, found);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            "retention": 20                     | "retention": -1                       | layers[0].occurrence.retention | -1
            "retention": 20                     | "retention": 20, "franchise": 20      | layers[0].occurrence | retention beside franchise
            "retention": 20                     | "franchise": -20                      | layers[0].occurrence.franchise | -20
            "retention": 20                     | "retentoin": 20                       | layers[0].occurrence.retentoin | an unknown field
            "retention": 20, "limit": 30        | "retention": 20                       | layers[0].reinstatements | no occurrence limit
            "retention": 20, "limit": 30        | "retention": 20, "limit": 0           | layers[0].occurrence.limit | 0
            "reinstatements": [1.0, 0.5]        | "reinstatements": [1.0, -0.5]         | layers[0].reinstatements[1] | -0.5
            "reinstatements": [1.0, 0.5]        | "reinstatements": 2                   | layers[0].reinstatements | 2
            "share": 0.9                        | "share": 0                            | layers[0].share | 0
            "share": 0.9                        | "quotaShare": 1.1                     | layers[0].quotaShare | 1.1
            "share": 0.9                        | "proRataTime": 1                      | layers[0].proRataTime | 1
            "premium": 6.5                      | "premium": -6.5                       | layers[0].premium | -6.5
            "perils": ["wind", "flood/sea"]     | "perils": []                          | layers[0].perils | an empty list
            "perils": ["wind", "flood/sea"]     | "perils": [3]                         | layers[0].perils[0] | 3
            "inuring": ["Cat"]                  | "inuring": ["Kat"]                    | layers[1].inuring[0] | "Kat"
            "inuring": ["Cat"]                  | "inuring": ["Cat", "Cat"]             | layers[1].inuring[1] | "Cat" again
            "inuring": ["Cat"]                  | "inuring": ["Aggregate"]              | layers[1].inuring | layers that inure to each other
            "name": "Aggregate"                 | "name": "Cat"                         | layers[1].name | "Cat" a second time
            "deductible": 40                    | "deductible": -40                     | layers[1].annual.deductible | -40
            "factor": 0.25                      | "factor": -0.25                       | pricing.loading.factor | -0.25
            "factor": 0.25                      | "rate": 0.25, "factor": 1             | pricing.loading.rate | an unknown field
            "principle": "standardDeviation", "factor": 0.25 | "principle": "proportionalHazard", "rho": 0.9 | pricing.loading.rho | 0.9
            "principle": "standardDeviation", "factor": 0.25 | "principle": "costOfCapital", "rate": 0.1, "level": 1 | pricing.loading.level | 1
            "principle": "standardDeviation", "factor": 0.25 | "principle": "wang" | pricing.loading.lambda | nothing
            "brokerage": 0.1                    | "brokerage": 1                        | pricing.brokerage | 1
            "brokerage": 0.1                    | "brokerage": 0.97                     | pricing | together
            "brokerage": 0.1                    | "brokerageOnReinstatements": "no"     | pricing.brokerageOnReinstatements | "no"
            [10, 200]                           | [10, 1]                               | buyer.returnPeriods[1] | 1
            "tailLevel": 0.99                   | "tailLevel": 1                        | buyer.tailLevel | 1
            "capitalCost": 0.07                 | "capitalCost": -0.07                  | buyer.capitalCost | -0.07
            """)
    void aProgrammeIsRefusedAtTheField(String from, String to, String path, String found) {
        expectOne(PROGRAMME, from, to, path, found);
    }

    private static void expectOne(String example, String from, String to, String path, String found) {
        List<Fault> faults = faults(changed(example, from, to));
        // a pair such as "brokerage of 1": the field, and the sum of both
        List<Fault> at = faults.stream().filter(f -> f.path().equals(path)).toList();
        assertEquals(1, at.size(), String.join("\n", lines(faults)));
        assertTrue(at.get(0).found().contains(found), at.get(0).toString());
        assertTrue(faults.size() == 1 || path.equals("pricing.brokerage"), String.join("\n", lines(faults)));
    }
}
