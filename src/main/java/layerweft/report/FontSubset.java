package layerweft.report;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TTFSubsetter;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;

/** The fonts with no more letters than a document has: a tenth of the whole. */
record FontSubset(byte[] regular, byte[] semibold) {
    /** Letters of the template and of numbers, whatever the document says. */
    private static final String ALWAYS = " 0123456789.,:;()%±−–—…•/<>=·";

    /** What a browser needs of a font; features for careful typesetting (the larger part) are left out. */
    private static final List<String> TABLES =
            List.of("head", "hhea", "maxp", "cmap", "glyf", "loca", "hmtx", "name", "post", "OS/2", "cvt ", "prep", "fpgm", "gasp");

    static FontSubset of(ReportModel model) {
        Set<Integer> letters = new TreeSet<>();
        add(letters, ALWAYS);
        add(letters, model.title());
        add(letters, model.subtitle());
        for (ReportModel.Section section : model.sections()) {
            add(letters, section.title());
            section.blocks().forEach(block -> add(letters, block));
        }
        return new FontSubset(subset(Typeface.REGULAR, letters), subset(Typeface.SEMIBOLD, letters));
    }

    private static void add(Set<Integer> letters, Block block) {
        if (block instanceof Block.Heading heading) {
            add(letters, heading.text());
        } else if (block instanceof Block.Paragraph paragraph) {
            add(letters, paragraph.text());
        } else if (block instanceof Block.Note note) {
            add(letters, note.text());
        } else if (block instanceof Block.Points points) {
            points.items().forEach(item -> add(letters, item));
        } else if (block instanceof Picture picture) {
            add(letters, picture.title() + picture.description());
        } else if (block instanceof Table table) {
            add(letters, table.title());
            table.header().forEach(title -> add(letters, title));
            table.rows().forEach(row -> row.forEach(cell -> add(letters, cell.text() + cell.error())));
        }
    }

    private static void add(Set<Integer> letters, String text) {
        text.codePoints().forEach(letters::add);
    }

    private static byte[] subset(Typeface typeface, Set<Integer> letters) {
        try (TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(typeface.open()))) {
            TTFSubsetter subsetter = new TTFSubsetter(font, TABLES);
            subsetter.addAll(letters);
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            subsetter.writeToStream(out);
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException("reading the font " + typeface, e);
        }
    }
}
