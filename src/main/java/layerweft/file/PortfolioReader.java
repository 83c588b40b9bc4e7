package layerweft.file;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import layerweft.model.portfolio.Portfolio;

/**
 * Reads portfolio files, {@code layerweft/portfolio/1}. Strict: an unknown, missing or twice-given field, a wrong type or a value out of
 * range is a fault, and nothing is guessed. Limits: 64 MB, nesting of 64, 256 perils, 256 sub-perils of each, laws of at most 1,000,000
 * losses or probabilities, names of 1,000 characters.
 */
public final class PortfolioReader {
    private PortfolioReader() {}

    /** @throws FaultyFileException with every fault of the file */
    public static Portfolio read(Path path) {
        return Format.PORTFOLIO.read(path);
    }

    /**
     * @param fileName what to call the file in faults
     * @throws FaultyFileException with every fault of the file
     */
    public static Portfolio read(String fileName, byte[] bytes) {
        return Format.PORTFOLIO.read(fileName, bytes);
    }

    /**
     * @param fileName what to call the file in faults
     * @param in read to its end, not closed
     * @throws FaultyFileException with every fault of the file
     * @throws IOException from the stream
     */
    public static Portfolio read(String fileName, InputStream in) throws IOException {
        return Format.PORTFOLIO.read(fileName, in);
    }
}
