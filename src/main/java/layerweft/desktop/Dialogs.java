package layerweft.desktop;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** Questions to the user: a service, so that a test can answer them. */
public interface Dialogs {

    /** Files to open; none where the user gives up. */
    List<Path> chooseToOpen(String title);

    /** A file to write; empty where the user gives up. */
    Optional<Path> chooseToSave(String title, String suggestedName);

    /**
     * A question with named answers.
     *
     * @param answers the first is that of the Enter key
     * @return the answer; empty where the user gives up
     */
    Optional<String> ask(String title, String question, List<String> answers);

    /** Something the user must know. */
    void tell(String title, String text);
}
