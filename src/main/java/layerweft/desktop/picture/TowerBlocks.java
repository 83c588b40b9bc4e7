package layerweft.desktop.picture;

import static layerweft.desktop.picture.Picture.Anchor.LEFT;
import static layerweft.desktop.picture.Picture.Anchor.MIDDLE;
import static layerweft.desktop.picture.Picture.box;
import static layerweft.desktop.picture.Picture.line;

import javafx.scene.paint.Color;
import javafx.scene.paint.CycleMethod;
import javafx.scene.paint.LinearGradient;
import javafx.scene.paint.Stop;
import javafx.scene.shape.Line;
import javafx.scene.shape.LineTo;
import javafx.scene.shape.MoveTo;
import javafx.scene.shape.Path;
import javafx.scene.shape.Rectangle;
import javafx.scene.text.Text;

/** The layers of each event: threads over the band, cells of the year, and the handles of the selected one. */
final class TowerBlocks {
    /** A share of 1 in pixels; thin threads keep the least. */
    private static final double WIDEST_THREAD = 40;
    private static final double THINNEST_THREAD = 2.5;
    /** Threads at least so wide carry their number inside. */
    private static final double CARRIES = 19;
    private static final double HANDLE = 36;
    private static final double HATCH = 7;

    private TowerBlocks() {}

    static void paint(TowerSheet s) {
        for (TowerLayout.Block block : s.layout().blocks()) {
            band(s, block);
            if (block.lane() == 0) {
                threads(s, block);
            } else if (s.layout().threads().size() > 0) {
                bundle(s, block);
            }
            cells(s, block);
            if (!block.toScale()) {
                broken(s, block);
            }
            if (s.layer(block).limit() == Double.POSITIVE_INFINITY) {
                dashed(s, block, block.top() + 0.5, s.colours().surface());
            }
            if (!Double.isNaN(s.layer(block).franchise())) {
                dashed(s, block, Math.round(s.layout().scale().y(s.layer(block).franchise())) + 0.5, s.colours().ink());
            }
        }
        for (TowerLayout.Block block : s.layout().all()) {
            if (s.lit().contains(block.layer())) {
                outline(s, block, 1.5);
            }
            if (block.layer() == s.selected()) {
                outline(s, block, 2);
                handles(s, block);
            }
        }
    }

    private static void band(TowerSheet s, TowerLayout.Block block) {
        double width = block.cellsLeft() - 4 - block.left();
        if (width > 0) {
            boolean selected = block.layer() == s.selected();
            s.add(box(block.left(), block.top(), width, block.height(), selected ? s.colours().accentGround() : s.colours().sunken(), s.colours().edge()));
        }
    }

    private static void threads(TowerSheet s, TowerLayout.Block block) {
        TowerThreads threads = s.layout().threads();
        double high = block.height() >= 14 ? 2 : 0;
        for (int k = 0; k < threads.size(); k++) {
            double share = threads.threads().get(k).share(s.layer(block));
            if (Double.isNaN(share)) {
                continue;
            }
            double x = s.layout().threadX(k);
            double most = Math.min(WIDEST_THREAD, threads.apart() - 6);
            double width = Math.max(THINNEST_THREAD, share * most);
            Color colour = s.colours().peril(threads.threads().get(k).colour());
            s.add(box(x - width / 2, block.top() - high, width, block.height() + 2 * high, colour, null));
            String number = share > 0 && share < 0.005 ? "< 1" : String.valueOf(Math.round(100 * share));
            if (block.height() < 13) {
                continue;
            }
            if (width >= CARRIES) {
                s.words(number, 12.5, true, PictureColours.textOn(colour), x, block.middle() + 4.5, MIDDLE);
            } else {
                Text beside = Picture.text(number, 12.5, false, s.colours().ink2());
                if (x + width / 2 + 3 + Picture.widthOf(beside) < s.layout().threadX(k) + threads.apart() - 4) {
                    s.add(Picture.at(beside, x + width / 2 + 3, block.middle() + 4.5, LEFT));
                }
            }
        }
    }

    /** Beside the threads their shares stand together, as wide as they are large. */
    private static void bundle(TowerSheet s, TowerLayout.Block block) {
        double x = block.left() + 4;
        double width = block.cellsLeft() - 12 - block.left();
        for (TowerThreads.Strand thread : s.layout().threads().threads()) {
            double share = thread.share(s.layer(block));
            if (share > 0) {
                s.add(box(x, block.top(), share * width, block.height(), s.colours().peril(thread.colour()), null));
                x += share * width;
            }
        }
    }

    private static void cells(TowerSheet s, TowerLayout.Block block) {
        double x = block.cellsLeft();
        for (TowerCells.Cell cell : TowerCells.of(s.layer(block))) {
            double width = cell.size() * s.layout().pitch() - 2;
            switch (cell.kind()) {
                case KEPT -> hatched(s, x, block.top(), width, block.height());
                case USED -> s.add(box(x, block.top(), width, block.height(), Double.isNaN(cell.use()) ? s.colours().sunken() : s.colours().lossOnLine(cell.use()),
                        s.colours().edge()));
                case MORE -> s.add(box(x, block.top(), width, block.height(), s.colours().sunken(), s.colours().edge()));
                case OPEN -> open(s, x, block.top(), width, block.height());
            }
            number(s, block, cell, x, width);
            x += cell.size() * s.layout().pitch();
        }
    }

