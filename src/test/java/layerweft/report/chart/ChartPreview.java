package layerweft.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import javax.imageio.ImageIO;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.FigureText;
import layerweft.file.DemoFiles;
import layerweft.model.treaty.Treaty;
import layerweft.study.EventsAbove;
import layerweft.study.ExceedanceCurves;
import layerweft.study.FigureKind;
import layerweft.study.LayerSweep;
import layerweft.study.Ranking;
import layerweft.study.Sensitivity;
import layerweft.study.Sweep;
import layerweft.study.SweepPoint;
import layerweft.study.SweepRequest;

/** Draws every chart of the demo into a folder, in light and dark: for looking at. */
public final class ChartPreview {
    private static final SimulationSettings SETTINGS = new SimulationSettings(200_000, 1, 2);

    private ChartPreview() {}

    public static void main(String[] args) throws IOException {
        Path folder = Files.createDirectories(Path.of(args[0]));
        for (var entry : charts().entrySet()) {
            for (boolean dark : new boolean[] {false, true}) {
                BufferedImage image = new BufferedImage(entry.getValue().width, entry.getValue().height, BufferedImage.TYPE_INT_RGB);
                Graphics2D g = image.createGraphics();
                Palette palette = dark ? Palette.DARK : Palette.LIGHT;
                g.setColor(palette.surface());
                g.fillRect(0, 0, image.getWidth(), image.getHeight());
                entry.getValue().picture.draw(g, new Rectangle2D.Double(12, 12, image.getWidth() - 24, image.getHeight() - 24), palette);
                ImageIO.write(image, "png", folder.resolve(entry.getKey() + (dark ? "-dark" : "-light") + ".png").toFile());
            }
            ChartExport.Caption caption = new ChartExport.Caption(entry.getValue().picture.title(), "What it says in a sentence.", List.of("demo", "seed 1"));
            Files.write(folder.resolve(entry.getKey() + "-export.png"), ChartExport.png(entry.getValue().picture, caption, 900, 560, 1));
            Files.writeString(folder.resolve(entry.getKey() + ".svg"), ChartExport.svg(entry.getValue().picture, caption, 900, 560));
        }
    }

    private record Sized(ChartPicture picture, int width, int height) {}

    private static Map<String, Sized> charts() {
        Map<String, Sized> charts = new LinkedHashMap<>();
        Treaty demo = DemoFiles.treaty();
        ExceedanceCurves curves = ExceedanceCurves.of(demo, SETTINGS, RunControl.NONE);
        charts.put("exceedance", new Sized(new ExceedanceChart("Exceedance", "loss, EUR million", List.of(
                new ExceedanceChart.Line("Year total", "gross", true, false, curves.gross().total()),
                new ExceedanceChart.Line("Largest event", "gross", true, true, curves.gross().largestEvent()),
                new ExceedanceChart.Line("Year total", "net", false, false, curves.net().total()),
                new ExceedanceChart.Line("Largest event", "net", false, true, curves.net().largestEvent())), 100), 760, 440));
        List<EventsAboveChart.Peril> perils = demo.portfolio().perils().stream()
                .map(p -> new EventsAboveChart.Peril(p.name(), EventsAbove.of(p).orElse((DoubleUnaryOperator) null))).toList();
        charts.put("events", new Sized(new EventsAboveChart(perils, 0, 1, 1000), 310, 190));
        SweepRequest request = new SweepRequest(SweepRequest.USUAL_FAMILIES, List.of(0.0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95), FigureKind.LOSS_ON_LINE, 0);
        LayerSweep layer = Sweep.of(demo, request, SETTINGS, RunControl.NONE).layers().get(2);
        List<SensitivityChart.Line> lines = new ArrayList<>();
        for (var family : SweepRequest.USUAL_FAMILIES) {
            List<SweepPoint> points = layer.of(family);
            lines.add(new SensitivityChart.Line(family, family.label(), family.at(0.5).upperTail(0, 1) > 0, family.label().equals("gumbel"),
                    points.stream().map(SweepPoint::kendallTau).toList(), points.stream().map(p -> 100 * p.value().value()).toList()));
        }
        charts.put("sensitivity", new Sized(new SensitivityChart("Loss on line of Aggregate cover against τ", "%", lines, 0.3, 8.26, "8.26 %",
                100 * layer.independent().lossOnLine().value(), 100 * layer.comonotone().lossOnLine().value(),
                List.of(new SensitivityChart.Check(0.2, 7.2, 0.08), new SensitivityChart.Check(0.6, 10.4, 0.1)), 0.12, 0.47,
                new SensitivityChart.Pinned(0.15, 6.7, "6.70"), Double.NaN, Double.NaN), 700, 400));
        charts.put("build-up", new Sized(new BuildUpChart("From expected loss to upfront premium", List.of(
                new BuildUpChart.Step("Expected layer loss", "E[Y]", BuildUpChart.Kind.LOSS, 0, 7.87, "7.87", true),
                new BuildUpChart.Step("Loading", "0.25 × standard deviation 14.55", BuildUpChart.Kind.PART, 7.87, 11.51, "+3.64", false),
                new BuildUpChart.Step("Brokerage", "10 % of gross", BuildUpChart.Kind.PART, 11.51, 12.86, "+1.35", false),
                new BuildUpChart.Step("Expenses", "5 % of gross", BuildUpChart.Kind.PART, 12.86, 13.54, "+0.68", false),
                new BuildUpChart.Step("Gross, over the year", "net ÷ (1 − 0.15)", BuildUpChart.Kind.TOTAL, 0, 13.54, "13.54", true),
                new BuildUpChart.Step("Reinstatement premiums", "expected; paid-up factor 1.258", BuildUpChart.Kind.EXPECTED, 13.54, 10.76, "−2.78", false),
                new BuildUpChart.Step("Technical upfront premium", "13.54 ÷ 1.258", BuildUpChart.Kind.PREMIUM, 0, 10.76, "10.76", true),
                new BuildUpChart.Step("Quoted premium", "rate on line 35.0 %", BuildUpChart.Kind.QUOTED, 0, 10.5, "10.50", true))), 540, 400));
        Ranking ranking = Ranking.of(demo, Optional.of("Aggregate cover"), FigureKind.LOSS_ON_LINE, SETTINGS, RunControl.NONE);
        List<RankingChart.Bar> bars = new ArrayList<>();
        for (Sensitivity s : ranking.sensitivities()) {
            double a = 100 * ranking.base().value();
            double b = 100 * s.value().value();
            int peril = demo.portfolio().indexOf(s.subject());
            bars.add(new RankingChart.Bar((s.subject() + " " + s.lever().words()).strip(), s.step(), peril >= 0 ? peril : -1, Math.min(a, b), Math.max(a, b),
                    FigureText.value(s.value().times(100)), ""));
        }
        charts.put("ranking", new Sized(new RankingChart("What moves the price most", 100 * ranking.base().value(), "8.26 %", bars), 400, 620));
        return charts;
    }
}
