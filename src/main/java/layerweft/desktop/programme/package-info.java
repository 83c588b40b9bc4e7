/** The Programme room: the tower and the forms of layers, pricing and buyer. */
package layerweft.desktop.programme;
