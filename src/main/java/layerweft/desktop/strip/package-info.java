/** The strip at the bottom of the window: the τ control and a cell for each layer. */
package layerweft.desktop.strip;
