package layerweft.desktop.picture;

import static layerweft.desktop.picture.Picture.Anchor.LEFT;
import static layerweft.desktop.picture.Picture.Anchor.MIDDLE;
import static layerweft.desktop.picture.Picture.Anchor.RIGHT;
import static layerweft.desktop.picture.Picture.line;

import java.util.List;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.text.Text;
import javafx.scene.transform.Rotate;
import layerweft.figures.FigureText;

/** The left of a tower: amounts, the haze with its return periods, and the threads with their names. */
final class TowerAxis {
    /** Darkness of an amount that every year's largest event passes. */
    private static final double DARKEST = 0.65;
    private static final List<Integer> ROUND_YEARS = List.of(2, 5, 10, 20, 50, 100, 200, 500, 1000);
    private static final double LINE_HEIGHT = 15;

    private TowerAxis() {}

    static void paint(TowerSheet s) {
        AmountScale scale = s.layout().scale();
        double end = TowerLayout.HAZE_LEFT - 4;
        double last = Double.POSITIVE_INFINITY;
        for (double amount : scale.ticks()) {
            double y = Math.round(scale.y(amount)) + 0.5;
            s.add(line(end - 4, y, end, y, s.colours().edge(), 1));
            if (last - y >= LINE_HEIGHT) {
                Text number = s.note(FigureText.groupedPlain(amount), end - 8, y + 4, RIGHT);
                number.setX(Math.max(0, number.getX()));
                last = y;
            }
        }
        haze(s);
    }

    private static void haze(TowerSheet s) {
        AmountScale scale = s.layout().scale();
        double left = TowerLayout.HAZE_LEFT;
        double width = TowerLayout.HAZE_WIDTH;
        double height = scale.bottom() - scale.top();
        s.add(Picture.box(left, scale.top(), width, height, s.colours().sunken(), s.colours().edge()));
        if (s.tower().haze().isEmpty()) {
            return;
        }
        Canvas canvas = new Canvas(width - 2, height - 2);
        canvas.relocate(left + 1, scale.top() + 1);
        canvas.setMouseTransparent(true);
        GraphicsContext g = canvas.getGraphicsContext2D();
        Color ink = s.colours().ink();
        for (int row = 0; row < height - 2; row++) {
            double chance = 1 / years(s.tower().haze(), scale.amount(scale.top() + 1.5 + row));
            g.setFill(Color.color(ink.getRed(), ink.getGreen(), ink.getBlue(), DARKEST * Math.sqrt(chance)));
            g.fillRect(0, row, width, 1);
        }
        s.add(canvas);
        s.note("the year’s largest event:", 0, scale.top() - 32, LEFT);
        s.note("amount and return period", 0, scale.top() - 16, LEFT);
        double last = Double.POSITIVE_INFINITY;
        for (int years : ROUND_YEARS) {
            double y = Math.round(scale.y(amount(s.tower().haze(), years))) + 0.5;
            if (y > scale.top() && y <= scale.bottom() - 1 && last - y >= LINE_HEIGHT) {
                s.add(line(left + width, y, left + width + 5, y, s.colours().ink2(), 1));
                s.note("1 in " + years, left + width + 8, y + 4, LEFT);
                last = y;
            }
        }
    }

    /** Return period of an amount, straight between the marks in the logarithm of the years. */
    static double years(List<Tower.Mark> haze, double amount) {
        if (amount <= haze.get(0).amount()) {
            return haze.get(0).years();
        }
        for (int k = 1; k < haze.size(); k++) {
            Tower.Mark low = haze.get(k - 1);
            Tower.Mark high = haze.get(k);
            if (amount <= high.amount()) {
                double part = (amount - low.amount()) / (high.amount() - low.amount());
                return low.years() * Math.pow(high.years() / low.years(), part);
            }
        }
        return haze.get(haze.size() - 1).years();
    }

    /** Amount of a return period; infinite beyond the marks. */
    static double amount(List<Tower.Mark> haze, double years) {
        for (int k = 1; k < haze.size(); k++) {
            Tower.Mark low = haze.get(k - 1);
            Tower.Mark high = haze.get(k);
            if (years >= low.years() && years <= high.years()) {
                return low.amount() + (high.amount() - low.amount()) * Math.log(years / low.years()) / Math.log(high.years() / low.years());
            }
        }
        return Double.POSITIVE_INFINITY;
    }

    /** The threads over the whole height, to be drawn before the blocks. */
    static void threads(TowerSheet s) {
        TowerThreads threads = s.layout().threads();
        double top = s.layout().scale().top();
        for (int k = 0; k < threads.size(); k++) {
            double x = s.layout().threadX(k);
            Color colour = s.colours().peril(threads.threads().get(k).colour());
            Text name = Picture.text(threads.threads().get(k).name(), 12, true, s.colours().ink());
            boolean low = !threads.slanting() && k % 2 == 1;
            if (threads.slanting()) {
                Picture.within(name, 96);
                name.setX(x - 2);
                name.setY(top - 14);
                name.getTransforms().add(new Rotate(-45, x, top - 14));
                s.add(name);
            } else {
                // a name may reach half way over its neighbours, which stand in the other row
                Picture.at(Picture.within(name, 2 * threads.apart() - 6), x, top - (low ? 16 : 32), MIDDLE);
                name.setX(Math.max(s.layout().threadsLeft() - 8, name.getX()));
                s.add(name);
            }
            double from = threads.slanting() ? top - 12 : low ? top - 12 : top - 28;
            s.add(Picture.box(x - 3, from, 6, threads.slanting() ? 5 : low ? 4 : 18, colour, null), line(x, top - 8, x, s.layout().scale().bottom(), colour, 2));
        }
        if (threads.size() > 0) {
            double left = s.layout().threadsLeft();
            double below = s.layout().scale().bottom() + 4.5;
            s.add(line(left, below, left + threads.width(), below, s.colours().edge(), 1));
            s.note("thread behind: not covered", left, below + 15, LEFT);
        }
    }
}
