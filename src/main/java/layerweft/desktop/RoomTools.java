package layerweft.desktop;

import java.util.function.Consumer;
import layerweft.desktop.session.Session;
import layerweft.desktop.theme.Theme;

/**
 * What a room works with.
 *
 * @param session the document, its prices, the selection
 * @param theme text size, light and dark
 * @param goTo shows the room of a name
 * @param dialogs questions and file choosers
 */
public record RoomTools(Session session, Theme theme, Consumer<String> goTo, Dialogs dialogs) {}
