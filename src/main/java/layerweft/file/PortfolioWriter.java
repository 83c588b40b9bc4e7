package layerweft.file;

import layerweft.model.portfolio.Portfolio;

/**
 * Writes portfolios as files that {@link PortfolioReader} reads back to the same model. Fields that would have the value they have when
 * left out are left out. Where the format has two ways to give a model, the one is taken that gives exactly it in the fewest digits; a cap
 * within a cap becomes the lower one, which is the same law.
 */
public final class PortfolioWriter {
    private PortfolioWriter() {}

    /** As a tree, under the portfolio's name. */
    public static FileTree tree(Portfolio portfolio) {
        return FileTree.of(portfolio.name(), PortfolioMapping.write(portfolio));
    }

    /** As the text of a file. */
    public static String text(Portfolio portfolio) {
        return tree(portfolio).text();
    }
}
