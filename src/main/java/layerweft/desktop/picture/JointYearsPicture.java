package layerweft.desktop.picture;

import java.util.List;
import java.util.Locale;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Pane;
import javafx.scene.paint.Color;
import javafx.scene.shape.Line;
import javafx.scene.shape.Rectangle;
import javafx.scene.text.Text;
import javafx.scene.transform.Rotate;
import layerweft.desktop.theme.Theme;

/**
 * Years of two perils as points, on axes of return periods or of ranks, with the corner of joint bad years. The corner is dragged from 1 in 5 to 1 in 100
 * years, in round steps unless {@code Alt} is down.
 */
public final class JointYearsPicture extends Picture {
    private static final List<Integer> STEPS = List.of(5, 6, 7, 8, 10, 12, 15, 20, 25, 30, 40, 50, 60, 80, 100);
    private static final double LEFT = 50;
    private static final double BELOW = 40;
    private static final double ABOVE = 8;
    private static final double POINT = 1.5;
    private static final double BAD_POINT = 3.4;
    private static final double NEAR = 8;
    /** Fewer points are drawn darker. */
    private static final double FULL_INK = 2500;

    private final DoubleProperty corner = new SimpleDoubleProperty(10);
    private final BooleanProperty ranks = new SimpleBooleanProperty();
    private final Pane corners = new Pane();
    private JointYears years = new JointYears("", "", new double[0], new double[0]);
    private boolean held;
    /** From the corner to where the hand took hold, along the diagonal. */
    private double grabbed;

