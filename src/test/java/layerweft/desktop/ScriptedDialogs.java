package layerweft.desktop;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;

/** Dialogs whose answers are known beforehand, and what they were asked. */
public final class ScriptedDialogs implements Dialogs {
    private final Deque<String> answers = new ArrayDeque<>();
    private final Deque<Path> toSave = new ArrayDeque<>();
    private List<Path> toOpen = List.of();
    private final List<String> said = new ArrayList<>();

    public ScriptedDialogs answer(String... more) {
        answers.addAll(List.of(more));
        return this;
    }

    public ScriptedDialogs save(Path... files) {
        toSave.addAll(List.of(files));
        return this;
    }

    public ScriptedDialogs open(Path... files) {
        toOpen = List.of(files);
        return this;
    }

    /** Questions and news, in order. */
    public List<String> said() {
        return said;
    }

    @Override
    public List<Path> chooseToOpen(String title) {
        return toOpen;
    }

    @Override
    public Optional<Path> chooseToSave(String title, String suggestedName) {
        said.add(title + ": " + suggestedName);
        return Optional.ofNullable(toSave.poll());
    }

    @Override
    public Optional<String> ask(String title, String question, List<String> choices) {
        said.add(title);
        return Optional.ofNullable(answers.poll());
    }

    @Override
    public void tell(String title, String text) {
        said.add(title + ": " + text);
    }
}
