package layerweft.desktop.habit;

import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import java.util.stream.Stream;
import layerweft.desktop.session.Document;
import layerweft.file.FaultyFileException;
import layerweft.file.FileTree;
import layerweft.file.SafeFile;

/**
 * Copies of unsaved documents, for the next start after a crash. Each running program has a folder of its own, named after its process;
 * folders of processes that run no longer hold what was lost.
 */
public final class Recovery {
    private static final String PORTFOLIO = "portfolio.json";
    private static final String PROGRAMME = "programme.json";
    private static final String WHERE = "where.properties";

    private final Path folder;
    private final Path mine;

    /** @param folder of preferences and recovery copies */
    public Recovery(Path folder) {
        this.folder = folder.resolve("recovery");
        this.mine = this.folder.resolve(String.valueOf(ProcessHandle.current().pid()));
    }

    /**
     * A document found.
     *
     * @param at when its copy was written
     */
    public record Found(Document document, LocalDateTime at, Path folder) {}

    /**
     * Writes a copy in place of the last one.
     *
     * @throws UncheckedIOException if that is not possible
     */
    public void keep(Document document) {
        try {
            Files.createDirectories(mine);
            Properties where = new Properties();
            if (document.portfolioFile() != null) {
                where.setProperty("portfolio", document.portfolioFile().toString());
            }
            if (document.programmeFile() != null) {
                where.setProperty("programme", document.programmeFile().toString());
            }
            try (Writer writer = Files.newBufferedWriter(mine.resolve(WHERE))) {
                where.store(writer, null);
            }
            SafeFile.write(mine.resolve(PORTFOLIO), document.portfolio().text());
            SafeFile.write(mine.resolve(PROGRAMME), document.programme().text());
        } catch (IOException e) {
            throw new UncheckedIOException("keeping a recovery copy in " + mine, e);
        }
    }

    /** Removes this program's copy: the document is saved, or its changes are given up. */
    public void forget() {
        forget(mine);
    }

    public void forget(Found found) {
        forget(found.folder());
    }

    private static void forget(Path copy) {
        if (!Files.isDirectory(copy)) {
            return;
        }
        try (Stream<Path> files = Files.list(copy)) {
            for (Path file : files.toList()) {
                Files.delete(file);
            }
            Files.delete(copy);
        } catch (IOException e) {
            throw new UncheckedIOException("removing the recovery copy " + copy, e);
        }
    }

    /** What programs that run no longer have left behind, newest first. */
    public List<Found> lost() {
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        List<Found> found = new ArrayList<>();
        try (Stream<Path> copies = Files.list(folder)) {
            for (Path copy : copies.filter(Recovery::abandoned).toList()) {
                found.add(read(copy));
            }
        } catch (IOException e) {
            throw new UncheckedIOException("looking for recovery copies in " + folder, e);
        }
        found.removeIf(one -> one == null);
        found.sort((a, b) -> b.at().compareTo(a.at()));
        return found;
    }

    private static boolean abandoned(Path copy) {
        String name = copy.getFileName().toString();
        return Files.isDirectory(copy) && name.matches("\\d{1,18}")
                && ProcessHandle.of(Long.parseLong(name)).filter(ProcessHandle::isAlive).isEmpty();
    }

    /** Null where a copy was cut short. */
    private static Found read(Path copy) throws IOException {
        Properties where = new Properties();
        if (!Files.isRegularFile(copy.resolve(PORTFOLIO)) || !Files.isRegularFile(copy.resolve(PROGRAMME))) {
            return null;
        }
        if (Files.isRegularFile(copy.resolve(WHERE))) {
            try (Reader reader = Files.newBufferedReader(copy.resolve(WHERE))) {
                where.load(reader);
            }
        }
        FileTime at = Files.getLastModifiedTime(copy.resolve(PROGRAMME));
        try {
            Document document = new Document(FileTree.read(copy.resolve(PORTFOLIO)), FileTree.read(copy.resolve(PROGRAMME)),
                    path(where, "portfolio"), path(where, "programme"));
            return new Found(document, LocalDateTime.ofInstant(at.toInstant(), ZoneId.systemDefault()), copy);
        } catch (FaultyFileException e) {
            return null;
        }
    }

    private static Path path(Properties where, String name) {
        return where.getProperty(name) == null ? null : Path.of(where.getProperty(name));
    }
}
