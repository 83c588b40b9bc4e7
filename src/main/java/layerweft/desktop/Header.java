package layerweft.desktop;

import java.util.List;
import java.util.Locale;
import javafx.collections.ListChangeListener;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.shape.Circle;
import layerweft.desktop.command.Command;
import layerweft.desktop.command.CommandField;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.Session;
import layerweft.desktop.session.Task;
import layerweft.desktop.theme.Icons;
import layerweft.desktop.theme.Theme;

/** The line at the top: menus, what is open, what is at work, the command field, undo, redo and the theme. */
final class Header extends Region {
    private static final double HEIGHT = 44;
    private static final double FIELD_WIDTH = 190;

    private final Theme theme;
    private final MenuBar menus = new MenuBar();
    private final Label file = new Label();
    private final Label unit = new Label();
    private final Circle dot = new Circle(3.5);
    private final Label unsaved = new Label("unsaved");
    private final HBox what = new HBox(file, unit, dot, unsaved);
    private final Label work = new Label();
    private final Button stop = new Button("Stop");
    private final HBox atWork = new HBox(work, stop);
    private final CommandField field;
    private final HBox tools = new HBox();
    private final Session session;

    Header(Session session, Theme theme, List<Menu> menus, CommandField field, Command undo, Command redo, Command light) {
        this.session = session;
        this.theme = theme;
        this.field = field;
        getStyleClass().add("lw-header");
        this.menus.getMenus().setAll(menus);
        file.getStyleClass().add("lw-file-name");
        unit.getStyleClass().add("lw-note");
        unsaved.getStyleClass().add("lw-note");
        dot.getStyleClass().add("lw-unsaved-dot");
        what.getStyleClass().add("lw-what");
        what.setAlignment(Pos.CENTER_LEFT);
        file.setId("file-name");
        unsaved.setId("unsaved");
        work.getStyleClass().add("lw-note");
        stop.getStyleClass().add("lw-small-button");
        stop.setId("stop");
        atWork.getStyleClass().add("lw-at-work");
        atWork.setAlignment(Pos.CENTER_RIGHT);
        tools.getStyleClass().add("lw-tools");
        tools.setAlignment(Pos.CENTER_RIGHT);
        Button themeButton = tool(light, Icons.MOON, "theme");
        tools.getChildren().addAll(tool(undo, Icons.UNDO, "undo"), tool(redo, Icons.REDO, "redo"), themeButton);
        theme.dark().addListener((is, was, now) -> themeButton.setGraphic(Icons.stroked(now ? Icons.SUN : Icons.MOON)));
        getChildren().addAll(this.menus, what, atWork, field, tools);
        session.document().addListener((is, was, now) -> show(now));
        session.unsaved().addListener((is, was, now) -> showUnsaved(now));
        show(session.document().get());
        showUnsaved(session.unsaved().get());
        session.background().running().addListener((ListChangeListener<Task>) change -> showWork());
        session.longRun().addListener((is, was, now) -> {
            if (now != null) {
                now.progress().addListener((of, before, part) -> showWork());
                now.state().addListener((of, before, state) -> showWork());
            }
        });
        showWork();
    }

    private static Button tool(Command command, String icon, String id) {
        Button button = new Button("", Icons.stroked(icon));
        button.getStyleClass().add("lw-tool");
        button.setId(id);
        Tooltip tooltip = new Tooltip();
        tooltip.textProperty().bind(command.name());
        button.setTooltip(tooltip);
        button.accessibleTextProperty().bind(command.name());
        button.setDisable(!command.refusal().getValue().isEmpty());
        command.refusal().addListener((is, was, now) -> button.setDisable(!now.isEmpty()));
        button.setOnAction(pressed -> command.run());
        return button;
    }

    private void show(Document now) {
        file.setText(now.name().isEmpty() ? "Portfolio without a name" : now.name());
        unit.setText(now.currencyAndUnit());
        requestLayout();
    }

    private void showUnsaved(boolean is) {
        dot.setVisible(is);
        unsaved.setVisible(is);
        requestLayout();
    }

    /** Long work is named once it has something to tell, with the time left and a way to stop it. */
    private void showWork() {
        Task longest = session.background().running().stream().filter(task -> task.progress().get() > 0 || Double.isFinite(task.secondsLeft().get()))
                .findFirst().orElse(null);
        boolean shown = longest != null && longest.state().get() == Task.State.WORKING;
        atWork.setVisible(shown);
        if (shown) {
            double left = longest.secondsLeft().get();
            work.setText(longest.name() + (Double.isNaN(left) ? "" : String.format(Locale.ROOT, ", %d:%02d left",
                    (int) Math.ceil(left) / 60, (int) Math.ceil(left) % 60)));
            stop.setOnAction(pressed -> longest.stop());
        }
        requestLayout();
    }

    @Override
    protected double computePrefHeight(double width) {
        return theme.px(HEIGHT);
    }

    @Override
    protected void layoutChildren() {
        double height = getHeight() - 1;
        double menuWidth = menus.prefWidth(-1);
        menus.resizeRelocate(theme.px(8), 0, menuWidth, height);
        double toolWidth = tools.prefWidth(-1);
        double toolX = getWidth() - toolWidth - theme.px(14);
        tools.resizeRelocate(toolX, 0, toolWidth, height);
        double fieldX = toolX - theme.px(FIELD_WIDTH + 8);
        field.resizeRelocate(fieldX, theme.px(8), theme.px(FIELD_WIDTH), theme.px(28));
        double from = menuWidth + theme.px(20);
        double room = fieldX - from - theme.px(12);
        double whatWidth = Math.min(room, what.prefWidth(-1));
        double centred = (getWidth() - whatWidth) / 2;
        double whatX = Math.max(from, Math.min(centred, fieldX - theme.px(12) - whatWidth));
        what.resizeRelocate(whatX, 0, whatWidth, height);
        double workRoom = fieldX - whatX - whatWidth - theme.px(24);
        double workWidth = Math.min(workRoom, atWork.prefWidth(-1));
        atWork.resizeRelocate(fieldX - theme.px(12) - Math.max(0, workWidth), 0, Math.max(0, workWidth), height);
        work.setVisible(workRoom > theme.px(60));
        stop.setVisible(workRoom > theme.px(60));
    }
}
