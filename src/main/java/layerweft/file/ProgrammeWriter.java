package layerweft.file;

import layerweft.model.treaty.Programme;

/**
 * Writes programmes as files that {@link ProgrammeReader} reads back to the same model. Fields that would have the value they have when left out
 * are left out.
 */
public final class ProgrammeWriter {
    private ProgrammeWriter() {}

    /** As a tree, under the programme's name. */
    public static FileTree tree(Programme programme) {
        return FileTree.of(programme.name(), ProgrammeMapping.write(programme));
    }

    /** As the text of a file. */
    public static String text(Programme programme) {
        return tree(programme).text();
    }
}
