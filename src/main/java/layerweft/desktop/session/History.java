package layerweft.desktop.session;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Objects;

/** The states that a document went through, for undo and redo. Documents share all that they have in common, so that states cost little. */
final class History {
    private static final int MOST = 1_000;

    /** One step. @param gesture what the edits of one movement of the hand have in common; null for an edit that stands alone */
    private record Step(String what, Document before, Document after, Object gesture) {}

    private final Deque<Step> done = new ArrayDeque<>();
    private final Deque<Step> undone = new ArrayDeque<>();

    /** Notes an edit; one of the same gesture as the last becomes part of that step. */
    void note(String what, Object gesture, Document before, Document after) {
        undone.clear();
        Document from = before;
        if (continues(gesture)) {
            from = done.pop().before();
        }
        if (!from.sameContent(after)) {
            done.push(new Step(what, from, after, gesture));
        }
        if (done.size() > MOST) {
            done.removeLast();
        }
    }

    /** The document before the gesture that is going on; the present one where another, or none, is. */
    Document before(Object gesture, Document present) {
        return continues(gesture) ? done.peek().before() : present;
    }

    private boolean continues(Object gesture) {
        return gesture != null && !done.isEmpty() && Objects.equals(done.peek().gesture(), gesture);
    }

    /** What undo would take back; null where there is nothing. */
    String undoable() {
        return done.isEmpty() ? null : done.peek().what();
    }

    /** What redo would bring back; null where there is nothing. */
    String redoable() {
        return undone.isEmpty() ? null : undone.peek().what();
    }

    Document undo() {
        Step step = done.pop();
        undone.push(step);
        return step.before();
    }

    Document redo() {
        Step step = undone.pop();
        // a gesture ends where it was taken back
        done.push(new Step(step.what(), step.before(), step.after(), null));
        return step.after();
    }

    /** Forgets a gesture that is given up; the document is the one before it. */
    Document giveUp(Object gesture, Document present) {
        return continues(gesture) ? done.pop().before() : present;
    }

    void clear() {
        done.clear();
        undone.clear();
    }
}
