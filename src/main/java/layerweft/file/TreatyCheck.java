package layerweft.file;

import java.util.List;
import layerweft.file.Format.Outcome;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/**
 * What a portfolio and a programme that are being edited come to: the treaty, or every fault that stands in its way.
 *
 * @param treaty null where there are faults
 * @param portfolioFaults by the path of the field; as an edited tree has no lines yet, their line and column are 0
 * @param programmeFaults the same of the programme, with what it names and the portfolio does not have
 */
public record TreatyCheck(Treaty treaty, List<Fault> portfolioFaults, List<Fault> programmeFaults) {
    public TreatyCheck {
        portfolioFaults = List.copyOf(portfolioFaults);
        programmeFaults = List.copyOf(programmeFaults);
    }

    /** Checks two trees, each by itself and the programme against the portfolio. */
    public static TreatyCheck of(FileTree portfolio, FileTree programme) {
        Outcome<Portfolio> first = Format.PORTFOLIO.read(portfolio.root(), new Faults(portfolio.fileName()));
        Outcome<Programme> second = Format.PROGRAMME.read(programme.root(), new Faults(programme.fileName()));
        Treaty treaty = TreatyReader.join(first, second);
        List<Fault> portfolioFaults = first.faults().inOrder();
        List<Fault> programmeFaults = second.faults().inOrder();
        return new TreatyCheck(portfolioFaults.isEmpty() && programmeFaults.isEmpty() ? treaty : null, portfolioFaults, programmeFaults);
    }

    /** Whether there is a treaty. */
    public boolean valid() {
        return treaty != null;
    }
}
