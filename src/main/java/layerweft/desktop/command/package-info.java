/** What a user can ask of the window, declared once for menus, keys, the command field and the help. */
package layerweft.desktop.command;
