package layerweft.file;

import java.util.List;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;

/** What a file says of an Archimedean copula, grouped or not; null of any other copula. */
final class ArchimedeanForm {
    private ArchimedeanForm() {}

    static Double theta(ArchimedeanFamily family, Copula copula) {
        if (copula instanceof Archimedean plain && plain.family() == family) {
            return plain.theta();
        }
        return copula instanceof GroupedArchimedean grouped && grouped.family() == family ? (Double) grouped.root().theta() : null;
    }

    static Double tau(ArchimedeanFamily family, Copula copula) {
        Double theta = theta(family, copula);
        return theta == null ? null : (Double) tau(family, (double) theta);
    }

    /** Exactly 0 at independence, where the family's formula may round below it. */
    static double tau(ArchimedeanFamily family, double theta) {
        return theta == family.independentTheta() ? 0 : family.tauOf(theta);
    }

    static Boolean survival(Copula copula) {
        return copula instanceof Archimedean plain && plain.survival() || copula instanceof GroupedArchimedean grouped && grouped.survival();
    }

    /** The groups inside; perils that no group names hang on the root without being named. */
    static List<Group> groups(Copula copula) {
        return copula instanceof GroupedArchimedean grouped ? grouped.root().groups() : List.of();
    }
}