    public JointYearsPicture(Theme theme) {
        super(theme);
        setMinSize(theme.px(220), theme.px(200));
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.SLIDER);
        sheet().setMouseTransparent(true);
        corner.addListener((is, was, now) -> drawCorner());
        ranks.addListener((is, was, now) -> redraw());
        focusVisibleProperty().addListener((is, was, now) -> redraw());
        addEventHandler(MouseEvent.MOUSE_MOVED, event -> setCursor(near(event) ? Cursor.NE_RESIZE : Cursor.DEFAULT));
        addEventHandler(MouseEvent.MOUSE_PRESSED, event -> {
            held = near(event);
            grabbed = middle(event) - scale().placeOfYears(corner.get());
        });
        addEventHandler(MouseEvent.MOUSE_DRAGGED, this::drag);
        addEventHandler(MouseEvent.MOUSE_RELEASED, event -> held = false);
        addEventHandler(KeyEvent.KEY_PRESSED, this::key);
    }

    public void show(JointYears newYears) {
        years = newYears;
        redraw();
    }

    /** Return period from which a year is bad, from 5 to 100. */
    public DoubleProperty corner() {
        return corner;
    }

    /** Whether the axes are ranks rather than return periods. */
    public BooleanProperty ranks() {
        return ranks;
    }

    private YearScale scale() {
        return ranks.get() ? YearScale.RANK : YearScale.RETURN_PERIOD;
    }

    private double side() {
        return Math.max(10, Math.min(sheetWidth() - LEFT - 4, sheetHeight() - ABOVE - BELOW));
    }

    @Override
    void draw() {
        PictureColours c = colours();
        double side = side();
        sheet().getChildren().clear();
        add(box(LEFT, ABOVE, side, side, c.sunken(), null));
        for (int tick : scale().ticks()) {
            double at = side * scale().placeOfYears(tick);
            add(line(LEFT + at, ABOVE, LEFT + at, ABOVE + side, c.grid(), 1), line(LEFT, ABOVE + side - at, LEFT + side, ABOVE + side - at, c.grid(), 1));
            add(at(text(String.valueOf(tick), 12, false, c.ink2()), LEFT + at, ABOVE + side + 16, Anchor.MIDDLE));
            add(at(text(String.valueOf(tick), 12, false, c.ink2()), LEFT - 7, ABOVE + side - at + 4, Anchor.RIGHT));
        }
        Text across = within(text(years.first().toLowerCase(Locale.ROOT) + " year, 1 in …", 12, false, c.ink2()), side);
        add(at(across, LEFT + side / 2, ABOVE + side + 34, Anchor.MIDDLE));
        Text up = within(text(years.second().toLowerCase(Locale.ROOT) + " year, 1 in …", 12, false, c.ink2()), side);
        at(up, 12, ABOVE + side / 2, Anchor.MIDDLE);
        up.getTransforms().add(new Rotate(-90, 12, ABOVE + side / 2));
        add(up);
        Canvas points = new Canvas(side, side);
        points.relocate(LEFT, ABOVE);
        GraphicsContext g = points.getGraphicsContext2D();
        double strength = Math.max(0.22, Math.min(0.6, 0.6 * FULL_INK / Math.max(1, years.u().length)));
        g.setFill(Color.color(c.ink2().getRed(), c.ink2().getGreen(), c.ink2().getBlue(), strength));
        for (int k = 0; k < years.u().length; k++) {
            double x = side * scale().place(years.u()[k]);
            double y = side - side * scale().place(years.v()[k]);
            g.fillRect(x - POINT / 2, y - POINT / 2, POINT, POINT);
        }
        add(points, corners);
        if (isFocusVisible()) {
            Rectangle ring = new Rectangle(LEFT - 3, ABOVE - 3, side + 6, side + 6);
            ring.setFill(Color.TRANSPARENT);
            ring.setStroke(c.accent());
            ring.setStrokeWidth(2);
            add(ring);
        }
        drawCorner();
    }

    /** The corner alone, which is all that changes while it is dragged. */
    private void drawCorner() {
        PictureColours c = colours();
        double side = side();
        double place = side * scale().placeOfYears(corner.get());
        double size = side - place;
        Canvas bad = new Canvas(size, size);
        bad.relocate(LEFT + place, ABOVE);
        GraphicsContext g = bad.getGraphicsContext2D();
        g.setFill(c.tauGround());
        g.fillRect(0, 0, size, size);
        g.setFill(c.tau());
        double level = 1 - 1 / corner.get();
        for (int k = 0; k < years.u().length; k++) {
            if (years.u()[k] >= level && years.v()[k] >= level) {
                double x = side * scale().place(years.u()[k]) - place;
                double y = side - side * scale().place(years.v()[k]);
                g.fillOval(x - BAD_POINT / 2, y - BAD_POINT / 2, BAD_POINT, BAD_POINT);
            }
        }
        corners.getChildren().setAll(bad, dashed(LEFT + place, ABOVE, LEFT + place, ABOVE + side, c.tau()),
                dashed(LEFT, ABOVE + size, LEFT + side, ABOVE + size, c.tau()));
        setAccessibleText(String.format(Locale.ROOT, "years at least as bad as 1 in %.3g for both %s and %s: %d of %d", corner.get(), years.first(), years.second(),
                years.bothBeyond(corner.get()), years.u().length));
    }

    private static Line dashed(double x1, double y1, double x2, double y2, Color colour) {
        Line line = line(x1, y1, x2, y2, colour, 1.5);
        line.getStrokeDashArray().setAll(5.0, 4.0);
        return line;
    }

    /** Near the lines of the corner or inside it. */
    private boolean near(MouseEvent event) {
        double side = side();
        double place = side * scale().placeOfYears(corner.get());
        double x = onSheet(event.getX()) - LEFT;
        double y = side + ABOVE - onSheet(event.getY());
        boolean within = x >= -NEAR && y >= -NEAR && x <= side + NEAR && y <= side + NEAR;
        return within && (Math.abs(x - place) <= NEAR || Math.abs(y - place) <= NEAR || x > place && y > place);
    }

    private void drag(MouseEvent event) {
        if (!held) {
            return;
        }
        double wished = scale().years(Math.max(0, Math.min(1, middle(event) - grabbed)));
        double years = Math.max(STEPS.get(0), Math.min(STEPS.get(STEPS.size() - 1), wished));
        corner.set(event.isAltDown() ? years : nearest(years));
        event.consume();
    }

    /** Place along the diagonal, from 0 to 1. */
    private double middle(MouseEvent event) {
        double side = side();
        return (onSheet(event.getX()) - LEFT + side + ABOVE - onSheet(event.getY())) / (2 * side);
    }

    private static int nearest(double years) {
        int nearest = STEPS.get(0);
        for (int step : STEPS) {
            nearest = Math.abs(Math.log(step / years)) < Math.abs(Math.log(nearest / years)) ? step : nearest;
        }
        return nearest;
    }

    private void key(KeyEvent event) {
        boolean more = event.getCode() == KeyCode.UP || event.getCode() == KeyCode.RIGHT;
        boolean fewer = event.getCode() == KeyCode.DOWN || event.getCode() == KeyCode.LEFT;
        if (more || fewer) {
            int at = STEPS.indexOf(nearest(corner.get())) + (more ? 1 : -1);
            corner.set(STEPS.get(Math.max(0, Math.min(STEPS.size() - 1, at))));
            event.consume();
        }
    }
}
