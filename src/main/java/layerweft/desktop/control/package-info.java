/** Controls of the window that know nothing of treaties: fields, switches, figures, panels. */
package layerweft.desktop.control;
