package layerweft.command;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;
import picocli.CommandLine;

/** The program's version, as the build wrote it down. */
final class Version implements CommandLine.IVersionProvider {

    static String current() {
        try (InputStream in = Version.class.getResourceAsStream("/layerweft/version.properties")) {
            Properties properties = new Properties();
            properties.load(in);
            return properties.getProperty("version");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public String[] getVersion() {
        return new String[] {"Layerweft " + current()};
    }
}
