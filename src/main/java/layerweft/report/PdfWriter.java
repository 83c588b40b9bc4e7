package layerweft.report;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import org.apache.pdfbox.pdfwriter.compress.CompressParameters;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.destination.PDPageFitWidthDestination;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDDocumentOutline;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineItem;

/** An A4 document: its letters embedded, pictures as vectors, header rows repeated where a table goes over a page. */
public final class PdfWriter {
    private static final float TITLE = 20;
    private static final float SECTION = 15;
    private static final float HEADING = 11;
    private static final float BODY = 9.5f;
    private static final float SMALL = 8.5f;

    private final PDDocument document;
    private final PdfPages pages;

    private PdfWriter(PDDocument document) throws IOException {
        this.document = document;
        this.pages = new PdfPages(document);
    }

    /** The document; the same model gives the same bytes. */
    public static byte[] write(ReportModel model) {
        try (PDDocument document = new PDDocument()) {
            document.getDocumentInformation().setTitle(model.title());
            document.getDocumentCatalog().setLanguage("en");
            // the identifier would be made from the time otherwise
            document.setDocumentId(0L);
            new PdfWriter(document).document(model);
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            document.save(out, CompressParameters.NO_COMPRESSION);
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException("writing a PDF document", e);
        }
    }

    private void document(ReportModel model) throws IOException {
        PDDocumentOutline outline = new PDDocumentOutline();
        document.getDocumentCatalog().setDocumentOutline(outline);
        for (int k = 0; k < model.sections().size(); k++) {
            pages.startPage();
            if (k == 0) {
                pages.text(model.title(), Typeface.SEMIBOLD, TITLE, true);
                pages.text(model.subtitle(), Typeface.REGULAR, BODY, false);
                pages.space(12);
            }
            section(model.sections().get(k), outline);
        }
        pages.finish(model.title());
    }

    private void section(ReportModel.Section section, PDDocumentOutline outline) throws IOException {
        PDPageFitWidthDestination place = new PDPageFitWidthDestination();
        place.setPage(pages.page());
        PDOutlineItem item = new PDOutlineItem();
        item.setTitle(section.title());
        item.setDestination(place);
        outline.addLast(item);
        pages.text(section.title(), Typeface.SEMIBOLD, SECTION, true);
        pages.space(6);
        for (Block block : section.blocks()) {
            block(block);
        }
    }

    private void block(Block block) throws IOException {
        if (block instanceof Block.Heading heading) {
            pages.need(60);
            pages.space(6);
            pages.text(heading.text(), Typeface.SEMIBOLD, HEADING, true);
            pages.space(3);
        } else if (block instanceof Block.Paragraph paragraph) {
            pages.text(paragraph.text(), Typeface.REGULAR, BODY, true);
            pages.space(5);
        } else if (block instanceof Block.Note note) {
            pages.text(note.text(), Typeface.REGULAR, SMALL, false);
            pages.space(5);
        } else if (block instanceof Block.Points points) {
            for (String point : points.items()) {
                pages.point(point, BODY);
            }
            pages.space(5);
        } else if (block instanceof Table table) {
            PdfTable.draw(table, pages);
            pages.space(10);
        } else if (block instanceof Picture picture) {
            picture(picture);
        }
    }

    private void picture(Picture picture) throws IOException {
        PdfBoxGraphics2D graphics = new PdfBoxGraphics2D(document, picture.width(), picture.height());
        picture.drawing().accept(graphics);
        graphics.dispose();
        PDFormXObject form = graphics.getXFormObject();
        float scale = Math.min(1, PdfPages.WIDTH / picture.width());
        pages.need(picture.height() * scale + 60);
        pages.text(picture.title(), Typeface.SEMIBOLD, BODY, true);
        pages.space(4);
        pages.form(form, picture.height() * scale, scale);
        pages.space(4);
        pages.text(picture.description(), Typeface.REGULAR, SMALL, false);
        pages.space(8);
    }
}
