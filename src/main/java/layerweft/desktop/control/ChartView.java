package layerweft.desktop.control;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.awt.image.DataBufferInt;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.util.List;
import java.util.Locale;
import java.util.function.Supplier;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Alert;
import javafx.scene.control.ContextMenu;
import javafx.scene.control.MenuItem;
import javafx.scene.image.Image;
import javafx.scene.image.ImageView;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.Region;
import javafx.stage.FileChooser;
import layerweft.desktop.theme.Theme;
import layerweft.report.chart.ChartExport;
import layerweft.report.chart.ChartPicture;
import layerweft.report.chart.Palette;

/** A chart in the window, as large as there is room; it can be copied as numbers and as a picture, and saved as PNG and SVG. */
public final class ChartView extends Region {
    private static final double EXPORT_WIDTH = 960;
    private static final double EXPORT_HEIGHT = 600;
    private static final double EXPORT_SCALE = 2;

    private final Theme theme;
    private final ObjectProperty<ChartPicture> picture = new SimpleObjectProperty<>();
    private final ImageView view = new ImageView();
    private Supplier<ChartExport.Caption> caption = () -> new ChartExport.Caption(picture.get().title(), "", List.of());

    public ChartView(Theme theme) {
        this.theme = theme;
        getStyleClass().add("lw-chart");
        setMinSize(60, 40);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setFocusTraversable(true);
        getChildren().add(view);
        picture.addListener((is, was, now) -> {
            setAccessibleText(now == null ? "" : now.title());
            requestLayout();
        });
        theme.dark().addListener((is, was, now) -> requestLayout());
        theme.textPercent().addListener((is, was, now) -> requestLayout());
        ContextMenu menu = menu();
        setOnContextMenuRequested(asked -> menu.show(this, asked.getScreenX(), asked.getScreenY()));
        setOnMousePressed(pressed -> {
            menu.hide();
            requestFocus();
        });
        setOnKeyPressed(key -> {
            if (key.getCode() == KeyCode.C && key.isShortcutDown()) {
                copyNumbers();
                key.consume();
            }
        });
    }

    /** The chart; null for none. */
    public ObjectProperty<ChartPicture> picture() {
        return picture;
    }

    /** What stands around an exported picture. */
    public ChartView captioned(Supplier<ChartExport.Caption> words) {
        caption = words;
        return this;
    }

    @Override
    protected void layoutChildren() {
        double width = snapSizeX(getWidth());
        double height = snapSizeY(getHeight());
        view.setImage(picture.get() == null || width < 1 || height < 1 ? null : drawn(width, height));
        view.setFitWidth(width);
        view.setFitHeight(height);
    }

    private Image drawn(double width, double height) {
        double pixels = getScene() == null || getScene().getWindow() == null ? 1 : Math.max(1, getScene().getWindow().getOutputScaleX());
        BufferedImage image = new BufferedImage((int) Math.round(width * pixels), (int) Math.round(height * pixels), BufferedImage.TYPE_INT_ARGB_PRE);
        Graphics2D g = image.createGraphics();
        double size = pixels * theme.scale().get();
        g.scale(size, size);
        picture.get().draw(g, new Rectangle2D.Double(0, 0, image.getWidth() / size, image.getHeight() / size), theme.dark().get() ? Palette.DARK : Palette.LIGHT);
        g.dispose();
        WritableImage shown = new WritableImage(image.getWidth(), image.getHeight());
        shown.getPixelWriter().setPixels(0, 0, image.getWidth(), image.getHeight(), PixelFormat.getIntArgbPreInstance(),
                ((DataBufferInt) image.getRaster().getDataBuffer()).getData(), 0, image.getWidth());
        return shown;
    }

    private ContextMenu menu() {
        MenuItem numbers = new MenuItem("Copy numbers");
        numbers.setOnAction(chosen -> copyNumbers());
        MenuItem copy = new MenuItem("Copy picture");
        copy.setOnAction(chosen -> copyPicture());
        MenuItem png = new MenuItem("Save as PNG…");
        png.setOnAction(chosen -> save("PNG picture", "png"));
        MenuItem svg = new MenuItem("Save as SVG…");
        svg.setOnAction(chosen -> save("SVG picture", "svg"));
        return new ContextMenu(numbers, copy, png, svg);
    }

    /** Puts the numbers of the chart on the clipboard, tab-separated. */
    public void copyNumbers() {
        if (picture.get() != null) {
            ClipboardContent content = new ClipboardContent();
            content.putString(picture.get().table().tabSeparated());
            Clipboard.getSystemClipboard().setContent(content);
        }
    }

    private void copyPicture() {
        ClipboardContent content = new ClipboardContent();
        content.putImage(SwingFXUtils.toFXImage(SwingFXUtils.fromFXImage(view.getImage(), null), null));
        Clipboard.getSystemClipboard().setContent(content);
    }

    private void save(String kind, String ending) {
        FileChooser chooser = new FileChooser();
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter(kind, "*." + ending));
        chooser.setInitialFileName(picture.get().title().replaceAll("[^\\p{L}\\p{N}]+", "-").toLowerCase(Locale.ROOT) + "." + ending);
        File file = chooser.showSaveDialog(getScene().getWindow());
        if (file != null) {
            write(file);
        }
    }

    /** Writes the chart to a file: SVG where its name ends so, PNG otherwise. A failure is said in a dialog. */
    public void write(File file) {
        try {
            if (file.getName().endsWith(".svg")) {
                Files.writeString(file.toPath(), ChartExport.svg(picture.get(), caption.get(), EXPORT_WIDTH, EXPORT_HEIGHT));
            } else {
                Files.write(file.toPath(), ChartExport.png(picture.get(), caption.get(), EXPORT_WIDTH, EXPORT_HEIGHT, EXPORT_SCALE));
            }
        } catch (IOException e) {
            new Alert(Alert.AlertType.ERROR, "The picture could not be written to " + file + ": " + e.getMessage()).show();
        }
    }
}
