package layerweft.model;

import java.util.List;
import java.util.stream.Collectors;

/** Thrown by the constructors of the model for values that are not admissible; carries every finding, not just the first. */
public final class InadmissibleException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    private final transient List<Finding> findings;

    public InadmissibleException(List<Finding> findings) {
        super(findings.stream().map(Finding::toString).collect(Collectors.joining("\n")));
        this.findings = List.copyOf(findings);
    }

    /** The findings, at least one, in the order of the checks. */
    public List<Finding> findings() {
        return findings;
    }
}