    /** Numbers never shorten: they step down one type size, and stand beside a low block. */
    private static void number(TowerSheet s, TowerLayout.Block block, TowerCells.Cell cell, double x, double width) {
        boolean used = cell.kind() == TowerCells.Kind.USED;
        String words = used ? TowerText.part(cell.use()) : cell.words();
        if (words.isEmpty() || block.height() < TowerLayout.SMALL) {
            return;
        }
        Color colour = used && !Double.isNaN(cell.use()) ? PictureColours.textOn(s.colours().lossOnLine(cell.use())) : s.colours().ink2();
        Text text = Picture.text(words, used ? 13.5 : 12, used, colour);
        if (Picture.widthOf(text) > width - 4 && used) {
            text = Picture.text(TowerText.number(cell.use()), 12, true, colour);
        }
        if (Picture.widthOf(text) <= width) {
            if (cell.kind() == TowerCells.Kind.KEPT) {
                double w = Picture.widthOf(text) + 6;
                s.add(box(x + width / 2 - w / 2, block.middle() - 8, w, 16, s.colours().surface(), null));
            }
            s.add(Picture.at(text, x + width / 2, block.middle() + 4.5, MIDDLE));
        }
    }

    /** What is kept is no money of the layer: hatched. */
    static void hatched(TowerSheet s, double x, double y, double width, double height) {
        s.add(box(x, y, width, height, s.colours().surface(), null));
        Path strokes = new Path();
        for (double c = HATCH; c < width + height; c += HATCH) {
            double fromX = Math.min(c, width);
            double toY = Math.min(c, height);
            strokes.getElements().addAll(new MoveTo(x + fromX, y + c - fromX), new LineTo(x + c - toY, y + toY));
        }
        strokes.setStroke(s.colours().edge());
        strokes.setStrokeWidth(1);
        strokes.setMouseTransparent(true);
        s.add(strokes, box(x, y, width, height, Color.TRANSPARENT, s.colours().edge()));
    }

    /** A cell without an end. */
    private static void open(TowerSheet s, double x, double y, double width, double height) {
        Color from = s.colours().lossOnLine(0);
        Color to = Color.color(from.getRed(), from.getGreen(), from.getBlue(), 0);
        Color edge = s.colours().edge();
        Color faded = Color.color(edge.getRed(), edge.getGreen(), edge.getBlue(), 0);
        s.add(box(x, y, width, height, fading(from, to), null), box(x, y, width, 1, fading(edge, faded), null), box(x, y + height - 1, width, 1, fading(edge, faded), null),
                box(x, y, 1, height, edge, null));
    }

    private static LinearGradient fading(Color from, Color to) {
        return new LinearGradient(0, 0, 1, 0, true, CycleMethod.NO_CYCLE, new Stop(0, from), new Stop(1, to));
    }

    /** The right edge of a block that is higher than its limit says: a zigzag. */
    private static void broken(TowerSheet s, TowerLayout.Block block) {
        Path zigzag = new Path(new MoveTo(block.right() - 2, block.top() - 4));
        for (int k = 1; k <= 4; k++) {
            zigzag.getElements().add(new LineTo(block.right() + (k % 2 == 1 ? 2 : -2), block.top() - 4 + 3.0 * k));
        }
        zigzag.setStroke(s.colours().ink2());
        zigzag.setStrokeWidth(1.4);
        zigzag.setMouseTransparent(true);
        s.add(zigzag);
    }

    /** Across the block: a franchise, or in the colour of the ground an upper edge that is none. */
    private static void dashed(TowerSheet s, TowerLayout.Block block, double y, Color colour) {
        Line dashes = line(block.left(), y, block.right(), y, colour, 1.5);
        dashes.getStrokeDashArray().setAll(5.0, 4.0);
        s.add(dashes);
    }

    private static void outline(TowerSheet s, TowerLayout.Block block, double width) {
        Rectangle frame = new Rectangle(block.left() - 1, block.top() - 1, block.right() - block.left() + 2, block.height() + 2);
        frame.setFill(Color.TRANSPARENT);
        frame.setStroke(s.colours().accent());
        frame.setStrokeWidth(width);
        frame.setMouseTransparent(true);
        s.add(frame);
    }

    private static void handles(TowerSheet s, TowerLayout.Block block) {
        Tower.Layer layer = s.layer(block);
        double x = block.left() + 0.66 * (block.right() - block.left()) - HANDLE / 2;
        if (layer.limit() < Double.POSITIVE_INFINITY) {
            s.add(handle(s, x, block.top() - 3, HANDLE, 6));
        }
        if (Double.isNaN(layer.franchise())) {
            s.add(handle(s, x, block.bottom() - 3, HANDLE, 6));
        }
        if (layer.reinstates() && block.height() >= TowerLayout.SMALL) {
            double high = Math.min(HANDLE, block.height() - 10);
            s.add(handle(s, block.right() - 3, block.middle() - high / 2, 6, high));
        }
    }

    private static Rectangle handle(TowerSheet s, double x, double y, double width, double height) {
        Rectangle handle = new Rectangle(x, y, width, height);
        handle.setArcWidth(6);
        handle.setArcHeight(6);
        handle.setFill(s.colours().accent());
        handle.setStroke(s.colours().surface());
        handle.setStrokeWidth(1.5);
        handle.setMouseTransparent(true);
        return handle;
    }
}
