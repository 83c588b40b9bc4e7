package layerweft.file;

import java.util.List;
import java.util.stream.Collectors;

/** Thrown for files that cannot be read as what they should be; carries every fault, not just the first. */
public final class FaultyFileException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    FaultyFileException(List<Fault> faults) {
        super(faults.stream().map(Fault::toString).collect(Collectors.joining("\n")));
        this.faults = List.copyOf(faults);
    }

    /** The faults, at least one, file by file in the order of their places. */
    public List<Fault> faults() {
        return faults;
    }
}
