package layerweft.desktop.session;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Objects;
import java.util.function.UnaryOperator;
import layerweft.file.DemoFiles;
import layerweft.file.FileTree;

/**
 * A portfolio and a programme as they are being edited. The trees are the truth, the model is read from them: every field can be edited,
 * faults come with the path of their field, and a saved file prices to what is on screen.
 *
 * @param portfolioFile where the portfolio was read from or last saved; null where it never was
 * @param programmeFile the same of the programme
 */
public record Document(FileTree portfolio, FileTree programme, Path portfolioFile, Path programmeFile) {

    public Document {
        Objects.requireNonNull(portfolio, "portfolio");
        Objects.requireNonNull(programme, "programme");
    }

    /** The demo that is shown first, not yet a file of the user's. */
    public static Document demo() {
        return new Document(demo(DemoFiles.PORTFOLIO), demo(DemoFiles.PROGRAMME), null, null);
    }

    /** A demo file by its name, e.g. {@link DemoFiles#PORTFOLIO}. */
    public static FileTree demo(String name) {
        return FileTree.parse(name, new String(DemoFiles.bytes(name), StandardCharsets.UTF_8));
    }

    public Document withPortfolio(UnaryOperator<FileTree> edit) {
        return new Document(edit.apply(portfolio), programme, portfolioFile, programmeFile);
    }

    public Document withProgramme(UnaryOperator<FileTree> edit) {
        return new Document(portfolio, edit.apply(programme), portfolioFile, programmeFile);
    }

    public Document withFiles(Path ofPortfolio, Path ofProgramme) {
        return new Document(portfolio, programme, ofPortfolio, ofProgramme);
    }

    /** Whether both trees hold the same, wherever they are kept. */
    public boolean sameContent(Document other) {
        return portfolio.equals(other.portfolio) && programme.equals(other.programme);
    }

    /** The portfolio's name as written in it; empty where it has none. */
    public String name() {
        return text(portfolio, "name");
    }

    /** E.g. {@code EUR million}. */
    public String currencyAndUnit() {
        return (text(portfolio, "currency") + " " + text(portfolio, "unit")).strip();
    }

    /** The portfolio's unit, e.g. {@code million}. */
    public String unit() {
        return text(portfolio, "unit");
    }

    private static String text(FileTree tree, String path) {
        return tree.get(path) instanceof String text ? text : "";
    }
}
