package layerweft.file;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import layerweft.model.treaty.Programme;

/**
 * Reads programme files, {@code layerweft/programme/1}, as strictly as {@link PortfolioReader}. Limits: 64 MB, nesting of 64, 1,000 layers,
 * lists of 1,000 reinstatements, names or return periods, names of 1,000 characters. Whether the perils named are in a portfolio is the
 * matter of {@link TreatyReader}.
 */
public final class ProgrammeReader {
    private ProgrammeReader() {}

    /** @throws FaultyFileException with every fault of the file */
    public static Programme read(Path path) {
        return Format.PROGRAMME.read(path);
    }

    /**
     * @param fileName what to call the file in faults
     * @throws FaultyFileException with every fault of the file
     */
    public static Programme read(String fileName, byte[] bytes) {
        return Format.PROGRAMME.read(fileName, bytes);
    }

    /**
     * @param fileName what to call the file in faults
     * @param in read to its end, not closed
     * @throws FaultyFileException with every fault of the file
     * @throws IOException from the stream
     */
    public static Programme read(String fileName, InputStream in) throws IOException {
        return Format.PROGRAMME.read(fileName, in);
    }
}
