package layerweft.command;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.DoubleSummaryStatistics;
import java.util.List;
import java.util.Locale;
import java.util.stream.DoubleStream;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Portfolio;
import layerweft.study.FigureKind;
import layerweft.study.LayerSweep;
import layerweft.study.Sweep;
import layerweft.study.SweepPoint;

/** A sweep as text: for each layer that moves a table of families and τ with a chart, for the others a sentence. */
final class SweepText {
    private static final double HARDLY = 0.0005;

    private final Sweep sweep;
    private final FigureKind kind;
    private final StringBuilder text = new StringBuilder();

    private SweepText(Sweep sweep) {
        this.sweep = sweep;
        this.kind = sweep.request().figure();
    }

    static String of(Sweep sweep) {
        return new SweepText(sweep).write();
    }

    private String write() {
        Portfolio portfolio = sweep.treaty().portfolio();
        line(portfolio.name() + ": " + sweep.treaty().programme().name());
        String linked = portfolio.dependence().links() == Dependence.Links.COUNTS ? "Annual counts" : "Annual totals";
        line(FigureKindText.capital(FigureKindText.title(kind, portfolio)) + ". "
                + linked + " of the perils joined by each family at the same Kendall's τ.");
        if (sweep.layers().stream().anyMatch(layer -> !layer.refusals().isEmpty())) {
            line(String.format(Locale.ROOT, "Simulated layers: %,d years, seed %d, the same random numbers at every point.",
                    sweep.settings().years(), sweep.settings().seed()));
        }
        if (sweep.request().check() > 0) {
            line(String.format(Locale.ROOT, "Beside each point: %,d simulated years, seed %d.", sweep.request().check(), sweep.settings().seed()));
        }
        for (LayerSweep layer : sweep.layers()) {
            if (layer.still().isEmpty() && !hardly(layer)) {
                moving(layer);
            }
        }
        resting();
        return text.toString();
    }

    private void moving(LayerSweep layer) {
        text.append('\n').append(layer.name()).append('\n');
        table(layer);
        text.append('\n').append(chart(layer));
        line("Independent " + FigureKindText.value(kind, kind.of(layer.independent())) + ", comonotonic "
                + FigureKindText.value(kind, layer.comonotoneValue()) + " (" + FigureKindText.lift(layer.comonotoneLift()) + ").");
        Comparator<SweepPoint> bySlope = Comparator.comparingDouble(p -> Math.abs(p.slope().value()));
        layer.points().stream().filter(p -> Math.abs(p.slope().value()) > p.slope().error()).max(bySlope).ifPresent(p -> line("Steepest with "
                + p.family().label()
                + " at τ " + FigureText.plain(p.kendallTau()) + ": " + FigureKindText.change(kind, p.slope().times(0.1)) + " for 0.1 of τ."));
        layer.spreads().stream().filter(s -> s.width().defined()).max(Comparator.comparingDouble(s -> s.width().value()))
                .filter(s -> s.width().value() > 0 && sweep.request().families().size() > 1)
                .ifPresent(s -> line("Families are furthest apart at τ " + FigureText.plain(s.kendallTau()) + ": "
                        + s.lowestFamily().label() + " " + FigureKindText.value(kind, s.lowest()) + ", " + s.highestFamily().label() + " "
                        + FigureKindText.value(kind, s.highest()) + "."));
        layer.refusals().forEach(reason -> line("Simulated, because " + reason + "; largest standard error "
                + FigureKindText.error(kind, largestError(layer)) + "."));
    }

    private void table(LayerSweep layer) {
        List<String> header = new ArrayList<>(List.of("τ"));
        for (CopulaFamily family : sweep.request().families()) {
            header.add(family.label());
            if (sweep.request().check() > 0) {
                header.addAll(List.of("simulated", ""));
            }
        }
        TextTable table = new TextTable(header.toArray(String[]::new));
        for (double tau : sweep.request().taus()) {
            List<String> cells = new ArrayList<>(List.of(FigureText.plain(tau)));
            layer.points().stream().filter(p -> p.kendallTau() == tau).forEach(p -> {
                cells.add(FigureKindText.value(kind, p.value()));
                if (p.check() != null) {
                    cells.add(FigureKindText.value(kind, kind.of(p.check())));
                    cells.add(FigureKindText.error(kind, kind.of(p.check())));
                }
            });
            table.row(cells.toArray(String[]::new));
        }
        text.append(table);
    }

    private String chart(LayerSweep layer) {
        double scale = kind.measured() == FigureKind.Measured.AS_PART ? 100 : 1;
        LineChart chart = new LineChart("Kendall's τ", FigureKindText.axis(kind, sweep.treaty().portfolio()),
                y -> FigureText.value(Figure.exact(y)));
        for (CopulaFamily family : sweep.request().families()) {
            List<SweepPoint> points = layer.of(family).stream().sorted(Comparator.comparingDouble(SweepPoint::kendallTau)).toList();
            chart.curve(family.label(), points.stream().mapToDouble(SweepPoint::kendallTau).toArray(),
                    points.stream().mapToDouble(p -> scale * p.value().value()).toArray());
        }
        return chart.level("comonotonic", scale * layer.comonotoneValue().value()).toString();
    }

    private static Figure largestError(LayerSweep layer) {
        return layer.points().stream().map(SweepPoint::value).max(Comparator.comparingDouble(Figure::error)).orElseThrow();
    }

    /**
     * Whether all points and both ends are within {@value #HARDLY} of each other, so that a table would show the same number everywhere, or
     * within what a simulation cannot tell from noise.
     */
    private boolean hardly(LayerSweep layer) {
        DoubleSummaryStatistics values = DoubleStream.concat(layer.points().stream().mapToDouble(p -> p.value().value()),
                DoubleStream.of(kind.of(layer.independent()).value(), layer.comonotoneValue().value())).summaryStatistics();
        double range = values.getMax() - values.getMin();
        return range <= HARDLY * Math.abs(values.getMax()) || !layer.refusals().isEmpty() && range <= 2 * largestError(layer).error();
    }

    private void resting() {
        text.append('\n');
        for (LayerSweep layer : sweep.layers()) {
            if (layer.still().isEmpty() && hardly(layer)) {
                Figure largest = largestError(layer);
                line(layer.name() + " hardly depends on the copula: " + kind.words() + " "
                        + FigureKindText.value(kind, kind.of(layer.independent())) + " when independent, elsewhere the same to within "
                        + (layer.refusals().isEmpty() ? FigureText.plainPercent(HARDLY)
                                : "the errors of the simulation (" + FigureKindText.error(kind, largest) + ")") + ".");
            }
            layer.still().ifPresent(reason -> line(layer.name() + " does not depend on the copula: " + reason + ". "
                    + FigureKindText.capital(kind.words()) + " " + FigureKindText.value(kind, kind.of(layer.independent())) + "."));
        }
    }

    private void line(String s) {
        text.append(s).append('\n');
    }
}
