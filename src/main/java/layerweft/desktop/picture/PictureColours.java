package layerweft.desktop.picture;

import java.util.List;
import javafx.scene.paint.Color;
import layerweft.model.copula.CopulaFamily;
import layerweft.report.chart.Palette;

/** The palette as JavaFX colours, for drawings that no stylesheet reaches. */
record PictureColours(Palette palette, Color surface, Color sunken, Color ink, Color ink2, Color line, Color grid, Color edge, Color accent, Color accentGround,
        Color tau, Color tauGround, List<Color> perils) {

    static final PictureColours LIGHT = of(Palette.LIGHT);
    static final PictureColours DARK = of(Palette.DARK);

    private static PictureColours of(Palette p) {
        return new PictureColours(p, fx(p.surface()), fx(p.sunken()), fx(p.ink()), fx(p.ink2()), fx(p.line()), fx(p.grid()), fx(p.edge()), fx(p.accent()),
                fx(p.accentGround()), fx(p.tau()), fx(p.tauGround()), p.categories().stream().map(PictureColours::fx).toList());
    }

    private static Color fx(java.awt.Color c) {
        return Color.rgb(c.getRed(), c.getGreen(), c.getBlue());
    }

    /** The colour of the peril at a position in the file. */
    Color peril(int position) {
        return perils.get(position % perils.size());
    }

    Color family(CopulaFamily family) {
        return fx(palette.family(family));
    }

    /** The step of a loss on line, given as a part. */
    Color lossOnLine(double part) {
        return fx(palette.lossOnLine(part));
    }

    List<Color> steps() {
        return palette.steps().stream().map(PictureColours::fx).toList();
    }

    /** Dark or white, whichever stands out more on a colour. */
    static Color textOn(Color ground) {
        return fx(Palette.textOn(new java.awt.Color((float) ground.getRed(), (float) ground.getGreen(), (float) ground.getBlue())));
    }
}
