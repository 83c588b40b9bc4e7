package layerweft.desktop.theme;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.scene.Scene;
import javafx.scene.text.Font;

/**
 * Light or dark, and the size of all text. The tokens of the palette are looked-up colours {@code -lw-…} on {@code .root}; lengths in the
 * stylesheet are those of a text size of 100 % and are scaled with it, hairlines excepted.
 */
public final class Theme {
    public static final int SMALLEST_TEXT = 90;
    public static final int LARGEST_TEXT = 150;
    /** The family of regular and italic type. */
    public static final String FAMILY = "Source Sans 3";
    /** JavaFX keeps semi-bold type as a family of its own. */
    public static final String SEMIBOLD_FAMILY = "Source Sans 3 SemiBold";

    private static final String[] FACES = {"400Regular", "400Regular_Italic", "600SemiBold"};
    private static final Pattern LENGTH = Pattern.compile("(-?\\d+(?:\\.\\d+)?)px");
    /** Lengths up to this are lines, which do not grow with the text. */
    private static final double LINE = 2;

    private final BooleanProperty dark = new SimpleBooleanProperty();
    private final IntegerProperty textPercent = new SimpleIntegerProperty(100);
    private final ReadOnlyDoubleWrapper scale = new ReadOnlyDoubleWrapper(1);

    public Theme() {
        for (String face : FACES) {
            Font.loadFont(Theme.class.getResourceAsStream("/layerweft/fonts/SourceSans3_" + face + ".ttf"), 13);
        }
        scale.bind(textPercent.divide(100.0));
    }

    public BooleanProperty dark() {
        return dark;
    }

    /** Size of all text in percent, from {@value #SMALLEST_TEXT} to {@value #LARGEST_TEXT}. */
    public IntegerProperty textPercent() {
        return textPercent;
    }

    /** What lengths are multiplied by: 1 at a text size of 100 %. */
    public ReadOnlyDoubleProperty scale() {
        return scale.getReadOnlyProperty();
    }

    /** A length of the design at the present text size. */
    public double px(double length) {
        return length * scale.get();
    }

    /** Regular type for drawings, at the present text size. */
    public Font regular(double size) {
        return Font.font(FAMILY, px(size));
    }

    /** Semi-bold type for drawings, at the present text size. */
    public Font semibold(double size) {
        return Font.font(SEMIBOLD_FAMILY, px(size));
    }

    /** Dresses a scene, and keeps it dressed as the theme changes. */
    public void dress(Scene scene) {
        dressNow(scene);
        dark.addListener((is, was, now) -> dressNow(scene));
        textPercent.addListener((is, was, now) -> dressNow(scene));
    }

    private void dressNow(Scene scene) {
        scene.setUserAgentStylesheet(dark.get() ? new PrimerDark().getUserAgentStylesheet() : new PrimerLight().getUserAgentStylesheet());
        scene.getStylesheets().setAll(inline(text(dark.get() ? "dark.css" : "light.css")), inline(scaled(text("layerweft.css")) + scaled(text("rooms.css")) + icons()));
    }

    /** Outlines have no lengths that a stylesheet could scale. */
    private String icons() {
        return String.format(Locale.ROOT, ".lw-icon { -fx-scale-x: %.2f; -fx-scale-y: %.2f; }%n", scale.get(), scale.get());
    }

    private String scaled(String css) {
        return LENGTH.matcher(css).replaceAll(length -> {
            double value = Double.parseDouble(length.group(1));
            return Matcher.quoteReplacement(Math.abs(value) <= LINE ? length.group() : String.format(Locale.ROOT, "%.2fpx", px(value)));
        });
    }

    private static String inline(String css) {
        return "data:text/css;base64," + Base64.getEncoder().encodeToString(css.getBytes(StandardCharsets.UTF_8));
    }

    private static String text(String stylesheet) {
        try (InputStream in = Theme.class.getResourceAsStream("/layerweft/desktop/" + stylesheet)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException("reading the stylesheet " + stylesheet, e);
        }
    }
}
