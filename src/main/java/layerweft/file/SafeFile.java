package layerweft.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFilePermission;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Locale;
import java.util.Set;
import layerweft.file.UnsavedException.Reason;

/**
 * Saves files so that at any moment, also if the power goes, the file holds either all of the old text or all of the new one: a temporary
 * file in the same folder is written, forced to the disk and renamed. The previous version is kept beside it as {@code name.bak}; links are
 * followed, permissions kept.
 */
public final class SafeFile {
    /** The stamp of a file that is not there. */
    public static final String ABSENT = "absent";

    private static final String BACKUP = ".bak";

    private SafeFile() {}

    /**
     * What tells one content of a file from another: by its bytes, not its time.
     *
     * @return {@link #ABSENT} where there is no file
     * @throws UnsavedException if there is one and it cannot be read
     */
    public static String stamp(Path file) {
        try {
            return stamp(Files.readAllBytes(file));
        } catch (NoSuchFileException e) {
            return ABSENT;
        } catch (IOException e) {
            throw unsaved(file, e);
        }
    }

    /** The stamp that a file with this text has. */
    public static String stamp(String text) {
        return stamp(text.getBytes(StandardCharsets.UTF_8));
    }

    private static String stamp(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    /**
     * Saves the text, whatever the file holds now.
     *
     * @return the stamp of what is now there
     * @throws UnsavedException if it cannot; the file is then as it was
     */
    public static String write(Path file, String text) {
        return write(file, text, null);
    }

    /**
     * Saves the text if nobody else has changed the file.
     *
     * @param lastSeen the stamp of the file when it was last read or saved; null to save in any case
     * @return the stamp of what is now there
     * @throws UnsavedException if it cannot, or the file has another stamp; the file is then as it was
     */
    public static String write(Path file, String text, String lastSeen) {
        try {
            Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
            requirePlace(target);
            if (lastSeen != null && !lastSeen.equals(stamp(target))) {
                throw new UnsavedException(Reason.CHANGED_MEANWHILE, file, named(file)
                        + (Files.exists(target) ? " has been changed by somebody else since it was opened." : " is no longer there."), null);
            }
            byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
            replace(target, bytes);
            return stamp(bytes);
        } catch (IOException e) {
            throw unsaved(file, e);
        }
    }

    private static void requirePlace(Path file) {
        if (Files.isDirectory(file)) {
            throw new UnsavedException(Reason.IS_A_FOLDER, file, named(file) + " is a folder; a file needs another name.", null);
        }
        if (!Files.isDirectory(file.getParent())) {
            throw new UnsavedException(Reason.NO_FOLDER, file, "The folder " + file.getParent() + " is not there.", null);
        }
        if (Files.exists(file) && !Files.isWritable(file)) {
            throw readOnly(file, null);
        }
    }

    private static void replace(Path file, byte[] bytes) throws IOException {
        Path folder = file.getParent();
        Path fresh = Files.createTempFile(folder, "." + file.getFileName() + ".", ".tmp");
        Path backup = null;
        try {
            force(fresh, bytes);
            if (Files.exists(file)) {
                copyPermissions(file, fresh);
                backup = Files.createTempFile(folder, "." + file.getFileName() + ".", ".tmp");
                force(backup, Files.readAllBytes(file));
                copyPermissions(file, backup);
                rename(backup, file.resolveSibling(file.getFileName() + BACKUP));
            } else {
                usualPermissions(fresh);
            }
            rename(fresh, file);
            forceFolder(folder);
        } finally {
            Files.deleteIfExists(fresh);
            if (backup != null) {
                Files.deleteIfExists(backup);
            }
        }
    }

    private static void force(Path file, byte[] bytes) throws IOException {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE, StandardOpenOption.TRUNCATE_EXISTING)) {
            ByteBuffer buffer = ByteBuffer.wrap(bytes);
            while (buffer.hasRemaining()) {
                channel.write(buffer);
            }
            channel.force(true);
        }
    }

    /** Names in a folder are on the disk when the folder is; some systems do not open folders and need not be asked. */
    private static void forceFolder(Path folder) throws IOException {
        if (folder.getFileSystem().supportedFileAttributeViews().contains("posix")) {
            try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
                channel.force(true);
            }
        }
    }

    private static void rename(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static void copyPermissions(Path from, Path to) throws IOException {
        PosixFileAttributeView view = Files.getFileAttributeView(from, PosixFileAttributeView.class);
        if (view != null) {
            Files.setPosixFilePermissions(to, view.readAttributes().permissions());
        }
    }

    /** Temporary files are for their owner alone; a new file may be read by whoever may look into its folder. */
    private static void usualPermissions(Path file) throws IOException {
        PosixFileAttributeView folder = Files.getFileAttributeView(file.getParent(), PosixFileAttributeView.class);
        if (folder != null) {
            Set<PosixFilePermission> permissions = folder.readAttributes().permissions();
            permissions.retainAll(Set.of(PosixFilePermission.OWNER_READ, PosixFilePermission.OWNER_WRITE, PosixFilePermission.GROUP_READ,
                    PosixFilePermission.OTHERS_READ));
            permissions.addAll(Set.of(PosixFilePermission.OWNER_READ, PosixFilePermission.OWNER_WRITE));
            Files.setPosixFilePermissions(file, permissions);
        }
    }

    private static UnsavedException readOnly(Path file, IOException cause) {
        return new UnsavedException(Reason.READ_ONLY, file, named(file) + " may not be written; save it under another name or elsewhere.", cause);
    }

    /** The file system's words for a full disk differ, but no type of exception tells it. */
    static UnsavedException unsaved(Path file, IOException e) {
        String said = e.getMessage() == null ? "" : e.getMessage();
        String lower = said.toLowerCase(Locale.ROOT);
        if (lower.contains("no space") || lower.contains("not enough space") || lower.contains("quota")) {
            return new UnsavedException(Reason.DISK_FULL, file, "There is no room left on the disk for " + named(file) + ".", e);
        }
        if (e instanceof AccessDeniedException || lower.contains("read-only")) {
            return readOnly(file, e);
        }
        return new UnsavedException(Reason.OTHER, file, named(file) + " could not be saved: " + said, e);
    }

    private static String named(Path file) {
        return String.valueOf(file.getFileName());
    }
}
