package layerweft.desktop.picture;

import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.layout.Pane;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;
import javafx.scene.paint.Paint;
import javafx.scene.shape.Line;
import javafx.scene.shape.Rectangle;
import javafx.scene.text.Font;
import javafx.scene.text.Text;
import javafx.scene.transform.Scale;
import layerweft.desktop.theme.Theme;

/**
 * A drawing on a sheet whose lengths are those of a text size of 100 %; the sheet as a whole grows with the text. It is drawn anew when its size, the
 * theme or what it shows changes.
 */
abstract class Picture extends Region {

    /** Which point of a text is placed. */
    enum Anchor { LEFT, MIDDLE, RIGHT }

    private final Theme theme;
    private final Pane sheet = new Pane();
    private boolean drawn;

    Picture(Theme theme) {
        this.theme = theme;
        Scale scale = new Scale();
        scale.xProperty().bind(theme.scale());
        scale.yProperty().bind(theme.scale());
        sheet.getTransforms().add(scale);
        sheet.setManaged(false);
        getChildren().add(sheet);
        theme.dark().addListener((is, was, now) -> redraw());
        theme.scale().addListener((is, was, now) -> redraw());
        widthProperty().addListener((is, was, now) -> redraw());
        heightProperty().addListener((is, was, now) -> redraw());
    }

    /** Puts the drawing on the sheet, for its present width and height, both above 0. */
    abstract void draw();

    /** Draws at the next pulse. */
    final void redraw() {
        drawn = false;
        requestLayout();
    }

    @Override
    protected void layoutChildren() {
        if (!drawn && getWidth() > 0 && getHeight() > 0) {
            drawn = true;
            sheet.resizeRelocate(0, 0, sheetWidth(), sheetHeight());
            draw();
        }
    }

    final Pane sheet() {
        return sheet;
    }

    final double sheetWidth() {
        return getWidth() / theme.scale().get();
    }

    final double sheetHeight() {
        return getHeight() / theme.scale().get();
    }

    /** A length of the control as a length of the sheet. */
    final double onSheet(double length) {
        return length / theme.scale().get();
    }

    final Theme theme() {
        return theme;
    }

    final PictureColours colours() {
        return theme.dark().get() ? PictureColours.DARK : PictureColours.LIGHT;
    }

    static Text text(String words, double size, boolean semibold, Color colour) {
        Text text = new Text(words);
        text.setFont(Font.font(semibold ? Theme.SEMIBOLD_FAMILY : Theme.FAMILY, size));
        text.setFill(colour);
        text.setTextOrigin(VPos.BASELINE);
        text.setMouseTransparent(true);
        return text;
    }

    /** Puts the anchor of the text's baseline at a point. */
    static Text at(Text text, double x, double baseline, Anchor anchor) {
        double width = widthOf(text);
        text.setX(Math.round(anchor == Anchor.LEFT ? x : anchor == Anchor.RIGHT ? x - width : x - width / 2));
        text.setY(Math.round(baseline));
        return text;
    }

    static double widthOf(Text text) {
        return text.getLayoutBounds().getWidth();
    }

    /** The text, cut to a width with an ellipsis if it must be. */
    static Text within(Text text, double width) {
        String whole = text.getText();
        for (int letters = whole.length(); letters > 1 && widthOf(text) > width; letters--) {
            text.setText(whole.substring(0, letters - 1).stripTrailing() + "…");
        }
        return text;
    }

    static Line line(double x1, double y1, double x2, double y2, Paint colour, double width) {
        Line line = new Line(x1, y1, x2, y2);
        line.setStroke(colour);
        line.setStrokeWidth(width);
        line.setMouseTransparent(true);
        return line;
    }

    /** A box with its border inside, so that hairlines are sharp. */
    static Rectangle box(double x, double y, double width, double height, Paint fill, Paint border) {
        boolean bordered = border != null;
        double inset = bordered ? 0.5 : 0;
        Rectangle box = new Rectangle(x + inset, y + inset, Math.max(0, width - 2 * inset), Math.max(0, height - 2 * inset));
        box.setFill(fill);
        box.setStroke(border);
        box.setMouseTransparent(true);
        return box;
    }

    final void add(Node... nodes) {
        sheet.getChildren().addAll(nodes);
    }
}
