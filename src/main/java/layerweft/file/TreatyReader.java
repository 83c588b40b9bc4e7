package layerweft.file;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import layerweft.file.Format.Outcome;
import layerweft.model.InadmissibleException;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/** Reads a portfolio and a programme that belong together. */
public final class TreatyReader {
    private TreatyReader() {}

    /** @throws FaultyFileException with every fault of both files, and of the programme against the portfolio */
    public static Treaty read(Path portfolio, Path programme) {
        return treaty(Format.PORTFOLIO.attempt(portfolio), Format.PROGRAMME.attempt(programme));
    }

    static Treaty treaty(Outcome<Portfolio> portfolio, Outcome<Programme> programme) {
        Treaty treaty = join(portfolio, programme);
        List<Fault> faults = new ArrayList<>(portfolio.faults().inOrder());
        faults.addAll(programme.faults().inOrder());
        if (!faults.isEmpty()) {
            throw new FaultyFileException(faults);
        }
        return treaty;
    }

    /** The treaty; null where the programme names what the portfolio does not have, with the faults added to the programme's. */
    static Treaty join(Outcome<Portfolio> portfolio, Outcome<Programme> programme) {
        if (portfolio.value() == null || programme.value() == null) {
            return null;
        }
        try {
            return new Treaty(portfolio.value(), programme.value());
        } catch (InadmissibleException e) {
            programme.faults().add(programme.root(), "", e);
            return null;
        }
    }
}
