package layerweft.desktop.picture;

import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import java.util.function.DoubleBinaryOperator;
import javafx.animation.PauseTransition;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.paint.Color;
import javafx.scene.shape.Polyline;
import javafx.scene.shape.Rectangle;
import javafx.scene.text.Text;
import javafx.util.Duration;
import layerweft.desktop.theme.Theme;
import layerweft.model.copula.PairDensity;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * One family's shape at the present τ: its density with normal margins as contours of enclosed probability, the corner where both have a year as bad as
 * 1 in 10, λ_U, and a figure. A click takes it, pressing previews it, {@code Esc} gives the press up.
 */
public final class FamilyTile extends Picture {
    /** Contours are computed no more often, however fast τ is dragged. */
    private static final Duration BREATH = Duration.millis(50);
    private static final double[] ENCLOSED = {0.1, 0.25, 0.45, 0.65, 0.8, 0.9, 0.96};
    private static final double CORNER = NormalDistribution.of(0, 1).inverseCumulativeProbability(0.9);
    private static final double MARGIN = 12;

    private final TileActions actions;
    private final PauseTransition breath = new PauseTransition(BREATH);
    private FamilyShape shape;
    private FamilyShape waiting;
    private DensityGrid grid;
    private boolean pressed;

    public FamilyTile(Theme theme, TileActions actions) {
        super(theme);
        this.actions = actions;
        setAccessibleRole(AccessibleRole.TOGGLE_BUTTON);
        setFocusTraversable(true);
        setMinSize(theme.px(104), theme.px(120));
        sheet().setMouseTransparent(true);
        breath.setOnFinished(event -> next());
        focusVisibleProperty().addListener((is, was, now) -> redraw());
        hoverProperty().addListener((is, was, now) -> redraw());
        addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
        addEventHandler(MouseEvent.MOUSE_RELEASED, this::release);
        addEventHandler(KeyEvent.KEY_PRESSED, this::key);
    }

    /** Shows a shape: at once, or with the next breath where the last was just drawn. */
    public void show(FamilyShape newShape) {
        if (newShape.equals(waiting == null ? shape : waiting)) {
            return;
        }
        waiting = newShape;
        if (breath.getStatus() != PauseTransition.Status.RUNNING) {
            next();
        }
    }

    private void next() {
        if (waiting == null) {
            return;
        }
        boolean same = shape != null && Objects.equals(shape.pair(), waiting.pair());
        shape = waiting;
        waiting = null;
        if (!same) {
            Optional<DoubleBinaryOperator> density = shape.pair() == null ? Optional.empty() : PairDensity.of(shape.pair());
            grid = density.map(DensityGrid::new).orElse(null);
            breath.playFromStart();
        }
        setAccessibleText(shape.reason().isEmpty() ? String.format(Locale.ROOT, "%s, upper tail %.2f, %s", shape.name(), shape.upperTail(), shape.figure())
                : shape.name() + ": " + shape.reason());
        setCursor(available() ? Cursor.HAND : Cursor.DEFAULT);
        redraw();
    }

    private boolean available() {
        return shape != null && shape.reason().isEmpty();
    }

