package layerweft.desktop;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import layerweft.desktop.command.Command;
import layerweft.desktop.command.CommandField;
import layerweft.desktop.session.Session;
import layerweft.desktop.strip.Strip;
import layerweft.desktop.theme.Theme;

/** All of the window: rail, header, the room with its title line, and the strip. */
public final class Frame extends Region {
    private static final double RAIL = 76;
    private static final double HEADER = 44;
    private static final double STRIP = 128;
    private static final double LEFT = 20;
    private static final double RIGHT = 20;
    private static final double TITLE_TOP = 44;
    private static final double ROOM_TOP = 100;
    private static final double ROOM_BOTTOM = 12;
    private static final double NOTICE = 24;

    private final Theme theme;
    private final RoomTools tools;
    private final List<Rooms.Place> places;
    private final Map<String, Room> rooms = new HashMap<>();
    private final Rail rail;
    private final Header header;
    private final TitleLine title;
    private final StackPane area = new StackPane();
    private final Label notice = new Label();
    private final Strip strip;
    private final ReadOnlyObjectWrapper<Room> room = new ReadOnlyObjectWrapper<>();
    private final StringProperty hint = new SimpleStringProperty("");

    public Frame(Session session, Theme theme, Dialogs dialogs, Commands commands) {
        this.theme = theme;
        this.tools = new RoomTools(session, theme, this::goTo, dialogs);
        this.places = Rooms.all();
        this.rail = new Rail(places, this::goTo);
        CommandField field = new CommandField(() -> allCommands(commands));
        commands.onFind(field::ask);
        commands.onGoTo(this::goTo);
        this.header = new Header(session, theme, commands.menus(), field, commands.undo(), commands.redo(), commands.lightOrDark());
        this.title = new TitleLine(theme);
        this.strip = new Strip(session, theme);
        getStyleClass().add("lw-frame");
        area.getStyleClass().add("lw-room");
        area.setId("room");
        notice.getStyleClass().add("lw-notice");
        notice.setId("notice");
        notice.textProperty().bind(hint);
        notice.visibleProperty().bind(hint.isNotEmpty());
        hint.addListener((is, was, now) -> requestLayout());
        session.background().failed().addListener((is, was, now) -> hint.set(now.name() + " failed: " + now.failure().getMessage()
                + ". This is a fault of the program, not of your file."));
        // in the order in which the keyboard goes through them
        getChildren().addAll(title, area, notice, strip, rail, header);
        theme.scale().addListener((is, was, now) -> requestLayout());
    }

    private List<Command> allCommands(Commands commands) {
        List<Command> all = new ArrayList<>(room.get() == null ? List.of() : room.get().commands());
        all.addAll(commands.all());
        return all;
    }

    /** Shows the room of a name, the first start's where that cannot be entered. */
    void open(String name) {
        goTo(name);
        if (room.get() == null) {
            goTo(Rooms.FIRST);
        }
    }

    /** Shows the room of a name; nothing happens where there is none, or it cannot be entered. */
    public void goTo(String name) {
        places.stream().filter(place -> place.name().equals(name) && place.reason().isEmpty()).findFirst().ifPresent(place -> {
            Room next = rooms.computeIfAbsent(name, made -> place.make().apply(tools));
            if (room.get() != null) {
                room.get().left();
            }
            room.set(next);
            rail.here(name);
            title.show(next);
            area.getChildren().setAll(next.view());
            next.entered();
        });
    }

    /** The room in view. */
    public ReadOnlyObjectProperty<Room> room() {
        return room.getReadOnlyProperty();
    }

    /** One line above the strip; empty for none. */
    public StringProperty hint() {
        return hint;
    }

    public Strip strip() {
        return strip;
    }

    @Override
    protected void layoutChildren() {
        double rail = theme.px(RAIL);
        double stripHeight = theme.px(STRIP);
        double stripTop = getHeight() - stripHeight;
        this.rail.resizeRelocate(0, 0, rail, stripTop);
        header.resizeRelocate(rail, 0, getWidth() - rail, theme.px(HEADER));
        double left = rail + theme.px(LEFT);
        double width = getWidth() - left - theme.px(RIGHT);
        double roomTop = theme.px(ROOM_TOP);
        title.resizeRelocate(left, theme.px(TITLE_TOP), width, roomTop - theme.px(TITLE_TOP));
        double noticeHeight = notice.isVisible() ? theme.px(NOTICE) : 0;
        double roomBottom = stripTop - theme.px(ROOM_BOTTOM) - noticeHeight;
        area.resizeRelocate(left, roomTop, width, Math.max(0, roomBottom - roomTop));
        notice.resizeRelocate(left, stripTop - noticeHeight - theme.px(4), notice.prefWidth(-1), noticeHeight);
        strip.resizeRelocate(0, stripTop, getWidth(), stripHeight);
    }
}
