/** How the window looks: colours by meaning, type, text size, light and dark. */
package layerweft.desktop.theme;