    @Override
    void draw() {
        sheet().getChildren().clear();
        if (shape == null) {
            return;
        }
        PictureColours c = colours();
        double width = sheetWidth();
        double height = sheetHeight();
        boolean taken = shape.taken() || pressed;
        Rectangle card = new Rectangle(0.5, 0.5, width - 1, height - 1);
        card.setArcWidth(16);
        card.setArcHeight(16);
        card.setFill(taken ? c.accentGround() : isHover() && available() ? c.sunken() : c.surface());
        card.setStroke(taken ? c.accent() : c.line());
        card.setStrokeWidth(taken ? 2 : 1);
        add(card);
        if (isFocusVisible()) {
            Rectangle ring = new Rectangle(4, 4, width - 8, height - 8);
            ring.setArcWidth(10);
            ring.setArcHeight(10);
            ring.setFill(Color.TRANSPARENT);
            ring.setStroke(c.accent());
            ring.setStrokeWidth(2);
            add(ring);
        }
        Text name = within(text(shape.name(), 13.5, true, available() ? c.ink() : c.ink2()), width - 2 * MARGIN);
        add(at(name, MARGIN, 22, Anchor.LEFT));
        double side = Math.min(width - 2 * MARGIN, height - 34 - 34);
        double left = (width - side) / 2;
        double top = 32 + (height - 34 - 34 - side) / 2;
        add(box(left, top, side, side, taken ? c.surface() : c.sunken(), null));
        if (grid != null) {
            contours(left, top, side, c);
        } else if (shape.pair() != null) {
            add(line(left, top + side, left + side, top, c.family(shape.family()), 2));
        }
        double corner = side * (CORNER + DensityGrid.REACH) / (2 * DensityGrid.REACH);
        Polyline lines = new Polyline(left + corner, top, left + corner, top + side - corner, left + side, top + side - corner);
        lines.setStroke(c.tau());
        lines.setStrokeWidth(1.2);
        lines.getStrokeDashArray().setAll(3.0, 2.0);
        add(lines);
        foot(width, height, c);
    }

    private void contours(double left, double top, double side, PictureColours c) {
        Canvas canvas = new Canvas(side, side);
        canvas.relocate(left, top);
        GraphicsContext g = canvas.getGraphicsContext2D();
        Color colour = c.family(shape.family());
        double[] heights = grid.heights(ENCLOSED);
        for (int k = 0; k < heights.length; k++) {
            double inner = 1 - k / (double) (heights.length - 1);
            g.setStroke(Color.color(colour.getRed(), colour.getGreen(), colour.getBlue(), 0.55 + 0.45 * inner));
            g.setLineWidth(0.9 + 1.3 * inner * inner);
            g.beginPath();
            Contours.trace(grid, heights[k], (x1, y1, x2, y2) -> {
                g.moveTo(DensityGrid.place(x1) * side, side - DensityGrid.place(y1) * side);
                g.lineTo(DensityGrid.place(x2) * side, side - DensityGrid.place(y2) * side);
            });
            g.stroke();
        }
        add(canvas);
    }

    private void foot(double width, double height, PictureColours c) {
        double baseline = height - 13;
        if (!available()) {
            add(at(within(text(shape.reason(), 12, false, c.ink2()), width - 2 * MARGIN), MARGIN, baseline, Anchor.LEFT));
            return;
        }
        String tail = shape.upperTail() < 0.005 ? "λU 0" : String.format(Locale.ROOT, "λU %.2f", shape.upperTail());
        Text left = at(text(tail, 12, false, c.ink2()), MARGIN, baseline, Anchor.LEFT);
        Text right = at(text(shape.figure(), 13.5, shape.current(), shape.current() ? c.ink() : c.ink2()), width - MARGIN, baseline, Anchor.RIGHT);
        add(left);
        if (widthOf(left) + widthOf(right) + 8 <= width - 2 * MARGIN) {
            add(right);
        } else {
            add(at(text(shape.figure(), 12, shape.current(), shape.current() ? c.ink() : c.ink2()), width - MARGIN + 4, baseline, Anchor.RIGHT));
        }
    }

    /** Definition and formula, and all that the tile has no room for. */
    public void hover(String words) {
        Tooltip.install(this, new Tooltip(words));
    }

    private void press(MouseEvent event) {
        if (event.getButton() == MouseButton.PRIMARY && available()) {
            requestFocus();
            pressed = true;
            redraw();
            actions.preview(shape.family());
            event.consume();
        }
    }

    private void release(MouseEvent event) {
        if (pressed) {
            pressed = false;
            redraw();
            if (contains(event.getX(), event.getY())) {
                actions.take(shape.family());
            } else {
                actions.giveUp(shape.family());
            }
            event.consume();
        }
    }

    private void key(KeyEvent event) {
        if (event.getCode() == KeyCode.ESCAPE && pressed) {
            pressed = false;
            redraw();
            actions.giveUp(shape.family());
            event.consume();
        } else if ((event.getCode() == KeyCode.ENTER || event.getCode() == KeyCode.SPACE) && available()) {
            actions.take(shape.family());
            event.consume();
        }
    }
}
