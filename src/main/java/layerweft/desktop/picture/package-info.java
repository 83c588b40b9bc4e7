/** The project's own drawings: controls with plain inputs, which know nothing of the session. Lengths are those of a text size of 100 %. */
package layerweft.desktop.picture;
