package layerweft.desktop.strip;

import javafx.beans.binding.Bindings;
import javafx.event.ActionEvent;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.RadioMenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.scene.shape.SVGPath;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.session.FamilyName;
import layerweft.desktop.session.Pin;
import layerweft.desktop.session.Session;
import layerweft.desktop.session.TauState;
import layerweft.desktop.theme.Icons;
import layerweft.desktop.theme.Theme;
import layerweft.model.copula.CopulaFamily;
import layerweft.study.DependenceStrength.Kind;

/** The one control of the dependence: τ by dragging, by keys and by typing, the family, and the pin. */
public final class TauControl extends VBox {
    private static final double STEP = 0.01;
    private static final double FINE_STEP = 0.001;
    private static final double PAGE_STEP = 0.1;

    private final Session session;
    private final TauTrack track;
    private final Label tau = new Label("τ");
    private final Label value = new Label();
    private final TextField typed = new TextField();
    private final MenuButton family = new MenuButton();
    private final Button pin = new Button("Pin figures");
    private final MenuButton pinned = new MenuButton();
    private final Label unpinned = new Label("Nothing pinned");
    private final Tooltip familyHover = new Tooltip();
    private Object gesture;
    private double pressedAt;
    private double pressedTau;

    public TauControl(Session session, Theme theme) {
        this.session = session;
        this.track = new TauTrack(theme);
        getStyleClass().add("lw-tau-control");
        setId("tau-control");
        getChildren().addAll(top(), track, bottom());
        track.setId("tau-track");
        track.setFocusTraversable(true);
        track.setAccessibleRole(AccessibleRole.SLIDER);
        track.setCursor(Cursor.H_RESIZE);
        track.addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
        track.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::drag);
        track.addEventHandler(MouseEvent.MOUSE_RELEASED, released -> gesture = null);
        track.addEventHandler(MouseEvent.MOUSE_CLICKED, clicked -> {
            if (clicked.getClickCount() == 2) {
                type();
            }
        });
        track.addEventHandler(KeyEvent.KEY_PRESSED, this::key);
        Tooltip.install(track, new Tooltip("Drag: steps of 0.01, with Shift of 0.001. Arrows 0.01, Page Up and Page Down 0.1. "
                + "Double click types a number. [ and ] step through the families."));
        session.tau().addListener((is, was, now) -> refresh());
        session.pinned().addListener((is, was, now) -> refresh());
        session.dataRange().addListener((is, was, now) -> refresh());
        refresh();
    }

    private HBox top() {
        tau.getStyleClass().add("lw-tau-sign");
        value.getStyleClass().add("lw-tau-value");
        value.setId("tau-value");
        value.setMinWidth(Region.USE_PREF_SIZE);
        value.setOnMouseClicked(clicked -> {
            if (clicked.getClickCount() == 2) {
                type();
            }
        });
        typed.getStyleClass().add("lw-tau-typed");
        typed.setId("tau-typed");
        typed.setVisible(false);
        typed.setManaged(false);
        typed.setAccessibleText("Kendall's τ");
        typed.setOnAction(this::commit);
        typed.focusedProperty().addListener((is, was, now) -> {
            if (!now) {
                stopTyping();
            }
        });
        typed.addEventHandler(KeyEvent.KEY_PRESSED, pressed -> {
            if (pressed.getCode() == KeyCode.ESCAPE) {
                stopTyping();
                track.requestFocus();
                pressed.consume();
            }
        });
        HBox number = new HBox(tau, new StackPane(value, typed));
        number.setAlignment(Pos.BASELINE_LEFT);
        number.getStyleClass().add("lw-tau-number");
        family.setId("family");
        family.getStyleClass().add("lw-choice");
        family.setAccessibleText("Family of the copula");
        family.setTooltip(familyHover);
        family.setOnShowing(opening -> fillFamilies(session.tau().get()));
        fillFamilies(session.tau().get());
        SVGPath icon = Icons.stroked(Icons.PIN);
        pin.setGraphic(icon);
        pin.setId("pin");
        pin.getStyleClass().add("lw-pin");
        pin.setOnAction(pressed -> session.pin());
        pin.disableProperty().bind(Bindings.isNull(session.prices()));
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox line = new HBox(number, family, gap, pin);
        line.getStyleClass().add("lw-tau-top");
        line.setAlignment(Pos.CENTER_LEFT);
        return line;
    }

    private HBox bottom() {
        unpinned.getStyleClass().add("lw-note");
        pinned.getStyleClass().addAll("lw-pinned");
        pinned.setId("pinned");
        MenuItem back = new MenuItem("Back to the pinned state");
        back.setOnAction(chosen -> session.backToPin());
        MenuItem remove = new MenuItem("Remove the pin");
        remove.setOnAction(chosen -> session.unpin());
        pinned.getItems().addAll(back, remove);
        HBox line = new HBox(unpinned, pinned);
        line.getStyleClass().add("lw-tau-bottom");
        line.setAlignment(Pos.CENTER_LEFT);
        return line;
    }

    private void refresh() {
        TauState now = session.tau().get();
        Pin base = session.pinned().get();
        track.show(now, base, session.dataRange().get());
        unpinned.setVisible(base == null);
        unpinned.setManaged(base == null);
        pinned.setVisible(base != null);
        pinned.setManaged(base != null);
        pinned.setText(base == null ? "" : "Pinned: " + base.label());
        boolean turns = now != null && now.turns();
        track.setDisable(!turns);
        family.setDisable(!turns);
        value.setText(!turns ? "—" : now.kind() == Kind.PAIRS ? TauText.rounded(now.tau()) : TauText.of(now.tau()));
        track.setAccessibleText("Kendall's τ " + value.getText());
        family.setText(now == null ? "" : now.copula());
        familyHover.setText(turns ? now.copula() + ": [ and ] step through the families" : "one peril: no copula");
    }

    private void fillFamilies(TauState now) {
        family.getItems().clear();
        if (now == null) {
            return;
        }
        CopulaFamily taken = now.kind() == Kind.ONE_TAU ? now.family() : null;
        ToggleGroup group = new ToggleGroup();
        for (CopulaFamily one : session.families()) {
            RadioMenuItem item = new RadioMenuItem(FamilyName.of(one));
            item.setToggleGroup(group);
            item.setSelected(one.equals(taken));
            item.setOnAction(chosen -> session.setFamily(one));
            family.getItems().add(item);
        }
        RadioMenuItem independent = new RadioMenuItem("Independent");
        independent.setToggleGroup(group);
        independent.setSelected(now.kind() == Kind.INDEPENDENT);
        independent.setOnAction(chosen -> session.setFamily(CopulaFamily.parse("independence")));
        family.getItems().addAll(new SeparatorMenuItem(), independent);
    }

    private void press(MouseEvent event) {
        TauState now = session.tau().get();
        track.requestFocus();
        if (now == null || !now.turns()) {
            return;
        }
        gesture = new Object();
        pressedAt = event.getX();
        pressedTau = now.tau();
        // pressing beside the ring brings it there; pairs are moved by their bar alone
        boolean beside = Math.abs(event.getX() - track.x(now.tau())) > track.getHeight() / 4;
        if (beside && now.kind() != Kind.PAIRS && event.getClickCount() == 1) {
            pressedTau = track.tauAt(event.getX());
            turn(pressedTau, STEP);
        }
    }

    private void drag(MouseEvent event) {
        if (gesture == null) {
            return;
        }
        double moved = track.tauAt(event.getX()) - track.tauAt(pressedAt);
        turn(pressedTau + moved, event.isShiftDown() ? FINE_STEP : STEP);
    }

    private void turn(double wished, double step) {
        // the decimal a person would write
        session.setTau(Math.rint(wished / step) / Math.rint(1 / step), gesture);
    }

    private void key(KeyEvent event) {
        double step = switch (event.getCode()) {
            case LEFT, DOWN -> -STEP;
            case RIGHT, UP -> STEP;
            case PAGE_DOWN -> -PAGE_STEP;
            case PAGE_UP -> PAGE_STEP;
            default -> 0;
        };
        TauState now = session.tau().get();
        if (step != 0 && now != null) {
            double fine = event.isShiftDown() ? step / 10 : step;
            session.setTau(Math.rint((now.tau() + fine) * 1000) / 1000, "τ by keys");
            event.consume();
        } else if (event.getCode() == KeyCode.HOME || event.getCode() == KeyCode.END) {
            session.setTau(event.getCode() == KeyCode.HOME ? 0 : 1, null);
            event.consume();
        } else if (event.getCode() == KeyCode.ENTER || event.getCode() == KeyCode.F2) {
            type();
            event.consume();
        }
    }

    /** Opens the field in place of the number. */
    public void type() {
        TauState now = session.tau().get();
        if (now == null || !now.turns()) {
            return;
        }
        typed.setText(value.getText());
        typing(true);
        typed.requestFocus();
        typed.selectAll();
    }

    private void commit(ActionEvent entered) {
        AmountText.Read read = AmountText.read(typed.getText(), AmountText.Kind.NUMBER, "");
        if (read.refusal().isEmpty() && read.value() >= -1 && read.value() <= 1) {
            session.setTau(read.value(), null);
            stopTyping();
            track.requestFocus();
        } else {
            TauState now = session.tau().get();
            typed.setTooltip(new Tooltip("τ from " + TauText.of(now.least()) + " to " + TauText.of(now.most())));
            typed.selectAll();
        }
    }

    private void stopTyping() {
        typing(false);
    }

    private void typing(boolean on) {
        typed.setVisible(on);
        typed.setManaged(on);
        value.setVisible(!on);
    }
}
