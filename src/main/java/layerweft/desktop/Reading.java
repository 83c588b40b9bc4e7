package layerweft.desktop;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/** A room's live sentence: what it has to say at present, its figures set apart. Made by adding runs to {@link #EMPTY}. */
public record Reading(List<Run> runs) {

    public static final Reading EMPTY = new Reading(List.of());

    /**
     * A piece of the sentence.
     *
     * @param strong whether it is a figure, set semi-bold
     * @param go leads to where the figure is made; null where it is made in the room itself
     */
    public record Run(String text, boolean strong, Runnable go) {}

    public Reading {
        runs = List.copyOf(runs);
    }

    /** A sentence that begins with words. */
    public static Reading of(String text) {
        return EMPTY.plain(text);
    }

    /** With more words. */
    public Reading plain(String text) {
        return plus(new Run(text, false, null));
    }

    /** With a figure. */
    public Reading strong(String text) {
        return strong(text, null);
    }

    /** With a figure that leads somewhere. */
    public Reading strong(String text, Runnable go) {
        return plus(new Run(text, true, go));
    }

    private Reading plus(Run run) {
        List<Run> more = new ArrayList<>(runs);
        more.add(run);
        return new Reading(more);
    }

    /** The sentence as plain text, for copying and for screen readers. */
    public String text() {
        return runs.stream().map(Run::text).collect(Collectors.joining());
    }
}
