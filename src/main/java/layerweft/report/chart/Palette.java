package layerweft.report.chart;

import java.awt.Color;
import java.util.Arrays;
import java.util.List;
import layerweft.model.copula.CopulaFamily;

/**
 * Colours by meaning, in light and dark. The warm one, {@code tau}, means "because of dependence" and nothing else.
 *
 * @param canvas the window's ground
 * @param surface a panel
 * @param sunken the ground of a plot
 * @param ink figures and text
 * @param ink2 labels and notes
 * @param categories eight colours that stay apart for colour-blind readers: perils in the order of the file, families each their own
 * @param steps eight steps of loss on line, dear ones far from the ground
 */
public record Palette(Color canvas, Color surface, Color sunken, Color ink, Color ink2, Color line, Color grid, Color edge, Color accent, Color accentGround,
        Color tau, Color tauGround, List<Color> categories, List<Color> steps) {

    /** Edges of the steps of loss on line, as parts. */
    public static final List<Double> STEP_EDGES = List.of(0.002, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2);

    public static final Palette LIGHT = new Palette(rgb(0xEDF1F1), rgb(0xFFFFFF), rgb(0xF5F8F8), rgb(0x16232A), rgb(0x51626B), rgb(0xD5DDDE), rgb(0xE6ECEC),
            rgb(0x7F9097), rgb(0x1D5C86), rgb(0xE2EDF4), rgb(0xC2410C), rgb(0xFDF0E8),
            all(0x1659B5, 0x2E7C5F, 0x9E904C, 0x893C6B, 0x3D006F, 0x449CCC, 0x511903, 0x75838A),
            all(0xEAF3F0, 0xCFE5E0, 0xAFD5D1, 0x88C0C2, 0x5FA5B0, 0x33758F, 0x235477, 0x1A365A));

    public static final Palette DARK = new Palette(rgb(0x10171B), rgb(0x182126), rgb(0x141C20), rgb(0xE6EDEF), rgb(0xA6B5BB), rgb(0x2C3940), rgb(0x243037),
            rgb(0x64757D), rgb(0x7FB9DE), rgb(0x1F3442), rgb(0xFF9166), rgb(0x2F241F),
            all(0x719AD6, 0x6BCCA4, 0xFAD56D, 0xB66086, 0x795EC9, 0xAAEAFE, 0x876954, 0xA3AEB9),
            all(0x1E2E35, 0x23414B, 0x2A5763, 0x33707C, 0x5BA3A8, 0x7FC0BE, 0xA9DAD2, 0xD6F2E8));

    private static final Color DARK_TEXT = rgb(0x101A1F);

    public Palette {
        categories = List.copyOf(categories);
        steps = List.copyOf(steps);
    }

    private static Color rgb(int rgb) {
        return new Color(rgb);
    }

    private static List<Color> all(int... colours) {
        return Arrays.stream(colours).mapToObj(Color::new).toList();
    }

    /** The colour of the peril at a position in the file. */
    public Color peril(int position) {
        return categories.get(position % categories.size());
    }

    /** The colour of a family; ink where it has no strength. */
    public Color family(CopulaFamily family) {
        return switch (family.kind()) {
            case GUMBEL -> categories.get(0);
            case STUDENT -> categories.get(1);
            case FRANK -> categories.get(2);
            case CLAYTON -> categories.get(family.survival() ? 3 : 6);
            case JOE -> categories.get(4);
            case GAUSSIAN -> categories.get(5);
            case INDEPENDENCE, COMONOTONIC, COUNTERMONOTONIC -> ink;
        };
    }

    /** The step of a loss on line, given as a part. */
    public Color lossOnLine(double part) {
        int step = 0;
        while (step < STEP_EDGES.size() && part >= STEP_EDGES.get(step)) {
            step++;
        }
        return steps.get(step);
    }

    /** Dark or white, whichever stands out more on a colour. */
    public static Color textOn(Color ground) {
        return contrast(ground, DARK_TEXT) >= contrast(ground, Color.WHITE) ? DARK_TEXT : Color.WHITE;
    }

    /** Contrast ratio of two colours, 1 to 21 (W3C, Web Content Accessibility Guidelines 2.1, "contrast ratio"). */
    public static double contrast(Color a, Color b) {
        double x = luminance(a);
        double y = luminance(b);
        return (Math.max(x, y) + 0.05) / (Math.min(x, y) + 0.05);
    }

    private static double luminance(Color c) {
        return 0.2126 * linear(c.getRed()) + 0.7152 * linear(c.getGreen()) + 0.0722 * linear(c.getBlue());
    }

    private static double linear(int channel) {
        double c = channel / 255.0;
        return c <= 0.03928 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }
}
