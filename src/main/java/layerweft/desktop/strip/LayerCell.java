package layerweft.desktop.strip;

import java.util.List;
import javafx.css.PseudoClass;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.Region;
import javafx.util.Duration;
import layerweft.desktop.session.StripCell;
import layerweft.desktop.theme.Theme;

/**
 * One layer in the strip: name, loss on line, its error, its change since the pin, and its lift over τ. In a strip of two rows the error moves
 * to the hover text.
 */
final class LayerCell extends Region {
    private static final PseudoClass SELECTED = PseudoClass.getPseudoClass("selected");
    private static final PseudoClass LAST_VALID = PseudoClass.getPseudoClass("last-valid");
    private static final PseudoClass SMALL = PseudoClass.getPseudoClass("small");
    private static final double PADDING = 14;
    private static final double SMALL_PADDING = 10;
    private static final double CURVE_WIDTH = 96;
    private static final double SMALL_CURVE_WIDTH = 64;
    /** What figures need beside the curve, once a cell is wide. */
    private static final double TEXT_WIDTH = 150;
    private static final double WIDEST_CURVE = 230;

    private final Theme theme;
    private final boolean small;
    private final Region accent = new Region();
    private final Label name = label("lw-cell-name");
    private final Label value = label("lw-cell-value");
    private final Label unit = label("lw-figure-unit");
    private final Label error = label("lw-note");
    private final Label change = label("lw-cell-change");
    private final Label changeUnit = label("lw-note");
    private final Label since = label("lw-note");
    private final Region refining = new Region();
    private final Region refined = new Region();
    private final LiftPicture picture;
    private final Tooltip hover = new Tooltip();
    private double progress = -1;

    LayerCell(Theme theme, boolean small) {
        this.theme = theme;
        this.small = small;
        this.picture = new LiftPicture(theme, !small);
        getStyleClass().add("lw-cell");
        pseudoClassStateChanged(SMALL, small);
        accent.getStyleClass().add("lw-cell-accent");
        refining.getStyleClass().add("lw-refining");
        refined.getStyleClass().add("lw-refined");
        getChildren().addAll(accent, name, value, unit, error, change, changeUnit, since, refining, refined, picture);
        getChildren().forEach(child -> child.setManaged(false));
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.BUTTON);
        hover.setShowDelay(Duration.millis(400));
        hover.setShowDuration(Duration.seconds(30));
        hover.setWrapText(true);
        hover.setMaxWidth(420);
        Tooltip.install(this, hover);
    }

    private static Label label(String style) {
        Label label = new Label();
        label.getStyleClass().add(style);
        return label;
    }

    LiftPicture picture() {
        return picture;
    }

    /**
     * @param tau at present
     * @param lowest of the lift axis that all cells share
     * @param highest of it
     * @param lastValid whether the document has faults, so that these are figures of the last valid one
     */
    void show(StripCell cell, double tau, double lowest, double highest, boolean lastValid) {
        name.setText(cell.name());
        value.setText(cell.figure().value());
        unit.setText(cell.figure().unit());
        String simulated = cell.simulated() ? cell.figure().error().isEmpty() ? "simulated" : ", simulated" : "";
        error.setText(lastValid ? "last valid" : cell.figure().error() + simulated);
        boolean moved = !cell.change().isEmpty();
        boolean still = cell.unmoved().isPresent();
        change.setText(moved ? cell.change() : "");
        changeUnit.setText(!moved ? "" : small ? "since pin" : "pts");
        since.setText(still ? "no copula" : moved ? "since pin" : "");
        if (small && still) {
            change.setText("");
            changeUnit.setText("no copula");
        }
        pseudoClassStateChanged(LAST_VALID, lastValid);
        picture.show(cell, tau, lowest, highest);
        hover.setText(cell.hover());
        setAccessibleText(cell.name() + ", loss on line " + cell.figure().text() + " " + error.getText()
                + (moved ? ", " + cell.change() + " points since pin" : ""));
        requestLayout();
    }

    /** While a long run refines the figure: how much of it is done, and the words for the error's line; −1 for none. */
    void refining(double part, String words) {
        progress = part;
        if (part >= 0) {
            error.setText(words);
        }
        requestLayout();
    }

    void select(boolean selected) {
        pseudoClassStateChanged(SELECTED, selected);
    }

    @Override
    protected void layoutChildren() {
        accent.resizeRelocate(0, 0, getWidth(), theme.px(4));
        double pad = theme.px(small ? SMALL_PADDING : PADDING);
        double right = getWidth() - pad;
        double curve = small ? theme.px(SMALL_CURVE_WIDTH)
                : Math.max(theme.px(CURVE_WIDTH), Math.min(theme.px(WIDEST_CURVE), getWidth() - 2 * pad - theme.px(TEXT_WIDTH)));
        place(name, pad, small ? 15 : 26, right - pad);
        List<Label> figure = List.of(value, unit);
        row(figure, pad, small ? 37 : 60, 3);
        if (small) {
            error.setVisible(false);
            since.setVisible(false);
            row(List.of(change, changeUnit), pad, 55, 3);
            picture.resizeRelocate(right - curve, theme.px(18), curve, getHeight() - theme.px(20));
        } else {
            place(error, pad, 81, right - curve - pad + theme.px(8));
            row(List.of(change, changeUnit), pad, 104, 3);
            place(since, pad, 119, right - curve - pad);
            picture.resizeRelocate(right - curve + theme.px(4), theme.px(33), curve, theme.px(92));
        }
        refining.setVisible(progress >= 0);
        refined.setVisible(progress >= 0);
        double bar = right - curve - pad - theme.px(8);
        double barY = theme.px(small ? 57 : 85);
        refining.resizeRelocate(pad, barY, bar, theme.px(3));
        refined.resizeRelocate(pad, barY, bar * Math.max(0, progress), theme.px(3));
    }

    private void row(List<Label> labels, double from, double baseline, double gap) {
        double x = from;
        for (Label label : labels) {
            double width = label.prefWidth(-1);
            place(label, x, baseline, width);
            x += label.getText().isEmpty() ? 0 : width + theme.px(gap);
        }
    }

    /** By the baseline of the text, in the design's lengths. */
    private void place(Label label, double x, double baseline, double room) {
        double height = label.prefHeight(-1);
        label.resize(Math.min(room, label.prefWidth(-1) + 1), height);
        label.relocate(x, theme.px(baseline) - label.getBaselineOffset());
    }
}
