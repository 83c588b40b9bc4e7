package layerweft.file;

import java.util.List;
import layerweft.file.Format.Outcome;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/**
 * What a portfolio and a programme that are being edited say together.
 *
 * @param treaty null where either has a fault
 * @param portfolioFaults with the paths of the fields at fault
 * @param programmeFaults the programme's own, and those against the portfolio
 */
public record TreatyCheck(Treaty treaty, List<Fault> portfolioFaults, List<Fault> programmeFaults) {

    public TreatyCheck {
        portfolioFaults = List.copyOf(portfolioFaults);
        programmeFaults = List.copyOf(programmeFaults);
    }

    public static TreatyCheck of(FileTree portfolio, FileTree programme) {
        Outcome<Portfolio> book = Format.PORTFOLIO.read(portfolio.root(), new Faults("portfolio"));
        Outcome<Programme> cover = Format.PROGRAMME.read(programme.root(), new Faults("programme"));
        Treaty treaty = TreatyReader.join(book, cover);
        List<Fault> bookFaults = book.faults().inOrder();
        List<Fault> coverFaults = cover.faults().inOrder();
        return new TreatyCheck(bookFaults.isEmpty() && coverFaults.isEmpty() ? treaty : null, bookFaults, coverFaults);
    }
}
