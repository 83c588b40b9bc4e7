package layerweft.desktop.picture;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.FutureTask;
import java.util.function.Function;
import javafx.application.Platform;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.TilePane;
import javax.imageio.ImageIO;
import layerweft.desktop.theme.Theme;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;

/** Draws every picture in memory, light and dark, into the folder given. Needs no display. */
final class PicturePreview {

    private PicturePreview() {}

    public static void main(String[] args) throws Exception {
        System.setProperty("glass.platform", "Monocle");
        System.setProperty("monocle.platform", "Headless");
        System.setProperty("prism.order", "sw");
        System.setProperty("prism.text", "t2k");
        System.setProperty("java.awt.headless", "true");
        Path folder = Files.createDirectories(Path.of(args[0]));
        CountDownLatch started = new CountDownLatch(1);
        Platform.startup(started::countDown);
        started.await();
        for (boolean dark : new boolean[] {false, true}) {
            all(folder, dark);
        }
        System.exit(0);
    }

    private static void all(Path folder, boolean dark) throws Exception {
        draw(folder, "tower", dark, 884, 600, 100, theme -> tower(theme, TowerExamples.five(), 3, false));
        draw(folder, "tower-log", dark, 884, 600, 100, theme -> tower(theme, TowerExamples.five(), 0, true));
        draw(folder, "tower-narrow", dark, 640, 420, 100, theme -> tower(theme, TowerExamples.five(), 1, false));
        draw(folder, "tower-odd", dark, 1100, 640, 100, theme -> tower(theme, TowerExamples.odd(), 1, false));
        draw(folder, "tower-odd-log", dark, 884, 600, 100, theme -> tower(theme, TowerExamples.odd(), 0, true));
        draw(folder, "tower-eight", dark, 884, 600, 100, theme -> tower(theme, TowerExamples.perils(8), 0, false));
        draw(folder, "tower-ten", dark, 884, 600, 100, theme -> tower(theme, TowerExamples.perils(10), 0, false));
        draw(folder, "tower-one-peril", dark, 884, 600, 100, theme -> tower(theme, TowerExamples.perils(1), 0, false));
        draw(folder, "tower-empty", dark, 884, 600, 100, theme -> tower(theme, TowerExamples.empty(), -1, false));
        draw(folder, "tower-large-text", dark, 884, 600, 130, theme -> tower(theme, TowerExamples.five(), 2, false));
        draw(folder, "tiles", dark, 660, 1000, 100, PicturePreview::tiles);
        draw(folder, "years", dark, 330, 330, 100, theme -> years(theme, "gumbel", false, 10));
        draw(folder, "years-ranks", dark, 330, 330, 100, theme -> years(theme, "clayton", true, 5));
    }

    private static Region tiles(Theme theme) {
        TilePane pane = new TilePane(10, 10);
        pane.setPrefColumns(4);
        for (double tau : new double[] {0.3, 0.8}) {
            for (CopulaFamily family : CopulaFamily.withStrength()) {
                Copula pair = family.at(tau);
                FamilyTile tile = new FamilyTile(theme, new TileRecorder());
                tile.setPrefSize(theme.px(153), theme.px(170));
                tile.show(new FamilyShape(family, family.label(), pair, pair.upperTail(0, 1), "4.62\u2009%", true, family.label().equals("gumbel"), ""));
                pane.getChildren().add(tile);
            }
        }
        CopulaFamily gumbel = CopulaFamily.parse("gumbel");
        FamilyTile tile = new FamilyTile(theme, new TileRecorder());
        tile.setPrefSize(theme.px(153), theme.px(170));
        tile.show(new FamilyShape(gumbel, "Gumbel", null, 0, "", true, false, "begins at τ 0"));
        pane.getChildren().add(tile);
        return pane;
    }

    private static Region years(Theme theme, String family, boolean ranks, double corner) {
        JointYearsPicture picture = new JointYearsPicture(theme);
        picture.ranks().set(ranks);
        picture.show(JointYears.drawn("Windstorm", "River flood", CopulaFamily.parse(family).at(0.3), 20_000, 1));
        picture.corner().set(corner);
        return picture;
    }

    private static Region tower(Theme theme, Tower tower, int selected, boolean log) {
        TowerPicture picture = new TowerPicture(theme, new TowerRecorder());
        picture.logarithmic().set(log);
        picture.show(tower, selected);
        return picture;
    }

    static void draw(Path folder, String name, boolean dark, int width, int height, int textPercent, Function<Theme, Region> make) throws Exception {
        FutureTask<WritableImage> drawing = new FutureTask<>((Callable<WritableImage>) () -> {
            Theme theme = new Theme();
            theme.dark().set(dark);
            theme.textPercent().set(textPercent);
            StackPane ground = new StackPane(make.apply(theme));
            ground.setStyle("-fx-background-color: -lw-surface; -fx-padding: 16;");
            Scene scene = new Scene(ground, width + 32, height + 32);
            theme.dress(scene);
            return scene.snapshot(null);
        });
        Platform.runLater(drawing);
        try {
            ImageIO.write(SwingFXUtils.fromFXImage(drawing.get(), null), "png", folder.resolve(name + (dark ? "-dark" : "-light") + ".png").toFile());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
