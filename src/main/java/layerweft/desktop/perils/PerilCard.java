package layerweft.desktop.perils;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TextField;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.control.ChartView;
import layerweft.desktop.control.FigureLabel;
import layerweft.desktop.form.Side;
import layerweft.desktop.form.TreeNumber;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.Session;
import layerweft.file.FileTree;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.report.chart.EventsAboveChart;
import layerweft.study.PerilTotals;

/** One peril: its models with their numbers, events a year above an amount, and its annual total at chosen return periods. */
final class PerilCard extends VBox {
    /** Numbers of a model that are money. */
    private static final List<String> MONEY = List.of("threshold", "scale", "exposedValue", "cap", "theta");
    private static final Map<String, String> WORDS = Map.ofEntries(Map.entry("poisson", "Poisson"), Map.entry("negativeBinomial", "Negative binomial"),
            Map.entry("binomial", "Binomial"), Map.entry("empirical", "Empirical"), Map.entry("lognormal", "Lognormal"), Map.entry("pareto", "Pareto"),
            Map.entry("generalizedPareto", "Generalized Pareto"), Map.entry("gamma", "Gamma"), Map.entry("weibull", "Weibull"), Map.entry("burr", "Burr"),
            Map.entry("loglogistic", "Loglogistic"), Map.entry("exponential", "Exponential"), Map.entry("inverseGaussian", "Inverse Gaussian"), Map.entry("beta", "Beta"),
            Map.entry("mbbefd", "MBBEFD"), Map.entry("discrete", "Discrete"), Map.entry("spliced", "Spliced body and tail"), Map.entry("mixture", "Mixture"),
            Map.entry("mean", "Mean"), Map.entry("varianceToMean", "Var / mean"), Map.entry("trials", "Trials"), Map.entry("chance", "Chance"), Map.entry("cv", "CV"),
            Map.entry("threshold", "Threshold"), Map.entry("alpha", "α"), Map.entry("sigma", "σ"), Map.entry("mu", "μ"), Map.entry("shape", "Shape"),
            Map.entry("scale", "Scale"), Map.entry("cap", "Cap"), Map.entry("gamma.field", "γ"), Map.entry("theta", "θ"), Map.entry("exposedValue", "Exposed value"),
            Map.entry("tailWeight", "Tail weight"));

    private final Session session;
    private final int place;
    private final ChartView curve;
    private final FigureLabel mean = new FigureLabel("lw-figure-18");
    private final FigureLabel deviation = new FigureLabel("lw-figure-18");
    private final FigureLabel often = new FigureLabel("lw-figure-18");
    private final FigureLabel rare = new FigureLabel("lw-figure-18");

    PerilCard(RoomTools tools, int place) {
        this.session = tools.session();
        this.place = place;
        getStyleClass().addAll("lw-panel", "lw-peril-card");
        curve = new ChartView(tools.theme());
        curve.setMinHeight(150);
        curve.setPrefHeight(160);
        Region spare = new Region();
        VBox.setVgrow(spare, Priority.ALWAYS);
        HBox figures = new HBox(of("mean", mean), of("std dev", deviation), of("1 in 10", often), of("1 in 100", rare));
        figures.getStyleClass().add("lw-figures");
        getChildren().addAll(head(), model("Frequency", path("frequency")), losses(), spare, curve, figures);
    }

    private String path(String field) {
        return "perils[" + place + "]." + field;
    }

    private FileTree tree() {
        return session.document().get().portfolio();
    }

    private static VBox of(String words, FigureLabel figure) {
        Label label = new Label(words);
        label.getStyleClass().add("lw-note");
        VBox box = new VBox(label, figure);
        HBox.setHgrow(box, Priority.ALWAYS);
        return box;
    }

    private HBox head() {
        Region thread = new Region();
        thread.getStyleClass().addAll("lw-thread", "lw-peril-" + (place % 8 + 1));
        TextField name = new TextField(tree().text(path("name")));
        name.getStyleClass().add("lw-card-name");
        name.setAccessibleText("Name of the peril");
        name.setOnAction(done -> rename(name.getText()));
        name.focusedProperty().addListener((is, was, now) -> {
            if (!now) {
                rename(name.getText());
            }
        });
        HBox.setHgrow(name, Priority.ALWAYS);
        MenuItem copy = new MenuItem("Copy peril");
        copy.setOnAction(asked -> session.edit("copy of a peril", d -> d.withPortfolio(t -> PerilEdit.duplicated(t, place))));
        MenuItem left = new MenuItem("Move left");
        left.setOnAction(asked -> session.edit("move of a peril", d -> d.withPortfolio(t -> PerilEdit.moved(t, place, place - 1))));
        left.setDisable(place == 0);
        MenuItem right = new MenuItem("Move right");
        right.setOnAction(asked -> session.edit("move of a peril", d -> d.withPortfolio(t -> PerilEdit.moved(t, place, place + 1))));
        right.setDisable(place + 1 >= tree().size("perils"));
        MenuItem remove = new MenuItem("Delete peril");
        remove.setOnAction(asked -> session.edit("deletion of a peril", d -> PerilEdit.removed(d, place)));
        remove.setDisable(tree().size("perils") < 2);
        MenuButton more = new MenuButton("⋯", null, copy, left, right, remove);
        more.getStyleClass().add("lw-more");
        more.setAccessibleText("More for this peril");
        HBox head = new HBox(thread, name, more);
        head.setAlignment(Pos.CENTER_LEFT);
        head.getStyleClass().add("lw-card-head");
        return head;
    }

