package layerweft.desktop.strip;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.animation.Animation;
import javafx.animation.PauseTransition;
import javafx.collections.ListChangeListener;
import javafx.scene.control.Button;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.Region;
import javafx.util.Duration;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LiftCurves;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.desktop.session.StripCell;
import layerweft.desktop.session.Task;
import layerweft.desktop.session.TauState;
import layerweft.desktop.theme.Theme;

/**
 * The strip: the τ control and the layers. Up to six layers stand in one row, more in two; what does not fit is reached by whole cells, and
 * the selected layer stays in view.
 */
public final class Strip extends Region {
    private static final double HEIGHT = 128;
    private static final double TAU_WIDTH = 404;
    private static final double LEAST_CELL = 172;
    private static final double ARROW = 20;
    private static final int MOST_IN_ONE_ROW = 6;
    private static final Duration BLINK = Duration.millis(150);

    private final Session session;
    private final Theme theme;
    private final TauControl tau;
    private final List<LayerCell> cells = new ArrayList<>();
    private final Button back = arrow("‹", "Earlier layers", -1);
    private final Button on = arrow("›", "Later layers", 1);
    private final PauseTransition blink = new PauseTransition(BLINK);
    private boolean small;
    private int firstColumn;
    private Object gesture;

    public Strip(Session session, Theme theme) {
        this.session = session;
        this.theme = theme;
        this.tau = new TauControl(session, theme);
        getStyleClass().add("lw-strip");
        setId("strip");
        getChildren().add(tau);
        session.prices().addListener((is, was, now) -> refresh());
        session.curves().addListener((is, was, now) -> refresh());
        session.pinned().addListener((is, was, now) -> refresh());
        session.tau().addListener((is, was, now) -> waitForBlink());
        session.selectedLayer().addListener((is, was, now) -> {
            bringIntoView();
            select();
        });
        session.background().running().addListener((ListChangeListener<Task>) change -> refining());
        session.longRun().addListener((is, was, now) -> {
            if (now != null) {
                now.progress().addListener((of, before, part) -> refining());
            }
        });
        blink.setOnFinished(done -> refining());
        addEventHandler(ScrollEvent.SCROLL, event -> scroll(event.getDeltaY() + event.getDeltaX() > 0 ? -1 : 1));
        theme.scale().addListener((is, was, now) -> requestLayout());
        refresh();
    }

    public TauControl tau() {
        return tau;
    }

    private Button arrow(String sign, String name, int step) {
        Button button = new Button(sign);
        button.getStyleClass().add("lw-strip-arrow");
        button.setTooltip(new Tooltip(name));
        button.setAccessibleText(name);
        button.setOnAction(pressed -> scroll(step));
        return button;
    }

    private void refresh() {
        LivePrices prices = session.prices().get();
        LiftCurves curves = session.curves().get();
        List<StripCell> shown = prices == null ? List.of() : StripCell.of(prices, curves, session.pinned().get());
        make(shown.size());
        double highest = curves == null ? 1 : Math.max(0.05, Math.max(curves.highestLift(), highestOfMarks(shown)));
        double lowest = curves == null ? 0 : Math.min(curves.lowestLift(), -0.08 * highest);
        for (int j = 0; j < shown.size(); j++) {
            TauState at = prices.tau();
            cells.get(j).show(shown.get(j), at.tau(), lowest, highest, !prices.valid());
        }
        select();
        refining();
    }

    private static double highestOfMarks(List<StripCell> shown) {
        return shown.stream().mapToDouble(cell -> Math.max(finite(cell.lift()), finite(cell.pinnedLift()))).max().orElse(0);
    }

    private static double finite(double lift) {
        return Double.isFinite(lift) ? lift : 0;
    }

    private void make(int count) {
        if (cells.size() == count) {
            return;
        }
        getChildren().removeAll(cells);
        getChildren().removeAll(back, on);
        cells.clear();
        small = count > MOST_IN_ONE_ROW;
        for (int j = 0; j < count; j++) {
            LayerCell cell = new LayerCell(theme, small);
            int layer = j;
            cell.setId("layer-cell-" + j);
            cell.addEventHandler(MouseEvent.MOUSE_PRESSED, pressed -> {
                cell.requestFocus();
                session.selectedLayer().set(layer);
            });
            cell.addEventHandler(KeyEvent.KEY_PRESSED, event -> key(event, layer));
            cell.picture().onDrag(this::turn, () -> gesture = null);
            cells.add(cell);
        }
        getChildren().addAll(cells);
        getChildren().addAll(back, on);
        firstColumn = 0;
        bringIntoView();
        requestLayout();
    }

