package layerweft.desktop.picture;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.Border;
import javafx.scene.layout.BorderStroke;
import javafx.scene.layout.BorderStrokeStyle;
import javafx.scene.layout.BorderWidths;
import javafx.scene.layout.CornerRadii;
import javafx.scene.layout.Pane;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;

/**
 * Where the keyboard reaches a tower: every layer, and the edges of the selected one. They stay the same nodes while the drawing under them changes, so
 * that focus and a movement of the mouse are not lost.
 */
final class TowerSpots extends Pane {
    private static final double THICK = 8;
    private static final double OFF = 3;

    private final Map<TowerGrip, Region> spots = new HashMap<>();
    private Color ring = Color.BLACK;

    TowerSpots() {
        setPickOnBounds(false);
    }

    Region of(TowerGrip grip) {
        return spots.computeIfAbsent(grip, this::made);
    }

    private Region made(TowerGrip grip) {
        Region spot = new Region();
        spot.setManaged(false);
        spot.setFocusTraversable(true);
        spot.setAccessibleRole(AccessibleRole.BUTTON);
        spot.setUserData(grip);
        spot.focusVisibleProperty().addListener((is, was, now) -> ring(spot));
        getChildren().add(spot);
        return spot;
    }

    private void ring(Region spot) {
        spot.setBorder(!spot.isFocusVisible() ? null
                : new Border(new BorderStroke(ring, BorderStrokeStyle.SOLID, new CornerRadii(3), new BorderWidths(2))));
    }

    /** Puts the spots over the blocks, in the order of the programme. */
    void place(Tower tower, TowerLayout layout, int selected, Color accent) {
        ring = accent;
        Set<TowerGrip> present = new HashSet<>();
        for (int j = 0; j < tower.layers().size(); j++) {
            Tower.Layer layer = tower.layers().get(j);
            TowerLayout.Block block = layout.blockOf(j);
            double width = block.right() - block.left();
            put(new TowerGrip(j, TowerGrip.Part.BODY), present, layer.inWords(), block.left() - OFF, block.top() - OFF, width + 2 * OFF, block.height() + 2 * OFF);
            if (j != selected) {
                continue;
            }
            if (layer.limit() < Double.POSITIVE_INFINITY) {
                put(new TowerGrip(j, TowerGrip.Part.TOP), present, "limit of " + layer.name() + ", " + TowerText.terms(layer.limit(), layer.retention()),
                        block.left() - OFF, block.top() - THICK / 2, width + 2 * OFF, THICK);
            }
            if (Double.isNaN(layer.franchise())) {
                put(new TowerGrip(j, TowerGrip.Part.BOTTOM), present, "retention of " + layer.name() + ", " + TowerText.terms(layer.limit(), layer.retention()),
                        block.left() - OFF, block.bottom() - THICK / 2, width + 2 * OFF, THICK);
            }
            if (layer.reinstates()) {
                put(new TowerGrip(j, TowerGrip.Part.RIGHT), present, "reinstatements of " + layer.name(), block.right() - THICK / 2, block.top() - OFF, THICK,
                        block.height() + 2 * OFF);
            }
        }
        spots.keySet().removeIf(grip -> {
            boolean gone = !present.contains(grip);
            if (gone) {
                getChildren().remove(spots.get(grip));
            }
            return gone;
        });
    }

    private void put(TowerGrip grip, Set<TowerGrip> present, String words, double x, double y, double width, double height) {
        present.add(grip);
        Region spot = of(grip);
        spot.resizeRelocate(x, y, width, height);
        ring(spot);
        if (!words.equals(spot.getAccessibleText())) {
            spot.setAccessibleText(words);
            Tooltip.install(spot, new Tooltip(words));
        }
    }

    Optional<TowerGrip> focused() {
        for (Node spot : getChildren()) {
            if (spot.isFocused()) {
                return Optional.of((TowerGrip) spot.getUserData());
            }
        }
        return Optional.empty();
    }
}
