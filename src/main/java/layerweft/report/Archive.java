package layerweft.report;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.Collections;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import java.util.zip.ZipOutputStream;

/** A workbook is an archive of files. The same document is to give the same bytes, so no clock is left in it. */
final class Archive {
    private static final LocalDateTime NO_TIME = LocalDateTime.of(1980, 1, 1, 0, 0);
    private static final String CORE = "docProps/core.xml";

    private Archive() {}

    /**
     * The same entries in the same order, with one fixed time, and without the time of creation in the properties.
     *
     * @param workbook read by its directory, so from a file: its entries do not say their sizes at their heads
     */
    static byte[] withoutTimes(byte[] workbook) throws IOException {
        Path file = Files.createTempFile("layerweft", ".xlsx");
        try {
            Files.write(file, workbook);
            return copy(file);
        } finally {
            Files.deleteIfExists(file);
        }
    }

    private static byte[] copy(Path workbook) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (ZipFile from = new ZipFile(workbook.toFile()); ZipOutputStream to = new ZipOutputStream(out)) {
            for (ZipEntry entry : Collections.list(from.entries())) {
                ZipEntry copy = new ZipEntry(entry.getName());
                copy.setTimeLocal(NO_TIME);
                to.putNextEntry(copy);
                byte[] content = from.getInputStream(entry).readAllBytes();
                to.write(entry.getName().equals(CORE) ? withoutCreation(content) : content);
                to.closeEntry();
            }
        }
        return out.toByteArray();
    }

    private static byte[] withoutCreation(byte[] properties) {
        return new String(properties, StandardCharsets.UTF_8).replaceAll("(?s)<dcterms:created[^>]*>.*?</dcterms:created>", "")
                .getBytes(StandardCharsets.UTF_8);
    }
}
