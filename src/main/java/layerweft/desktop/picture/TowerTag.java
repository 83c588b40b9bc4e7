package layerweft.desktop.picture;

import javafx.scene.layout.Pane;
import javafx.scene.paint.Color;
import javafx.scene.shape.Rectangle;
import javafx.scene.text.Text;

/** What the hand is about to set, beside it. */
final class TowerTag {
    private static final double HEIGHT = 24;

    private TowerTag() {}

    static void show(Pane tags, String words, double x, double y, double width, PictureColours colours) {
        Color ground = colours.accent();
        Text text = Picture.text(words, 13.5, true, PictureColours.textOn(ground));
        double wide = Picture.widthOf(text) + 20;
        double left = Math.max(0, Math.min(x + 16, width - wide));
        double top = Math.max(0, y - HEIGHT - 8);
        Rectangle box = new Rectangle(left, top, wide, HEIGHT);
        box.setArcWidth(8);
        box.setArcHeight(8);
        box.setFill(ground);
        tags.getChildren().setAll(box, Picture.at(text, left + wide / 2, top + 16.5, Picture.Anchor.MIDDLE));
    }
}