    private void key(KeyEvent event, int layer) {
        int step = event.getCode() == KeyCode.LEFT ? -1 : event.getCode() == KeyCode.RIGHT ? 1 : 0;
        if (event.getCode() == KeyCode.ENTER || event.getCode() == KeyCode.SPACE) {
            session.selectedLayer().set(layer);
            event.consume();
        } else if (step != 0 && layer + step >= 0 && layer + step < cells.size()) {
            session.selectedLayer().set(layer + step);
            cells.get(layer + step).requestFocus();
            event.consume();
        }
    }

    private void turn(double wished) {
        gesture = gesture == null ? new Object() : gesture;
        session.setTau(Math.rint(wished * 100) / 100, gesture);
    }

    private void select() {
        for (int j = 0; j < cells.size(); j++) {
            cells.get(j).select(j == session.selectedLayer().get());
        }
    }

    private void waitForBlink() {
        blink.playFromStart();
    }

    /** A bar under the figures that are still being worked on: all of them once a first answer is late, the simulated ones during a long run. */
    private void refining() {
        LivePrices prices = session.prices().get();
        Task pricing = session.pricingTask().get();
        Task longRun = session.longRun().get();
        boolean late = pricing != null && pricing.active() && blink.getStatus() != Animation.Status.RUNNING;
        for (int j = 0; prices != null && j < cells.size(); j++) {
            boolean rough = prices.quote().isEmpty() && prices.live().get(j).simulatedBecause().isPresent();
            if (late) {
                cells.get(j).refining(0, error(prices, j) + "computing");
            } else if (rough && prices.valid() && longRun != null && longRun.state().get() == Task.State.WORKING) {
                cells.get(j).refining(Math.max(0, longRun.progress().get()), refiningWords(prices, j, longRun));
            } else {
                cells.get(j).refining(-1, "");
            }
        }
    }

    private static String error(LivePrices prices, int j) {
        String error = FigureShown.percent(prices.layers().get(j).lossOnLine()).error();
        return error.isEmpty() ? "" : error + ", ";
    }

    private static String refiningWords(LivePrices prices, int j, Task longRun) {
        double left = longRun.secondsLeft().get();
        String time = Double.isNaN(left) ? "" : String.format(Locale.ROOT, ", %d:%02d left", (int) left / 60, (int) Math.ceil(left) % 60);
        return error(prices, j) + "refining" + time;
    }

    private int rows() {
        return small ? 2 : 1;
    }

    private int columns() {
        return (cells.size() + rows() - 1) / rows();
    }

    private int visibleColumns() {
        double room = getWidth() - theme.px(TAU_WIDTH);
        int fit = (int) Math.floor(room / theme.px(LEAST_CELL));
        if (fit >= columns()) {
            return columns();
        }
        return Math.max(1, (int) Math.floor((room - 2 * theme.px(ARROW)) / theme.px(LEAST_CELL)));
    }

    private void scroll(int step) {
        firstColumn = Math.max(0, Math.min(firstColumn + step, columns() - visibleColumns()));
        requestLayout();
    }

    private void bringIntoView() {
        if (getWidth() > 0 && !cells.isEmpty()) {
            int column = session.selectedLayer().get() % Math.max(1, columns());
            firstColumn = Math.min(firstColumn, column);
            firstColumn = Math.max(firstColumn, column - visibleColumns() + 1);
            requestLayout();
        }
    }

    @Override
    protected double computePrefHeight(double width) {
        return theme.px(HEIGHT);
    }

    @Override
    protected double computeMinHeight(double width) {
        return theme.px(HEIGHT);
    }

    @Override
    protected void layoutChildren() {
        double tauWidth = theme.px(TAU_WIDTH);
        tau.resizeRelocate(0, 1, tauWidth, getHeight() - 1);
        int visible = visibleColumns();
        firstColumn = Math.max(0, Math.min(firstColumn, columns() - visible));
        boolean scrolls = visible < columns();
        double arrow = scrolls ? theme.px(ARROW) : 0;
        back.setVisible(scrolls);
        on.setVisible(scrolls);
        back.setDisable(firstColumn == 0);
        on.setDisable(firstColumn + visible >= columns());
        back.resizeRelocate(tauWidth, 1, arrow, getHeight() - 1);
        on.resizeRelocate(getWidth() - arrow, 1, arrow, getHeight() - 1);
        double from = tauWidth + arrow;
        double width = (getWidth() - from - arrow) / Math.max(1, visible);
        double height = (getHeight() - 1) / rows();
        for (int j = 0; j < cells.size(); j++) {
            int column = j % columns() - firstColumn;
            LayerCell cell = cells.get(j);
            cell.setVisible(column >= 0 && column < visible);
            double x = Math.rint(from + column * width);
            cell.resizeRelocate(x, 1 + (j / columns()) * height, Math.rint(from + (column + 1) * width) - x, height);
        }
    }
}
