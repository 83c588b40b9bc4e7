package layerweft.desktop;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import javafx.application.Platform;
import javafx.embed.swing.SwingFXUtils;
import javafx.geometry.Insets;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javafx.scene.layout.HBox;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.stage.Stage;
import javax.imageio.ImageIO;
import layerweft.desktop.control.AmountField;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.control.FigureLabel;
import layerweft.desktop.control.Panel;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.session.Background;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.LayerEdit;
import layerweft.desktop.session.Session;
import layerweft.desktop.theme.Theme;

/**
 * Draws the window in memory, every room, light and dark, in three sizes, and writes the pictures to a folder:
 * {@code Screenshots FOLDER [ROOM…]}. Needs no display.
 */
final class Screenshots {
    private static final int[][] SIZES = {{1280, 800}, {1440, 900}, {1920, 1080}};
    /** How long prices and curves may take. */
    private static final long PATIENCE = 20_000;

    private Screenshots() {}

    public static void main(String[] args) throws Exception {
        System.setProperty("glass.platform", "Monocle");
        System.setProperty("monocle.platform", "Headless");
        System.setProperty("headless.geometry", "2000x1300-32");
        System.setProperty("prism.order", "sw");
        System.setProperty("prism.text", "t2k");
        System.setProperty("java.awt.headless", "true");
        Path folder = Files.createDirectories(Path.of(args[0]));
        List<String> rooms = args.length > 1 ? List.of(args).subList(1, args.length)
                : Rooms.all().stream().filter(place -> place.reason().isEmpty()).map(Rooms.Place::name).toList();
        CountDownLatch started = new CountDownLatch(1);
        Platform.startup(started::countDown);
        started.await();
        DesktopWindow last = null;
        for (int[] size : SIZES) {
            last = rooms(size[0], size[1], rooms, folder);
        }
        variants(last, folder);
        DesktopWindow least = open(1180, 720);
        settle(least.session());
        picture(least, folder.resolve("least-window.png"));
        controls(folder, false);
        controls(folder, true);
        System.exit(0);
    }

    /** A new window for each size: one that is resized in memory may be drawn in a buffer that is too small. */
    private static DesktopWindow open(int width, int height) throws Exception {
        Path preferences = Files.createTempDirectory("layerweft-screenshots");
        Files.writeString(preferences.resolve("window.properties"), "width=" + width + "\nheight=" + height + "\n");
        return onWindow(() -> {
            DesktopWindow made = new DesktopWindow(new Stage(), preferences, Background.ofWindow());
            made.show();
            return made;
        });
    }

    private static DesktopWindow rooms(int width, int height, List<String> rooms, Path folder) throws Exception {
        DesktopWindow window = open(width, height);
        Session session = window.session();
        settle(session);
        onWindow(() -> {
            session.setTau(0.15, null);
            return null;
        });
        settle(session);
        onWindow(() -> {
            session.pin();
            session.setTau(0.3, null);
            return null;
        });
        settle(session);
        for (boolean dark : new boolean[] {false, true}) {
            for (String room : rooms) {
                onWindow(() -> {
                    window.theme().dark().set(dark);
                    window.frame().goTo(room);
                    return null;
                });
                settle(session);
                Thread.sleep(400);
                picture(window, folder.resolve(String.format(Locale.ROOT, "%s-%d-%s.png", room.toLowerCase(Locale.ROOT), width, dark ? "dark" : "light")));
            }
        }
        return window;
    }

