package layerweft.desktop.strip;

import java.util.function.DoubleConsumer;
import javafx.css.PseudoClass;
import javafx.scene.Cursor;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;
import javafx.scene.shape.Circle;
import javafx.scene.shape.Line;
import javafx.scene.shape.Polyline;
import javafx.scene.text.Text;
import layerweft.desktop.session.StripCell;
import layerweft.desktop.theme.Theme;

/**
 * A layer's lift φ(τ)/φ(0) − 1 over τ from 0 to 1, on an axis that all cells share, so that a flat line is a layer that dependence does not
 * move. Dragging sideways turns τ.
 */
final class LiftPicture extends Region {
    private static final PseudoClass STILL = PseudoClass.getPseudoClass("still");
    private static final double MARGIN = 5;
    private static final double AXIS_ROOM = 15;

    private final Theme theme;
    private final boolean axis;
    private final Line independent = new Line();
    private final Line now = new Line();
    private final Polyline curve = new Polyline();
    private final Circle pinned = new Circle();
    private final Circle mark = new Circle();
    private final Text zero = new Text("0");
    private final Text one = new Text("τ 1");

    private StripCell cell;
    private double lowest;
    private double highest = 1;
    private double tau;

    /** @param axis whether the ends of the τ axis are named */
    LiftPicture(Theme theme, boolean axis) {
        this.theme = theme;
        this.axis = axis;
        getStyleClass().add("lw-lift");
        setManaged(false);
        independent.getStyleClass().add("lw-lift-independent");
        now.getStyleClass().add("lw-lift-now");
        curve.getStyleClass().add("lw-lift-curve");
        pinned.getStyleClass().add("lw-lift-pinned");
        mark.getStyleClass().add("lw-lift-mark");
        zero.getStyleClass().add("lw-mark-text");
        one.getStyleClass().add("lw-mark-text");
        zero.setVisible(axis);
        one.setVisible(axis);
        getChildren().addAll(independent, now, curve, pinned, mark, zero, one);
        setCursor(Cursor.H_RESIZE);
        setPickOnBounds(true);
    }

    /** @param turn receives τ as it is dragged; @param end called when the hand lets go */
    void onDrag(DoubleConsumer turn, Runnable end) {
        addEventHandler(MouseEvent.MOUSE_DRAGGED, event -> {
            turn.accept((event.getX() - left()) / (right() - left()));
            event.consume();
        });
        addEventHandler(MouseEvent.MOUSE_RELEASED, event -> end.run());
    }

    /** @param lowest and @param highest of the axis that all cells share, with 0 between them */
    void show(StripCell newCell, double newTau, double newLowest, double newHighest) {
        cell = newCell;
        tau = newTau;
        lowest = newLowest;
        highest = newHighest;
        pseudoClassStateChanged(STILL, cell.unmoved().isPresent());
        requestLayout();
        layoutChildren();
    }

    private double left() {
        return theme.px(MARGIN);
    }

    private double right() {
        return getWidth() - theme.px(MARGIN);
    }

    private double x(double at) {
        return left() + at * (right() - left());
    }

    private double y(double lift) {
        double top = theme.px(MARGIN);
        double bottom = getHeight() - theme.px(axis ? AXIS_ROOM : 0) - theme.px(MARGIN);
        return bottom - (lift - lowest) / (highest - lowest) * (bottom - top);
    }

    @Override
    protected void layoutChildren() {
        if (cell == null || getWidth() <= 0) {
            return;
        }
        double zeroY = y(0);
        horizontal(independent, left(), right(), zeroY);
        curve.getPoints().clear();
        boolean still = cell.unmoved().isPresent();
        if (still) {
            curve.getPoints().addAll(left(), zeroY, right(), zeroY);
        }
        for (int k = 0; k < cell.curve().size() && !still; k++) {
            if (Double.isFinite(cell.curve().get(k))) {
                curve.getPoints().addAll(x(cell.taus().get(k)), y(cell.curve().get(k)));
            }
        }
        curve.setVisible(curve.getPoints().size() > 2);
        boolean within = tau >= 0;
        now.setVisible(within);
        vertical(now, x(Math.max(0, tau)), 0, getHeight() - theme.px(axis ? AXIS_ROOM : 0));
        place(mark, still ? 0 : cell.lift(), tau, 4.2);
        place(pinned, still ? Double.NaN : cell.pinnedLift(), cell.pinnedTau(), 3);
        double baseline = getHeight() - theme.px(2);
        zero.setX(left());
        zero.setY(baseline);
        one.setX(right() - one.getLayoutBounds().getWidth());
        one.setY(baseline);
    }

    private void place(Circle circle, double lift, double at, double radius) {
        circle.setVisible(Double.isFinite(lift) && at >= 0);
        if (circle.isVisible()) {
            circle.setCenterX(x(at));
            circle.setCenterY(y(Math.max(lowest, Math.min(highest, lift))));
            circle.setRadius(theme.px(radius));
        }
    }

    private static void horizontal(Line line, double fromX, double toX, double y) {
        line.setStartX(fromX);
        line.setEndX(toX);
        line.setStartY(y);
        line.setEndY(y);
    }

    private static void vertical(Line line, double x, double fromY, double toY) {
        line.setStartX(x);
        line.setEndX(x);
        line.setStartY(fromY);
        line.setEndY(toY);
    }
}
