package layerweft.model.treaty;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.Check;
import layerweft.model.InadmissibleException;
import layerweft.model.portfolio.Portfolio;

/** A programme placed on a portfolio: valid together, with every layer's cover resolved. This is what the engines price. */
public final class Treaty {
    private final Portfolio portfolio;
    private final Programme programme;
    private final List<Cover> covers;

    /** @throws InadmissibleException naming the layers' perils that the portfolio does not have */
    public Treaty(Portfolio portfolio, Programme programme) {
        Check check = new Check();
        List<Cover> resolved = new ArrayList<>();
        for (int j = 0; j < programme.layers().size(); j++) {
            try {
                resolved.add(Cover.of(programme.layers().get(j), portfolio, "layers[" + j + "]"));
            } catch (InadmissibleException e) {
                check.within("", e);
            }
        }
        check.orThrow();
        this.portfolio = portfolio;
        this.programme = programme;
        this.covers = List.copyOf(resolved);
    }

    public Portfolio portfolio() {
        return portfolio;
    }

    public Programme programme() {
        return programme;
    }

    public Layer layer(int j) {
        return programme.layers().get(j);
    }

    /** What layer j covers. */
    public Cover cover(int j) {
        return covers.get(j);
    }

    public int layers() {
        return covers.size();
    }

    /** The same programme on another portfolio with the same perils. */
    public Treaty on(Portfolio other) {
        return new Treaty(other, programme);
    }
}
