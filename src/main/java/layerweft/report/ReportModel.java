package layerweft.report;

import java.util.List;

/**
 * The content of a document, free of any form.
 *
 * @param subtitle one line below the title
 * @param sections in reading order; each starts on a page of its own where there are pages
 */
public record ReportModel(String title, String subtitle, List<Section> sections) {

    public ReportModel {
        title = Letters.admissible(title);
        subtitle = Letters.admissible(subtitle);
        sections = List.copyOf(sections);
    }

    /** A chapter of the document. */
    public record Section(String title, List<Block> blocks) {

        public Section {
            title = Letters.admissible(title);
            blocks = List.copyOf(blocks);
        }
    }
}
