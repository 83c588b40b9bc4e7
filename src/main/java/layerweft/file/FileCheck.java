package layerweft.file;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import layerweft.file.Format.Outcome;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Programme;

/** Checks any number of files, each of which says by its field {@code format} what it is. */
public final class FileCheck {
    private FileCheck() {}

    /**
     * Checks every file, and every programme against every portfolio among them.
     *
     * @param valid receives a line for each file without a fault, in the order of the files
     * @return all faults, file by file
     */
    public static List<Fault> of(List<Path> files, Consumer<String> valid) {
        List<Outcome<?>> outcomes = new ArrayList<>();
        List<Outcome<Portfolio>> portfolios = new ArrayList<>();
        List<Outcome<Programme>> programmes = new ArrayList<>();
        for (Path file : files) {
            Faults faults = new Faults(file.toString());
            Node.Members root = Format.parse(file, faults);
            Node format = root == null ? null : root.get("format");
            if (isText(format, PortfolioMapping.FORMAT)) {
                portfolios.add(Format.PORTFOLIO.read(root, faults));
                outcomes.add(portfolios.get(portfolios.size() - 1));
            } else if (isText(format, ProgrammeMapping.FORMAT)) {
                programmes.add(Format.PROGRAMME.read(root, faults));
                outcomes.add(programmes.get(programmes.size() - 1));
            } else {
                if (root != null) {
                    faults.add(format == null ? root.place() : format.place(), "format", format == null ? "nothing" : format.shown(),
                            Excerpt.quoted(PortfolioMapping.FORMAT) + " or " + Excerpt.quoted(ProgrammeMapping.FORMAT));
                }
                outcomes.add(new Outcome<>(null, root, faults));
            }
        }
        portfolios.forEach(portfolio -> programmes.forEach(programme -> TreatyReader.join(portfolio, programme)));
        List<Fault> found = new ArrayList<>();
        for (Outcome<?> outcome : outcomes) {
            List<Fault> faults = outcome.faults().inOrder();
            if (faults.isEmpty()) {
                valid.accept(outcome.faults().file() + ": " + describe(outcome.value()));
            }
            found.addAll(faults);
        }
        return found;
    }

    private static boolean isText(Node node, String expected) {
        return node instanceof Node.Text text && text.text().equals(expected);
    }

    private static String describe(Object value) {
        if (value instanceof Portfolio portfolio) {
            int n = portfolio.perils().size();
            return "a valid portfolio, " + Excerpt.quoted(portfolio.name()) + ", of " + n + (n == 1 ? " peril" : " perils");
        }
        Programme programme = (Programme) value;
        int n = programme.layers().size();
        return "a valid programme, " + Excerpt.quoted(programme.name()) + ", of " + n + (n == 1 ? " layer" : " layers");
    }
}
