package layerweft.desktop.strip;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.layout.Region;
import javafx.scene.shape.Circle;
import javafx.scene.shape.Line;
import javafx.scene.shape.Rectangle;
import javafx.scene.text.Text;
import layerweft.desktop.session.DataRange;
import layerweft.desktop.session.Pin;
import layerweft.desktop.session.TauState;
import layerweft.desktop.theme.Theme;
import layerweft.study.DependenceStrength.Kind;

/** The track of the τ control: from 0, or below where the family goes there, to 1; the ring, or the bar of pairs, and the marks. */
final class TauTrack extends Region {
    /** Free at both ends, so that the ring can stand on them. */
    private static final double MARGIN = 8;
    private static final double TRACK_Y = 24;
    private static final double RING = 11;
    private static final int TENTHS = 10;

    private final Theme theme;
    private final Rectangle data = new Rectangle();
    private final Line dataLow = new Line();
    private final Line dataHigh = new Line();
    private final Line track = new Line();
    private final Line hollow = new Line();
    private final Line filled = new Line();
    private final Line pinMark = new Line();
    private final List<Line> ticks = new ArrayList<>();
    private final Circle ring = new Circle();
    private final Rectangle bar = new Rectangle();
    private final Text left = new Text();
    private final Text zero = new Text();
    private final Text middle = new Text();
    private final Text right = new Text("1 together");

    private TauState state;
    private Pin pin;
    private DataRange range;

    TauTrack(Theme theme) {
        this.theme = theme;
        getStyleClass().add("lw-tau-track");
        data.getStyleClass().add("lw-tau-data");
        dataLow.getStyleClass().add("lw-tau-data-edge");
        dataHigh.getStyleClass().add("lw-tau-data-edge");
        track.getStyleClass().add("lw-tau-line");
        hollow.getStyleClass().add("lw-tau-hollow");
        filled.getStyleClass().add("lw-tau-filled");
        pinMark.getStyleClass().add("lw-tau-pin");
        ring.getStyleClass().add("lw-tau-ring");
        bar.getStyleClass().add("lw-tau-bar");
        getChildren().addAll(data, dataLow, dataHigh);
        for (int k = 0; k <= 2 * TENTHS; k++) {
            Line tick = new Line();
            tick.getStyleClass().add("lw-tau-tick");
            ticks.add(tick);
            getChildren().add(tick);
        }
        getChildren().addAll(track, hollow, filled, pinMark, bar, ring);
        for (Text text : List.of(left, zero, right)) {
            text.getStyleClass().add("lw-mark-text");
            getChildren().add(text);
        }
        middle.getStyleClass().addAll("lw-mark-text", "lw-tau-text");
        getChildren().add(middle);
        theme.scale().addListener((is, was, now) -> requestLayout());
    }

    void show(TauState newState, Pin newPin, DataRange newRange) {
        state = newState;
        pin = newPin;
        range = newRange;
        requestLayout();
    }

    /** The smallest τ on the track: 0, or below it where the family goes there. */
    private double low() {
        return state != null && state.least() < 0 ? Math.min(-0.05, state.least()) : 0;
    }

    double x(double tau) {
        double margin = theme.px(MARGIN);
        return margin + (tau - low()) / (1 - low()) * (getWidth() - 2 * margin);
    }

    double tauAt(double x) {
        double margin = theme.px(MARGIN);
        return low() + (x - margin) / (getWidth() - 2 * margin) * (1 - low());
    }

    @Override
    protected double computePrefHeight(double width) {
        return theme.px(62);
    }

    @Override
    protected void layoutChildren() {
        double y = theme.px(TRACK_Y);
        boolean turns = state != null && state.turns();
        horizontal(track, x(low()), x(1), y);
        for (int k = 0; k < ticks.size(); k++) {
            double tau = (k - TENTHS) / (double) TENTHS;
            Line tick = ticks.get(k);
            tick.setVisible(tau >= low() - 1e-9);
            vertical(tick, x(tau), y + theme.px(6), y + theme.px(10));
        }
        boolean independent = !turns || state.kind() == Kind.INDEPENDENT;
        hollow.setVisible(independent);
        horizontal(hollow, x(low()), x(1), y);
        boolean pairs = turns && state.kind() == Kind.PAIRS;
        filled.setVisible(!independent && !pairs);
        horizontal(filled, x(0), turns ? x(state.tau()) : x(0), y);
        ring.setVisible(turns && !pairs);
        ring.setCenterX(turns ? x(state.tau()) : 0);
        ring.setCenterY(y);
        ring.setRadius(theme.px(RING) - 2);
        bar.setVisible(pairs);
        if (pairs) {
            double half = theme.px(7);
            bar.setX(x(state.lowestPair()) - half);
            bar.setWidth(x(state.highestPair()) - x(state.lowestPair()) + 2 * half);
            bar.setY(y - half);
            bar.setHeight(2 * half);
            bar.setArcWidth(2 * half);
            bar.setArcHeight(2 * half);
        }
        marks(y);
        texts(y + theme.px(29));
    }

    private void marks(double y) {
        boolean known = range != null;
        data.setVisible(known);
        dataLow.setVisible(known);
        dataHigh.setVisible(known);
        if (known) {
            double top = y - theme.px(10);
            data.setX(x(range.low()));
            data.setWidth(x(range.high()) - x(range.low()));
            data.setY(top);
            data.setHeight(theme.px(20));
            vertical(dataLow, x(range.low()), top, top + theme.px(20));
            vertical(dataHigh, x(range.high()), top, top + theme.px(20));
        }
        pinMark.setVisible(pin != null && pin.tau().turns() && pin.tau().tau() >= low());
        if (pinMark.isVisible()) {
            vertical(pinMark, x(pin.tau().tau()), y - theme.px(12), y + theme.px(12));
        }
    }

    private void texts(double baseline) {
        boolean negative = low() < 0;
        left.setText(negative ? state.leftStop() : "0 apart");
        left.setX(negative ? x(low()) - theme.px(MARGIN) : 0);
        zero.setText(negative ? "0" : "");
        zero.setX(x(0) - zero.getLayoutBounds().getWidth() / 2);
        zero.setVisible(left.getX() + left.getLayoutBounds().getWidth() + theme.px(6) < zero.getX());
        right.setX(getWidth() - right.getLayoutBounds().getWidth());
        middle.setText(middleText());
        double centre = range != null ? (x(range.low()) + x(range.high())) / 2 : getWidth() / 2;
        double half = middle.getLayoutBounds().getWidth() / 2;
        double from = (zero.isVisible() ? zero.getX() + zero.getLayoutBounds().getWidth() : left.getX() + left.getLayoutBounds().getWidth())
                + theme.px(8);
        middle.setX(Math.max(from, Math.min(right.getX() - theme.px(8) - 2 * half, centre - half)));
        for (Text text : List.of(left, zero, middle, right)) {
            text.setY(baseline);
        }
    }

    private String middleText() {
        if (state == null) {
            return "";
        }
        return switch (state.kind()) {
            case ONE_PERIL -> "one peril: no copula";
            case INDEPENDENT -> "independent";
            case PAIRS -> "pairs " + TauText.rounded(state.lowestPair()) + "–" + TauText.rounded(state.highestPair());
            case FIXED, ONE_TAU -> range == null ? "" : "data " + TauText.of(range.low()) + "–" + TauText.of(range.high());
        };
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
