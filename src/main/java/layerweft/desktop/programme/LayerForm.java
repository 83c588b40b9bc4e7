package layerweft.desktop.programme;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import layerweft.desktop.control.AmountField;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.control.FigureTable;
import layerweft.desktop.form.Side;
import layerweft.desktop.form.TreeNames;
import layerweft.desktop.form.TreeNumber;
import layerweft.desktop.form.TreeNumbers;
import layerweft.desktop.form.TreeText;
import layerweft.desktop.form.TreeTruth;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LayerEdit;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.file.FileTree;

/** The terms of one layer in the order of the contract, and what they do. */
final class LayerForm extends VBox {
    private final Session session;
    private final int place;
    private final FigureTable does = new FigureTable(1);

    LayerForm(Session session, int place) {
        this.session = session;
        this.place = place;
        getStyleClass().add("lw-form");
        String at = "layers[" + place + "]";
        getChildren().addAll(new TreeText(session, Side.PROGRAMME, at + ".name", "Name", "name of a layer",
                        (document, name) -> document.withProgramme(t -> LayerEdit.renamed(t, place, name))),
                section("Perils covered"), new TreeNames(session, Side.PROGRAMME, at + ".perils", this::perils, true, "perils covered"),
                section("Each event"));
        boolean franchise = session.document().get().programme().has(at + ".occurrence.franchise");
        getChildren().add(row(franchise ? number(at + ".occurrence.franchise", "Franchise", AmountText.Kind.AMOUNT)
                : number(at + ".occurrence.retention", "Retention", AmountText.Kind.AMOUNT).orBlank("none"), number(at + ".occurrence.limit", "Limit", AmountText.Kind.AMOUNT).orBlank("no limit")));
        getChildren().addAll(section("In the year"),
                row(number(at + ".annual.deductible", "Deductible", AmountText.Kind.AMOUNT).orBlank("none"), number(at + ".annual.limit", "Limit", AmountText.Kind.AMOUNT).orBlank("no limit")),
                new TreeNumbers(session, Side.PROGRAMME, at + ".reinstatements", "Reinstatements, premium of each", "any number", "reinstatements", AmountText.Kind.PART),
                section("Placement"),
                row(number(at + ".share", "Share", AmountText.Kind.PART).orBlank("100"), number(at + ".quotaShare", "Quota share", AmountText.Kind.PART).orBlank("100"),
                        number(at + ".premium", "Quoted premium", AmountText.Kind.AMOUNT).orBlank("none")),
                new TreeTruth(session, Side.PROGRAMME, at + ".proRataTime", "Reinstatement premium pro rata as to time", false, "pro rata time"));
        if (LayerEdit.count(session.document().get().programme()) > 1) {
            getChildren().addAll(section("Recovered before it"), new TreeNames(session, Side.PROGRAMME, at + ".inuring", this::others, false, "inuring layers"));
        }
        getChildren().addAll(section("What it does"), does);
    }

    private AmountField number(String path, String label, AmountText.Kind kind) {
        return new TreeNumber(session, Side.PROGRAMME, path, label, label.toLowerCase(Locale.ROOT), kind).field();
    }

    private static HBox row(Node... fields) {
        HBox row = new HBox(fields);
        row.getStyleClass().add("lw-form-row");
        for (Node field : fields) {
            HBox.setHgrow(field, Priority.ALWAYS);
            ((Region) field).setPrefWidth(100);
        }
        return row;
    }

    private static Label section(String words) {
        Label label = new Label(words);
        label.getStyleClass().addAll("lw-strong", "lw-section");
        return label;
    }

    /** Perils, each followed by its parts. */
    private List<String> perils() {
        FileTree tree = session.document().get().portfolio();
        List<String> names = new ArrayList<>();
        for (int i = 0; i < tree.size("perils"); i++) {
            String name = tree.text("perils[" + i + "].name");
            if (name != null) {
                names.add(name);
                for (int k = 0; k < tree.size("perils[" + i + "].subPerils"); k++) {
                    names.add(name + "/" + tree.text("perils[" + i + "].subPerils[" + k + "].name"));
                }
            }
        }
        return names;
    }

    private List<String> others() {
        FileTree tree = session.document().get().programme();
        List<String> names = new ArrayList<>();
        for (int j = 0; j < LayerEdit.count(tree); j++) {
            if (j != place) {
                names.add(String.valueOf(tree.text("layers[" + j + "].name")));
            }
        }
        return names;
    }

    /** Figures of the layer, if they are of the treaty on screen. */
    void show(LivePrices prices) {
        if (place >= prices.layers().size()) {
            return;
        }
        LayerFigures layer = prices.layers().get(place);
        double part = 1 / prices.treaty().layer(place).share();
        List<List<String>> rows = new ArrayList<>();
        rows.add(row("Expected loss", FigureShown.of(layer.expectedLoss().times(part), "")));
        rows.add(row("Loss on line", FigureShown.percent(layer.lossOnLine())));
        rows.add(row("Standard deviation", FigureShown.of(layer.standardDeviation().times(part), "")));
        rows.add(chance("Chance it attaches", layer.attachmentProbability()));
        rows.add(chance("Chance it is exhausted", layer.exhaustionProbability()));
        rows.add(row("Technical premium", FigureShown.of(layer.technicalPremium().times(part), "")));
        FigureShown rate = FigureShown.percent(layer.technicalRateOnLine());
        rows.add(List.of("Rate on line", rate.text(), layer.quotedRateOnLine() == null ? rate.error() : "quoted " + FigureShown.percent(Figure.exact(layer.quotedRateOnLine())).text()));
        rows.add(List.of("Events that hit it", FigureShown.of(layer.expectedEvents(), "").value(), "a year"));
        does.show(List.of("", "at 100\u2009%", ""), rows);
    }

    private static List<String> row(String name, FigureShown shown) {
        return List.of(name, shown.text(), shown.error());
    }

    private static List<String> chance(String name, Figure chance) {
        return List.of(name, FigureShown.percent(chance).text(), FigureText.oneIn(chance).equals("never") ? "never" : FigureText.oneIn(chance) + " years");
    }
}
