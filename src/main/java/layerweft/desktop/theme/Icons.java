package layerweft.desktop.theme;

import javafx.scene.shape.SVGPath;

/** The project's own icons: outlines on a field of 20 by 20, drawn as strokes with round ends. */
public final class Icons {
    public static final String PERILS = "M2 13c3-6 5 3 8-2s5 1 8-5M2 17.5h16";
    public static final String DEPENDENCE = "M7 10a5 5 0 1 1 6 0M13 10a5 5 0 1 1-6 0";
    public static final String PROGRAMME = "M3 3h14v4H3zM3 8.5h14v4H3zM3 14h9v3.5H3z";
    public static final String QUOTE = "M5 2.5h10v15H5zM8 7h4M8 10.5h4M8 14h2";
    public static final String SENSITIVITY = "M2.5 17.5v-15M2.5 17.5h15M4 14c4 0 6-9 13-10";
    public static final String STRUCTURES = "M3 17.5v-9M8 17.5v-14M13 17.5v-6M18 17.5v-11";
    public static final String EVIDENCE = "M3 17.5L17 3.5M5 13.5h.1M8 14.5h.1M9 8h.1M12.5 10h.1M14 4h.1M16.5 8h.1";
    public static final String UNDO = "M6 4L2 8l4 4M2 8h9a4 4 0 0 1 0 8H7";
    public static final String REDO = "M14 4l4 4-4 4M18 8H9a4 4 0 0 0 0 8h4";
    public static final String MOON = "M10 3a7 7 0 1 0 7 7 5.5 5.5 0 0 1-7-7z";
    public static final String SUN = "M10 6.5a3.5 3.5 0 1 0 0 7a3.5 3.5 0 1 0 0-7zM10 2v1.5M10 16.5v1.5M2 10h1.5M16.5 10h1.5"
            + "M4.3 4.3l1.1 1.1M14.6 14.6l1.1 1.1M15.7 4.3l-1.1 1.1M5.4 14.6l-1.1 1.1";
    public static final String PIN = "M3 2h10M5 2v7l-3 3h12l-3-3V2M8 12v5";
    /** The threads of the mark, upright. */
    public static final String MARK_THREADS = "M9 1v28M21 1v28";
    /** Its cool band. */
    public static final String MARK_BAND = "M1 9h28";
    /** Its warm band. */
    public static final String MARK_WARM = "M1 21h28";
    /** Where threads lie over bands. */
    public static final String MARK_OVER = "M21 4v10M9 16v10";

    private Icons() {}

    /** An outline in the colour of the text around it. */
    public static SVGPath stroked(String path) {
        SVGPath icon = new SVGPath();
        icon.setContent(path);
        icon.getStyleClass().add("lw-icon");
        return icon;
    }
}
