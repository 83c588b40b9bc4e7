package layerweft.file;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;

/** The faults of one file as they are found. */
final class Faults {
    private final String file;
    private final Set<Fault> found = new LinkedHashSet<>();
    private int count;

    Faults(String file) {
        this.file = file;
    }

    String file() {
        return file;
    }

    void add(Place place, String path, String what, String admissible) {
        count++;
        if (found.size() < Limits.FAULTS) {
            found.add(new Fault(file, place.line(), place.column(), path, what, admissible));
        }
    }

    /** A value of another type than it should be. */
    void wrongType(Node node, String path, String admissible) {
        add(node.place(), path, node.shown(), admissible);
    }

    /** What a constructor of the model found, at the fields below the object that was read from the node. */
    void add(Node node, String path, InadmissibleException e) {
        for (Finding finding : e.findings()) {
            add(node.placeOf(finding.field()), FieldPath.below(path, finding.field()), finding.found(), finding.admissible());
        }
    }

    /** What stood in the way of reading the file at all. */
    void add(FaultyFileException e) {
        count += e.faults().size();
        found.addAll(e.faults());
    }

    /** How many faults were added so far, for telling whether a part of the file added any. */
    int count() {
        return count;
    }

    /** The faults in the order of their places. */
    List<Fault> inOrder() {
        List<Fault> faults = new ArrayList<>(found);
        faults.sort(Comparator.comparingInt(Fault::line).thenComparingInt(Fault::column));
        if (found.size() == Limits.FAULTS && count > Limits.FAULTS) {
            faults.add(new Fault(file, 0, 0, "", "more than " + Limits.FAULTS + " faults", "none; the first are shown"));
        }
        return faults;
    }

    /** @throws FaultyFileException with all faults, if there are any */
    void orThrow() {
        if (!found.isEmpty()) {
            throw new FaultyFileException(inOrder());
        }
    }
}
