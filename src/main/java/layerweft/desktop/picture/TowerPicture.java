package layerweft.desktop.picture;

import java.util.List;
import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.scene.Cursor;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Pane;
import layerweft.desktop.picture.TowerActions.Phase;
import layerweft.desktop.theme.Theme;

/**
 * A programme as a tower: height is what one event costs, width is how many full limits the year can use, colour is the chance-weighted use of each.
 * Edges and bodies can be dragged, in steps of 1, 2 or 5 unless {@code Alt} is down, with adjoining layers if {@code Shift} is; {@code Esc} gives up.
 */
public final class TowerPicture extends Picture {
    private final TowerActions actions;
    private final BooleanProperty logarithmic = new SimpleBooleanProperty();
    private final Pane paint = new Pane();
    private final Pane tags = new Pane();
    private final TowerSpots spots = new TowerSpots();

    private Tower tower = new Tower(List.of(), List.of(), List.of());
    private int selected = -1;
    private List<Integer> lit = List.of();
    private TowerLayout layout;
    private TowerHand hand;
    private List<TowerChange> moved = List.of();
    private Integer reinstated;
    private TowerChange drawing;

    public TowerPicture(Theme theme, TowerActions actions) {
        super(theme);
        this.actions = actions;
        paint.setMouseTransparent(true);
        tags.setMouseTransparent(true);
        sheet().getChildren().addAll(paint, spots, tags);
        setMinSize(theme.px(520), theme.px(300));
        logarithmic.addListener((is, was, now) -> redraw());
        addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
        addEventHandler(MouseEvent.MOUSE_DRAGGED, this::drag);
        addEventHandler(MouseEvent.MOUSE_RELEASED, this::release);
        addEventHandler(MouseEvent.MOUSE_MOVED, this::hover);
        addEventHandler(MouseEvent.MOUSE_EXITED, event -> light(List.of()));
        addEventHandler(KeyEvent.KEY_PRESSED, this::key);
    }

    /** Shows a tower. @param selectedLayer its position, −1 for none */
    public void show(Tower newTower, int selectedLayer) {
        tower = newTower;
        selected = selectedLayer;
        if (hand == null || hand.before().layers().size() != tower.layers().size()) {
            drop();
        }
        redraw();
    }

    /** Whether the scale is logarithmic, from half the lowest retention. */
    public BooleanProperty logarithmic() {
        return logarithmic;
    }

    /** The tower as drawn, with what the hand holds. */
    private Tower drawn() {
        Tower now = tower.with(moved);
        return reinstated == null ? now : now.withReinstatements(hand.grip().layer(), reinstated);
    }

    private void drop() {
        hand = null;
        moved = List.of();
        reinstated = null;
        drawing = null;
    }

    @Override
    void draw() {
        Tower now = drawn();
        double width = sheetWidth();
        double height = sheetHeight();
        layout = hand == null ? TowerLayout.of(now, logarithmic.get(), width, height) : TowerLayout.of(now, hand.scale(), width, height);
        paint.getChildren().clear();
        TowerSheet s = new TowerSheet(now, layout, colours(), selected, lit, paint.getChildren());
        TowerAxis.paint(s);
        TowerAxis.threads(s);
        setFocusTraversable(now.layers().isEmpty());
        if (now.layers().isEmpty()) {
            TowerEmpty.paint(s, drawing);
        } else {
            TowerBlocks.paint(s);
            TowerColumn.paint(s);
            TowerLabels.paint(s);
        }
        spots.place(now, layout, selected, colours().accent());
        setAccessibleText(now.layers().isEmpty() ? "Empty programme. Drag upward to draw the first layer." : "Programme of " + now.layers().size() + " layers");
    }

    private void press(MouseEvent event) {
        if (event.getButton() != MouseButton.PRIMARY || layout == null) {
            return;
        }
        double x = onSheet(event.getX());
        double y = onSheet(event.getY());
        if (tower.layers().isEmpty()) {
            requestFocus();
            hand = new TowerHand(tower, layout.scale(), null, layout.scale().amount(y), x, layout.pitch());
            return;
        }
        Optional<TowerGrip> grip = TowerHit.at(drawn(), layout, selected, x, y);
        if (grip.isPresent()) {
            hand = new TowerHand(drawn(), layout.scale(), grip.get(), layout.scale().amount(y), x, layout.pitch());
            choose(grip.get().layer());
            spots.of(grip.get()).requestFocus();
            event.consume();
        }
    }

    private void choose(int layer) {
        if (selected != layer) {
            selected = layer;
            redraw();
            actions.select(layer);
        }
    }

