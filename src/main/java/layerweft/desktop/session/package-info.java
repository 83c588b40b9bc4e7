/** What the window knows and does, without the window: the document, its price, its history. No scene types, no formulas. */
package layerweft.desktop.session;
