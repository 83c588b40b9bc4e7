package layerweft.desktop;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;

/** What the program is, and what a price from it leaves out. */
final class AboutText {

    private AboutText() {}

    static String text() {
        return "Version " + version() + "\n\n"
                + "Prices reinsurance layers over dependent perils.\n\n"
                + "Prices support a judgement by qualified people; they do not replace it. They leave out what the model leaves out: error of "
                + "parameters and of the model itself, perils that are not in the file, contract wording, and credit risk. Local regulation and "
                + "professional standards apply.\n\n"
                + "The demo portfolios are invented. Licence: Apache 2.0. Type: Source Sans 3, SIL Open Font License 1.1.";
    }

    private static String version() {
        try (InputStream in = AboutText.class.getResourceAsStream("/layerweft/version.properties")) {
            Properties properties = new Properties();
            properties.load(in);
            return properties.getProperty("version");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