    /** States of the strip that the rooms do not show: many layers, pairs that differ, faults, large text. */
    private static void variants(DesktopWindow window, Path folder) throws Exception {
        Session session = window.session();
        Document demo = Document.demo();
        variant(window, folder, "strip-twelve-layers", () -> {
            window.theme().dark().set(false);
            for (int k = 0; k < 9; k++) {
                session.edit("copy", d -> d.withProgramme(p -> LayerEdit.duplicated(p, 2)));
            }
        });
        variant(window, folder, "strip-matrix", () -> {
            session.open(demo);
            session.edit("matrix", d -> d.withPortfolio(p -> p.set("dependence.copula", Map.of("family", "gaussian", "correlation",
                    List.of(List.of(1.0, 0.6, 0.2), List.of(0.6, 1.0, 0.4), List.of(0.2, 0.4, 1.0))))));
        });
        variant(window, folder, "strip-independent", () -> {
            session.open(demo);
            session.edit("no dependence", d -> d.withPortfolio(p -> p.remove("dependence")));
        });
        variant(window, folder, "strip-two-perils-negative", () -> {
            session.open(demo);
            session.edit("two perils", d -> d.withPortfolio(p -> p.remove("perils[2]").set("dependence.copula",
                    Map.of("family", "frank", "kendallTau", -0.25))).withProgramme(p -> p.remove("layers[2].perils")));
        });
        variant(window, folder, "strip-demo", () -> session.open(demo));
        variant(window, folder, "strip-fault", () -> session.edit("limit", d -> d.withProgramme(p -> p.set("layers[0].occurrence.limit", -5))));
        variant(window, folder, "strip-inuring", () -> session.open(new Document(Document.demo("demo-portfolios/harrow-coast.json"),
                Document.demo("treaties/harrow-coast-inuring.json"), null, null)));
        variant(window, folder, "strip-large-text", () -> {
            session.open(demo);
            window.theme().textPercent().set(130);
        });
    }

    /** Fields, switches and figures in all their states. */
    private static void controls(Path folder, boolean dark) throws Exception {
        WritableImage image = onWindow(() -> {
            AmountField changed = new AmountField("Changed since pin", AmountText.Kind.AMOUNT, "million");
            changed.value().set(35.0);
            changed.changedFrom().set("30");
            AmountField missing = new AmountField("Not available here", AmountText.Kind.AMOUNT, "million");
            missing.reason().set("needs an occurrence limit");
            AmountField wrong = new AmountField("Limit", AmountText.Kind.AMOUNT, "million");
            wrong.value().set(-5.0);
            wrong.fault().set("Limit must be more than 0. The last valid limit, 30, still prices the layer.");
            AmountField part = new AmountField("Share", AmountText.Kind.PART, "million");
            part.value().set(0.85);
            AmountField blank = new AmountField("Annual limit", AmountText.Kind.AMOUNT, "million").orBlank("no limit");
            FigureLabel figure = new FigureLabel("lw-figure-26");
            figure.show("14.87", "%", "± 0.03, 1,000,000 years");
            FigureLabel old = new FigureLabel("lw-figure-26");
            old.show("26.24", "%", "last valid");
            old.lastValid().set(true);
            SegmentedSwitch<String> segments = new SegmentedSwitch<>(List.of("Families", "All dependence"), name -> name);
            Panel panel = new Panel("A panel", new VBox(12, new HBox(16, changed, missing, part, blank), wrong, new HBox(40, figure, old)))
                    .withControls(segments);
            panel.note().set("EUR million");
            StackPane ground = new StackPane(panel);
            ground.getStyleClass().add("lw-frame");
            ground.setPadding(new Insets(20));
            Scene scene = new Scene(ground, 820, 330);
            Theme theme = new Theme();
            theme.dark().set(dark);
            theme.dress(scene);
            return scene.snapshot(null);
        });
        ImageIO.write(SwingFXUtils.fromFXImage(image, null), "png", folder.resolve(dark ? "controls-dark.png" : "controls-light.png").toFile());
    }

    private static void variant(DesktopWindow window, Path folder, String name, Runnable set) throws Exception {
        onWindow(() -> {
            set.run();
            return null;
        });
        settle(window.session());
        Thread.sleep(400);
        picture(window, folder.resolve(name + ".png"));
    }

    private static void settle(Session session) throws Exception {
        long end = System.currentTimeMillis() + PATIENCE;
        while (System.currentTimeMillis() < end && !onWindow(() -> session.background().running().isEmpty())) {
            Thread.sleep(50);
        }
    }

    private static void picture(DesktopWindow window, Path file) throws Exception {
        WritableImage image = onWindow(() -> window.frame().getScene().snapshot(null));
        BufferedImage picture = SwingFXUtils.fromFXImage(image, null);
        try {
            ImageIO.write(picture, "png", file.toFile());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static <T> T onWindow(Callable<T> what) throws InterruptedException, ExecutionException {
        FutureTask<T> task = new FutureTask<>(what);
        Platform.runLater(task);
        return task.get();
    }
}
