/** The Dependence room: families, joint years, bad years together, pairs and groups. */
package layerweft.desktop.dependence;
