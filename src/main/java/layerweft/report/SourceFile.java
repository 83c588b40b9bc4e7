package layerweft.report;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import layerweft.file.FileTree;

/**
 * A file that a document is made from.
 *
 * @param name without its folder, which is nobody's business but the writer's
 * @param sha256 of its bytes, in hexadecimal
 * @param tree what it says
 */
public record SourceFile(String name, String sha256, FileTree tree) {

    /** @throws layerweft.file.FaultyFileException if it cannot be read */
    public static SourceFile read(Path path) {
        FileTree tree = FileTree.read(path);
        try {
            return new SourceFile(path.getFileName().toString(), sha256(Files.readAllBytes(path)), tree);
        } catch (IOException e) {
            throw new UncheckedIOException("reading " + path, e);
        }
    }

    /** A file that is held in memory. */
    public static SourceFile of(String name, byte[] bytes) {
        return new SourceFile(name, sha256(bytes), FileTree.parse(name, new String(bytes, StandardCharsets.UTF_8)));
    }

    private static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }
}
