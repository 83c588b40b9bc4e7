package layerweft.desktop.picture;

import java.util.List;
import javafx.scene.Node;
import javafx.scene.paint.Color;
import javafx.scene.text.Text;

/**
 * What the parts of a tower are drawn with.
 *
 * @param selected position of the selected layer, −1 for none
 * @param lit positions of layers that are pointed out as sources
 * @param out receives the nodes, the lowest first
 */
record TowerSheet(Tower tower, TowerLayout layout, PictureColours colours, int selected, List<Integer> lit, List<Node> out) {

    void add(Node... nodes) {
        out.addAll(List.of(nodes));
    }

    Text note(String words, double x, double baseline, Picture.Anchor anchor) {
        Text text = Picture.at(Picture.text(words, 12, false, colours.ink2()), x, baseline, anchor);
        add(text);
        return text;
    }

    Text words(String words, double size, boolean semibold, Color colour, double x, double baseline, Picture.Anchor anchor) {
        Text text = Picture.at(Picture.text(words, size, semibold, colour), x, baseline, anchor);
        add(text);
        return text;
    }

    Tower.Layer layer(TowerLayout.Block block) {
        return tower.layers().get(block.layer());
    }
}
