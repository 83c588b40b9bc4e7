package layerweft.file;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.function.BiFunction;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Programme;

/**
 * One of the two file formats, and how far a file could be read as such.
 *
 * @param tag the value of the field {@code format}
 * @param mapping from the file's object to the model, null where there are faults
 * @param standIn what can be checked between the objects of a faulty file, null where not even that
 */
record Format<T>(String tag, BiFunction<Node.Members, Faults, T> mapping, BiFunction<Node.Members, Faults, T> standIn) {
    static final Format<Portfolio> PORTFOLIO = new Format<>(PortfolioMapping.FORMAT, PortfolioMapping::read, StandIns::portfolio);
    static final Format<Programme> PROGRAMME = new Format<>(ProgrammeMapping.FORMAT, ProgrammeMapping::read, StandIns::programme);

    /**
     * A file as far as it could be read.
     *
     * @param value what it says; where it has faults, a stand-in with the same names, or null
     * @param root its object, null if it is not JSON
     */
    record Outcome<T>(T value, Node.Members root, Faults faults) {

        /** @throws FaultyFileException with all faults of the file, if it has any */
        T orThrow() {
            faults.orThrow();
            return value;
        }
    }

    T read(Path path) {
        return attempt(path).orThrow();
    }

    T read(String fileName, byte[] bytes) {
        return read(fileName, SourceText.decode(fileName, bytes)).orThrow();
    }

    T read(String fileName, InputStream in) throws IOException {
        return read(fileName, SourceText.read(fileName, in)).orThrow();
    }

    private Outcome<T> read(String fileName, String text) {
        Faults faults = new Faults(fileName);
        return read(TreeParser.parse(text, faults), faults);
    }

    Outcome<T> attempt(Path path) {
        Faults faults = new Faults(path.toString());
        return read(parse(path, faults), faults);
    }

    /** The object that a file is; null if it cannot be read or is none, with the fault added. */
    static Node.Members parse(Path path, Faults faults) {
        try {
            return TreeParser.parse(SourceText.read(path), faults);
        } catch (FaultyFileException e) {
            faults.add(e);
            return null;
        }
    }

    /** @param root null if the file is not JSON, with the fault added */
    Outcome<T> read(Node.Members root, Faults faults) {
        if (root == null) {
            return new Outcome<>(null, null, faults);
        }
        // of another format every field would be a fault: say the one thing that matters
        if (root.get("format") instanceof Node.Text format && !format.text().equals(tag)) {
            faults.wrongType(format, "format", Excerpt.quoted(tag));
            return new Outcome<>(null, root, faults);
        }
        T value = mapping.apply(root, faults);
        return new Outcome<>(value == null ? standIn.apply(root, faults) : value, root, faults);
    }
}
