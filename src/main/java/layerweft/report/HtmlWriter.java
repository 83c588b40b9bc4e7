package layerweft.report;

import com.samskivert.mustache.Mustache;
import com.samskivert.mustache.Template;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;

/** One HTML file that needs nothing beside it: no script, pictures as SVG inside, its letters with it. It is well-formed XML too. */
public final class HtmlWriter {

    private HtmlWriter() {}

    /** The document in UTF-8; the same model gives the same bytes. */
    public static byte[] write(ReportModel model) {
        try (Reader in = new InputStreamReader(HtmlWriter.class.getResourceAsStream("/layerweft/report/report.html"), StandardCharsets.UTF_8)) {
            Template template = Mustache.compiler().escapeHTML(true).compile(in);
            Map<String, Object> context = new LinkedHashMap<>();
            context.put("title", model.title());
            context.put("subtitle", model.subtitle());
            context.put("sections", IntStream.rangeClosed(1, model.sections().size()).mapToObj(k -> section(model.sections().get(k - 1), "s" + k)).toList());
            FontSubset letters = FontSubset.of(model);
            context.put("regular", Base64.getEncoder().encodeToString(letters.regular()));
            context.put("semibold", Base64.getEncoder().encodeToString(letters.semibold()));
            return template.execute(context).getBytes(StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException("reading the template of documents", e);
        }
    }

    private static Map<String, Object> section(ReportModel.Section section, String id) {
        List<Map<String, Object>> blocks = IntStream.range(0, section.blocks().size()).mapToObj(k -> block(section.blocks().get(k), id + "b" + k)).toList();
        return Map.of("title", section.title(), "id", id, "blocks", blocks);
    }

    /** One member says what kind of block it is; the template has a part for each. */
    private static Map<String, Object> block(Block block, String id) {
        Map<String, Object> context = new LinkedHashMap<>();
        for (String kind : List.of("heading", "paragraph", "note", "points", "table", "picture")) {
            context.put(kind, false);
        }
        if (block instanceof Block.Heading heading) {
            context.put("heading", Map.of("text", heading.text()));
        } else if (block instanceof Block.Paragraph paragraph) {
            context.put("paragraph", Map.of("text", paragraph.text()));
        } else if (block instanceof Block.Note note) {
            context.put("note", Map.of("text", note.text()));
        } else if (block instanceof Block.Points points) {
            context.put("points", Map.of("items", points.items()));
        } else if (block instanceof Table table) {
            context.put("table", table(table));
        } else if (block instanceof Picture picture) {
            context.put("picture", Map.of("title", picture.title(), "description", picture.description(), "svg", Svg.of(picture, id)));
        }
        return context;
    }

    private static Map<String, Object> table(Table table) {
        List<String> sides = IntStream.range(0, table.header().size()).mapToObj(k -> table.words(k) ? "words" : "number").toList();
        List<Map<String, String>> header = IntStream.range(0, table.header().size())
                .mapToObj(k -> Map.of("side", sides.get(k), "text", table.header().get(k))).toList();
        List<Map<String, Object>> rows = table.rows().stream().map(row -> Map.<String, Object>of("name", row.get(0).text(), "cells",
                IntStream.range(1, row.size()).mapToObj(k -> cell(row.get(k), sides.get(k))).toList())).toList();
        return Map.of("title", table.title(), "titled", !table.title().isEmpty(), "header", header, "rows", rows);
    }

    private static Map<String, Object> cell(Cell cell, String side) {
        return Map.of("side", side, "text", cell.text(), "error", cell.error(), "uncertain", !cell.error().isEmpty());
    }
}
