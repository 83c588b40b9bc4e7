package layerweft.model.copula;

import java.util.List;
import java.util.stream.IntStream;

/**
 * A group of a nested Archimedean copula: perils that hang on it directly, and stronger groups inside it.
 *
 * @param theta strength θ between its members
 * @param members indices of the perils that hang on this group itself, from 0
 * @param groups the groups inside
 */
public record Group(double theta, List<Integer> members, List<Group> groups) {

    public Group {
        members = List.copyOf(members);
        groups = List.copyOf(groups);
    }

    /** @throws layerweft.model.InadmissibleException if no pair of the family has this τ */
    public static Group ofKendallTau(ArchimedeanFamily family, double tau, List<Integer> members, List<Group> groups) {
        TauRange.of(family, 2).check(tau);
        return new Group(family.thetaOf(tau), members, groups);
    }

    /** The indices of all perils in the group and in the groups inside. */
    IntStream perils() {
        return IntStream.concat(members.stream().mapToInt(Integer::intValue), groups.stream().flatMapToInt(Group::perils));
    }

    boolean holds(int peril) {
        return perils().anyMatch(i -> i == peril);
    }
}
