package layerweft.command;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.Check;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.CopulaFamily;

/** Lists given to an option, separated by commas. Findings name the option. */
final class StudyOptions {

    private StudyOptions() {}

    /** @return {@code usual} where the option is not given */
    static List<CopulaFamily> families(String text, List<CopulaFamily> usual) {
        if (text == null) {
            return usual;
        }
        List<CopulaFamily> families = new ArrayList<>();
        Check findings = new Check();
        for (String name : text.split(",", -1)) {
            try {
                families.add(CopulaFamily.parse(name.strip()));
            } catch (InadmissibleException e) {
                e.findings().forEach(f -> findings.that(false, "families", "family".equals(f.field()) ? f.found() : name + " with " + f.found(),
                        f.admissible()));
            }
        }
        findings.orThrow();
        return families;
    }

    /** @return {@code usual} where the option is not given */
    static List<Double> taus(String text, List<Double> usual) {
        if (text == null) {
            return usual;
        }
        List<Double> taus = new ArrayList<>();
        Check findings = new Check();
        for (String number : text.split(",", -1)) {
            try {
                taus.add(Double.valueOf(number.strip()) + 0.0);
            } catch (NumberFormatException e) {
                findings.that(false, "taus", "\"" + number + "\"", "numbers separated by commas, as in 0,0.1,0.2");
            }
        }
        findings.orThrow();
        return taus;
    }
}
