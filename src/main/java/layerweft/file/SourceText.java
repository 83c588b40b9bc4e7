package layerweft.file;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;

/** The text of a file: UTF-8 without a byte order mark, within {@link Limits#FILE_BYTES}. */
final class SourceText {
    private static final String UTF_8 = "text in UTF-8";

    private SourceText() {}

    /** @throws FaultyFileException if there is no such file, it cannot be read, is too large or is not UTF-8 */
    static String read(Path path) {
        String name = path.toString();
        try {
            if (Files.isDirectory(path)) {
                throw wholeFile(name, "a folder", "a file");
            }
            if (Files.size(path) > Limits.FILE_BYTES) {
                throw tooLarge(name);
            }
            try (InputStream in = Files.newInputStream(path)) {
                return read(name, in);
            }
        } catch (NoSuchFileException e) {
            throw wholeFile(name, "no such file", "a file that is there");
        } catch (AccessDeniedException e) {
            throw wholeFile(name, "a file that may not be read", "a file with permission to read");
        } catch (IOException e) {
            throw wholeFile(name, "a file that cannot be read (" + e.getMessage() + ")", "a file that can be read");
        }
    }

    /** @throws IOException from the stream */
    static String read(String name, InputStream in) throws IOException {
        return decode(name, in.readNBytes(Limits.FILE_BYTES + 1));
    }

    static String decode(String name, byte[] bytes) {
        if (bytes.length > Limits.FILE_BYTES) {
            throw tooLarge(name);
        }
        requireNoOtherEncoding(name, bytes);
        int mark = startsWith(bytes, 0xEF, 0xBB, 0xBF) ? 3 : 0;
        ByteBuffer in = ByteBuffer.wrap(bytes, mark, bytes.length - mark);
        CharBuffer out = CharBuffer.allocate(bytes.length - mark);
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT).onUnmappableCharacter(CodingErrorAction.REPORT);
        CoderResult result = decoder.decode(in, out, true);
        out.flip();
        if (result.isError()) {
            Place place = endOf(out);
            throw new FaultyFileException(List.of(new Fault(name, place.line(), place.column(), "",
                    String.format("the byte 0x%02X, which is not UTF-8 here", in.get(in.position()) & 0xFF), UTF_8)));
        }
        return out.toString();
    }

    private static void requireNoOtherEncoding(String name, byte[] bytes) {
        boolean marked = startsWith(bytes, 0xFE, 0xFF) || startsWith(bytes, 0xFF, 0xFE);
        boolean wide = bytes.length >= 2 && (bytes[0] == 0 || bytes[1] == 0); // an object starts with {, which is one byte in UTF-8
        if (marked || wide) {
            throw new FaultyFileException(List.of(new Fault(name, 1, 1, "", "text in UTF-16 or UTF-32", UTF_8)));
        }
    }

    private static boolean startsWith(byte[] bytes, int... start) {
        for (int i = 0; i < start.length; i++) {
            if (i >= bytes.length || (bytes[i] & 0xFF) != start[i]) {
                return false;
            }
        }
        return true;
    }

    /** The place just behind the text; lines end with LF, CR or CR LF. */
    private static Place endOf(CharSequence text) {
        int line = 1;
        int column = 1;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            boolean ends = c == '\n' || c == '\r' && (i + 1 == text.length() || text.charAt(i + 1) != '\n');
            line += ends ? 1 : 0;
            column = ends ? 1 : column + 1;
        }
        return new Place(line, column);
    }

    private static FaultyFileException tooLarge(String name) {
        return wholeFile(name, "a file of more than 64 MB", "a file of at most 64 MB");
    }

    private static FaultyFileException wholeFile(String name, String found, String admissible) {
        return new FaultyFileException(List.of(new Fault(name, 0, 0, "", found, admissible)));
    }
}
