package layerweft.desktop.picture;

import static layerweft.desktop.picture.Picture.Anchor.MIDDLE;

import javafx.scene.paint.Color;
import javafx.scene.shape.Rectangle;

/** A programme without layers: the place to draw the first one. */
final class TowerEmpty {

    private TowerEmpty() {}

    /** @param drawing the layer in the hand; null while there is none */
    static void paint(TowerSheet s, TowerChange drawing) {
        AmountScale scale = s.layout().scale();
        double left = s.layout().cellsLeft();
        double width = s.layout().width() - left;
        for (double amount : scale.ticks()) {
            double y = Math.round(scale.y(amount)) + 0.5;
            s.add(Picture.line(left, y, left + width, y, s.colours().grid(), 1));
        }
        Rectangle place = new Rectangle(left, scale.top(), width, scale.bottom() - scale.top());
        place.setArcWidth(12);
        place.setArcHeight(12);
        place.setFill(Color.TRANSPARENT);
        place.setStroke(s.colours().edge());
        place.getStrokeDashArray().setAll(5.0, 4.0);
        place.setMouseTransparent(true);
        s.add(place);
        if (drawing != null && drawing.limit() > 0) {
            double top = Math.max(scale.top(), scale.y(drawing.retention() + drawing.limit()));
            s.add(Picture.box(left + 20, top, Math.min(200, width - 40), scale.y(drawing.retention()) - top, s.colours().accentGround(), s.colours().accent()));
        } else {
            double middle = (scale.top() + scale.bottom()) / 2;
            s.words("Drag upward here to draw the first layer,", 14.5, false, s.colours().ink(), left + width / 2, middle - 4, MIDDLE);
            s.words("or type it: 30 xs 20", 14.5, true, s.colours().ink(), left + width / 2, middle + 16, MIDDLE);
        }
    }
}
