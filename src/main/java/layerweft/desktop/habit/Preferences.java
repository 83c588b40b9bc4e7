package layerweft.desktop.habit;

import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;

/** What is remembered from one start to the next, in one file of a folder. A file that cannot be read or written is as good as none. */
public final class Preferences {
    private static final int MOST_RECENT = 8;
    private static final String RECENT = "recent.";

    private final Path file;
    private final Properties properties = new Properties();

    /** A portfolio and a programme opened or saved together. */
    public record Recent(Path portfolio, Path programme) {}

    /** @param folder made where it is not there */
    public Preferences(Path folder) {
        file = folder.resolve("window.properties");
        if (Files.isRegularFile(file)) {
            try (Reader reader = Files.newBufferedReader(file)) {
                properties.load(reader);
            } catch (IOException | IllegalArgumentException e) {
                properties.clear();
            }
        }
    }

    /** The folder of this user's preferences and recovery copies: {@code .layerweft} in the home folder. */
    public static Path usualFolder() {
        return Path.of(System.getProperty("user.home"), ".layerweft");
    }

    /** Whether nothing has ever been remembered here. */
    public boolean first() {
        return properties.isEmpty();
    }

    public String get(String name, String fallback) {
        return properties.getProperty(name, fallback);
    }

    /** A number; the fallback also where what is remembered is none. */
    public double number(String name, double fallback) {
        try {
            return Double.parseDouble(properties.getProperty(name, String.valueOf(fallback)));
        } catch (NumberFormatException e) {
            return fallback;
        }
    }

    public void set(String name, Object value) {
        properties.setProperty(name, String.valueOf(value));
    }

    /** The newest first; those whose files are gone are left out. */
    public List<Recent> recent() {
        List<Recent> recent = new ArrayList<>();
        for (int k = 0; properties.containsKey(RECENT + k + ".portfolio"); k++) {
            Path portfolio = Path.of(properties.getProperty(RECENT + k + ".portfolio"));
            Path programme = Path.of(properties.getProperty(RECENT + k + ".programme"));
            if (Files.isRegularFile(portfolio) && Files.isRegularFile(programme)) {
                recent.add(new Recent(portfolio, programme));
            }
        }
        return recent;
    }

    public void opened(Path portfolio, Path programme) {
        List<Recent> recent = new ArrayList<>(recent());
        Recent newest = new Recent(portfolio.toAbsolutePath(), programme.toAbsolutePath());
        recent.remove(newest);
        recent.add(0, newest);
        properties.keySet().removeIf(key -> key.toString().startsWith(RECENT));
        for (int k = 0; k < Math.min(MOST_RECENT, recent.size()); k++) {
            set(RECENT + k + ".portfolio", recent.get(k).portfolio());
            set(RECENT + k + ".programme", recent.get(k).programme());
        }
    }

    /** Writes the file; returns whether that was possible. */
    public boolean save() {
        try {
            Files.createDirectories(file.getParent());
            try (Writer writer = Files.newBufferedWriter(file)) {
                properties.store(writer, "Layerweft's window");
            }
            return true;
        } catch (IOException e) {
            return false;
        }
    }
}