    private void drag(MouseEvent event) {
        if (hand == null) {
            return;
        }
        double x = onSheet(event.getX());
        double y = onSheet(event.getY());
        String tag;
        if (hand.grip() == null) {
            drawing = hand.drawn(y, event.isAltDown());
            tag = TowerText.terms(drawing.limit(), drawing.retention());
        } else if (hand.grip().part() == TowerGrip.Part.RIGHT) {
            int number = hand.reinstatements(x);
            if (reinstated != null || number != hand.before().layers().get(hand.grip().layer()).reinstatements()) {
                reinstated = number;
                actions.reinstatements(hand.grip().layer(), number, Phase.MOVING);
            }
            tag = number == 1 ? "1 reinstatement" : number + " reinstatements";
        } else {
            List<TowerChange> changes = hand.terms(y, event.isAltDown(), event.isShiftDown());
            if (!changes.equals(moved)) {
                // layers that no longer move along go back to where they were
                moved = changes.size() < moved.size() ? merged(hand.back(moved), changes) : changes;
                actions.terms(moved, Phase.MOVING);
            }
            Tower.Layer now = tower.with(moved).layers().get(hand.grip().layer());
            tag = TowerText.terms(now.limit(), now.retention());
        }
        TowerTag.show(tags, tag, x, y, sheetWidth(), colours());
        redraw();
        event.consume();
    }

    private static List<TowerChange> merged(List<TowerChange> back, List<TowerChange> changes) {
        return back.stream().map(b -> changes.stream().filter(c -> c.layer() == b.layer()).findFirst().orElse(b)).toList();
    }

    private void release(MouseEvent event) {
        if (hand == null) {
            return;
        }
        TowerHand held = hand;
        List<TowerChange> changes = moved;
        Integer number = reinstated;
        TowerChange first = drawing;
        hand = null;
        reinstated = null;
        drawing = null;
        tags.getChildren().clear();
        redraw();
        if (first != null && first.limit() > 0) {
            actions.drawn(first.retention(), first.limit());
        } else if (number != null) {
            actions.reinstatements(held.grip().layer(), number, Phase.DONE);
        } else if (!changes.isEmpty()) {
            actions.terms(changes, Phase.DONE);
        }
        event.consume();
    }

    private void giveUp() {
        TowerHand held = hand;
        List<TowerChange> changes = moved;
        Integer number = reinstated;
        drop();
        tags.getChildren().clear();
        redraw();
        if (number != null) {
            actions.reinstatements(held.grip().layer(), held.before().layers().get(held.grip().layer()).reinstatements(), Phase.GIVEN_UP);
        } else if (!changes.isEmpty()) {
            actions.terms(held.back(changes), Phase.GIVEN_UP);
        }
    }

    private void hover(MouseEvent event) {
        if (layout == null) {
            return;
        }
        double x = onSheet(event.getX());
        double y = onSheet(event.getY());
        if (tower.layers().isEmpty()) {
            setCursor(Cursor.CROSSHAIR);
            return;
        }
        Optional<TowerGrip> grip = TowerHit.at(drawn(), layout, selected, x, y);
        setCursor(grip.map(g -> switch (g.part()) {
            case TOP, BOTTOM -> Cursor.V_RESIZE;
            case RIGHT -> Cursor.H_RESIZE;
            case BODY -> Cursor.OPEN_HAND;
        }).orElse(Cursor.DEFAULT));
        light(grip.map(g -> tower.layers().get(g.layer()).recoveredBefore()).orElse(List.of()));
    }

    private void light(List<Integer> sources) {
        if (!lit.equals(sources)) {
            lit = sources;
            redraw();
        }
    }

    private void key(KeyEvent event) {
        if (event.getCode() == KeyCode.ESCAPE && hand != null) {
            giveUp();
            event.consume();
            return;
        }
        Optional<TowerGrip> grip = spots.focused();
        if (grip.isEmpty() || hand != null) {
            return;
        }
        KeyCode code = event.getCode();
        TowerGrip.Part part = grip.get().part();
        boolean vertical = (code == KeyCode.UP || code == KeyCode.DOWN) && part != TowerGrip.Part.RIGHT;
        boolean sideways = (code == KeyCode.LEFT || code == KeyCode.RIGHT) && part == TowerGrip.Part.RIGHT;
        if (code == KeyCode.ENTER || code == KeyCode.SPACE) {
            choose(grip.get().layer());
        } else if (vertical) {
            step(grip.get(), code == KeyCode.UP ? 1 : -1, event.isAltDown(), event.isShiftDown());
        } else if (sideways) {
            TowerHand keys = new TowerHand(drawn(), layout.scale(), grip.get(), 0, 0, 1);
            actions.reinstatements(grip.get().layer(), keys.reinstatements(code == KeyCode.RIGHT ? 1 : -1), Phase.DONE);
        } else {
            return;
        }
        event.consume();
    }

    /** One step of the scale, a tenth of it with {@code Alt}. */
    private void step(TowerGrip grip, int direction, boolean fine, boolean together) {
        Tower now = drawn();
        Tower.Layer layer = now.layers().get(grip.layer());
        double edge = grip.part() == TowerGrip.Part.TOP ? layer.top() : layer.retention();
        double by = layout.scale().step(edge) / (fine ? 10 : 1);
        List<TowerChange> changes = grip.moved(now, edge, edge + direction * by, layout.scale(), fine, together);
        if (!changes.isEmpty()) {
            moved = changes;
            redraw();
            actions.terms(changes, Phase.DONE);
        }
    }
}
