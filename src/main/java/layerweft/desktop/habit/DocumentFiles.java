package layerweft.desktop.habit;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import layerweft.desktop.Dialogs;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.Session;
import layerweft.file.FaultyFileException;
import layerweft.file.FileTree;
import layerweft.file.SafeFile;
import layerweft.file.UnsavedException;
import layerweft.file.TreatyCheck;

/** Opening and saving: portfolio and programme are two files, opened together or one at a time. */
public final class DocumentFiles {
    private static final String SAVE = "Save";
    private static final String LEAVE = "Don't save";
    private static final String CANCEL = "Cancel";

    private final Session session;
    private final Dialogs dialogs;
    private final Preferences preferences;

    public DocumentFiles(Session session, Dialogs dialogs, Preferences preferences) {
        this.session = session;
        this.dialogs = dialogs;
        this.preferences = preferences;
    }

    /** Asks for files and opens them. */
    public void open() {
        if (mayLeave()) {
            openNow(dialogs.chooseToOpen("Open a portfolio, a programme, or both"));
        }
    }

    /** Opens files that were dropped or chosen before: a portfolio, a programme, or both. */
    public void open(List<Path> files) {
        if (mayLeave()) {
            openNow(files);
        }
    }

    public void openDemo() {
        if (mayLeave()) {
            session.open(Document.demo());
        }
    }

    private void openNow(List<Path> files) {
        Document next = session.document().get();
        boolean portfolio = false;
        boolean programme = false;
        for (Path file : files) {
            FileTree tree;
            try {
                tree = FileTree.read(file);
            } catch (FaultyFileException e) {
                dialogs.tell("This file cannot be opened", e.faults().get(0).toString());
                return;
            }
            String format = String.valueOf(tree.get("format"));
            if (format.startsWith("layerweft/portfolio/")) {
                next = new Document(tree, next.programme(), file, next.programmeFile());
                portfolio = true;
            } else if (format.startsWith("layerweft/programme/")) {
                next = new Document(next.portfolio(), tree, next.portfolioFile(), file);
                programme = true;
            } else {
                dialogs.tell("This file cannot be opened", file.getFileName()
                        + " has the format " + format + "; a portfolio has layerweft/portfolio/1, a programme layerweft/programme/1.");
                return;
            }
        }
        if (portfolio && !programme && TreatyCheck.of(next.portfolio(), next.programme()).treaty() == null) {
            next = new Document(next.portfolio(), newProgramme(), next.portfolioFile(), null);
        }
        if (portfolio || programme) {
            session.open(next);
            remember();
        }
    }

    /** A programme without layers, for a portfolio that the present programme does not fit. */
    private static FileTree newProgramme() {
        return FileTree.of("new", Map.of("format", "layerweft/programme/1")).set("name", "New programme").set("layers", List.of());
    }

    private void remember() {
        Document now = session.document().get();
        if (now.portfolioFile() != null && now.programmeFile() != null) {
            preferences.opened(now.portfolioFile(), now.programmeFile());
            preferences.save();
        }
    }

    /** Saves where the document came from, or asks where; returns whether it is saved. */
    public boolean save() {
        Document now = session.document().get();
        return save(Optional.ofNullable(now.portfolioFile()).or(() -> askFor("portfolio", now.portfolio())),
                () -> Optional.ofNullable(now.programmeFile()).or(() -> askFor("programme", now.programme())));
    }

    /** Asks where to save; returns whether it is saved. */
    public boolean saveAs() {
        Document now = session.document().get();
        return save(askFor("portfolio", now.portfolio()), () -> askFor("programme", now.programme()));
    }

    private Optional<Path> askFor(String what, FileTree tree) {
        String name = tree.get("name") instanceof String text ? text : what;
        String plain = name.toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]+", "-").replaceAll("^-|-$", "");
        return dialogs.chooseToSave("Save the " + what, (plain.isEmpty() ? what : plain) + ".json");
    }

    private boolean save(Optional<Path> portfolio, Supplier<Optional<Path>> askForProgramme) {
        Optional<Path> programme = portfolio.isEmpty() ? Optional.empty() : askForProgramme.get();
        if (programme.isEmpty()) {
            return false;
        }
        Document now = session.document().get();
        try {
            SafeFile.write(portfolio.get(), now.portfolio().text());
            SafeFile.write(programme.get(), now.programme().text());
        } catch (UnsavedException e) {
            dialogs.tell("The file was not saved", e.getMessage());
            return false;
        }
        session.savedAs(portfolio.get(), programme.get());
        remember();
        return true;
    }

    /** Whether the document may be left: it is saved, or the user is asked and does not give up. */
    public boolean mayLeave() {
        if (!session.unsaved().get()) {
            return true;
        }
        Optional<String> answer = dialogs.ask("Save changes?", session.document().get().name() + " has changes that are not saved.",
                List.of(SAVE, LEAVE, CANCEL));
        return answer.isPresent() && (answer.get().equals(LEAVE) || answer.get().equals(SAVE) && save());
    }
}
