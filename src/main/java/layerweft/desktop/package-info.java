/** The window: frame, rail, strip, rooms and commands. */
package layerweft.desktop;