    private void rename(String text) {
        String old = tree().text(path("name"));
        if (!text.isBlank() && !text.equals(old)) {
            session.edit("name of a peril", d -> PerilEdit.renamed(d, place, text.strip()));
        }
    }

    /** The kind of a model and its numbers. */
    private VBox model(String words, String at) {
        Label label = new Label(words);
        label.getStyleClass().add("lw-label");
        Label kind = new Label(WORDS.getOrDefault(String.valueOf(tree().text(at + ".model")), "—"));
        kind.getStyleClass().add("lw-model");
        FlowPane numbers = new FlowPane();
        numbers.getStyleClass().add("lw-numbers");
        for (String field : tree().fields(at)) {
            if (tree().get(at + "." + field) instanceof Double) {
                boolean money = MONEY.contains(field) || field.equals("mean") && words.equals("Severity");
                String name = WORDS.getOrDefault(field.equals("gamma") ? "gamma.field" : field, field);
                TreeNumber number = new TreeNumber(session, Side.PORTFOLIO, at + "." + field, name, name.toLowerCase(Locale.ROOT), money ? AmountText.Kind.AMOUNT : AmountText.Kind.NUMBER);
                number.field().setPrefWidth(88);
                numbers.getChildren().add(number.field());
            }
        }
        VBox box = new VBox(new HBox(8, label, kind), numbers);
        box.getStyleClass().add("lw-model-box");
        return box;
    }

    private VBox losses() {
        if (!tree().has(path("subPerils"))) {
            return model("Severity", path("severity"));
        }
        VBox box = new VBox();
        box.getStyleClass().add("lw-model-box");
        Label label = new Label("Sub-perils");
        label.getStyleClass().add("lw-label");
        Label copula = new Label(copula(path("subPerilCopula")));
        copula.getStyleClass().add("lw-model");
        box.getChildren().add(new HBox(8, label, copula));
        for (int k = 0; k < tree().size(path("subPerils")); k++) {
            String at = path("subPerils") + "[" + k + "]";
            VBox part = model(String.valueOf(tree().text(at + ".name")), at + ".severity");
            if (tree().has(at + ".chance")) {
                TreeNumber chance = new TreeNumber(session, Side.PORTFOLIO, at + ".chance", "Chance", "chance", AmountText.Kind.NUMBER);
                chance.field().setPrefWidth(88);
                ((FlowPane) part.getChildren().get(1)).getChildren().add(0, chance.field());
            }
            box.getChildren().add(part);
        }
        return box;
    }

    private String copula(String at) {
        String family = tree().text(at + ".family");
        double tau = tree().number(at + ".kendallTau");
        return family == null ? "independent" : family + (Double.isNaN(tau) ? "" : " τ " + FigureText.plain(tau));
    }

    /** @param perils of the last valid portfolio, to draw the others in grey */
    void show(List<EventsAboveChart.Peril> perils, double from, double to) {
        if (place < perils.size()) {
            curve.picture().set(new EventsAboveChart(perils, place, from, to));
        }
    }

    void show(PerilTotals totals) {
        if (place < totals.perils().size()) {
            PerilTotals.Total total = totals.perils().get(place);
            show(mean, total.mean());
            show(deviation, total.standardDeviation());
            show(often, total.byReturnPeriod().get(10.0));
            show(rare, total.byReturnPeriod().get(100.0));
        }
    }

    private static void show(FigureLabel label, Figure figure) {
        FigureShown shown = FigureShown.of(figure, "");
        label.show(shown.value(), "", "");
        label.hover(FigureShown.allDigits(figure));
    }

    /** What kinds of models and which fields it shows: a change of these asks for a new card. */
    static List<String> shape(FileTree tree, int place) {
        List<String> shape = new ArrayList<>();
        String at = "perils[" + place + "]";
        shape.add(tree.text(at + ".name"));
        shape.add(tree.text(at + ".frequency.model") + tree.fields(at + ".frequency"));
        shape.add(tree.text(at + ".severity.model") + tree.fields(at + ".severity"));
        for (int k = 0; k < tree.size(at + ".subPerils"); k++) {
            String part = at + ".subPerils[" + k + "]";
            shape.add(tree.text(part + ".name") + tree.fields(part) + tree.text(part + ".severity.model") + tree.fields(part + ".severity"));
        }
        return shape;
    }
}
