package layerweft.report;

import java.util.List;

/** A piece of a section. */
public sealed interface Block permits Block.Heading, Block.Paragraph, Block.Note, Block.Points, Table, Picture {

    /** Title of the blocks that follow. */
    record Heading(String text) implements Block {
        public Heading {
            text = Letters.admissible(text);
        }
    }

    /** Running text. */
    record Paragraph(String text) implements Block {
        public Paragraph {
            text = Letters.admissible(text);
        }
    }

    /** Small print: what a figure means, how it was made. */
    record Note(String text) implements Block {
        public Note {
            text = Letters.admissible(text);
        }
    }

    /** A list of sentences. */
    record Points(List<String> items) implements Block {
        public Points {
            items = items.stream().map(Letters::admissible).toList();
        }
    }
}
