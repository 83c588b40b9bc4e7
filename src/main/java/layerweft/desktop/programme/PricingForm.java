package layerweft.desktop.programme;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import layerweft.desktop.control.AmountField;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.form.Side;
import layerweft.desktop.form.TreeNumber;
import layerweft.desktop.form.TreeNumbers;
import layerweft.desktop.form.TreeText;
import layerweft.desktop.form.TreeTruth;
import layerweft.desktop.session.Session;

/** How premiums are made from expected losses, and what the buyer looks at. */
final class PricingForm extends VBox {
    private static final String LOADING = "pricing.loading";
    /** Principles with the numbers they begin with. */
    private static final Map<String, Map<String, Double>> PRINCIPLES = new LinkedHashMap<>();

    static {
        PRINCIPLES.put("none", Map.of());
        PRINCIPLES.put("standardDeviation", Map.of("factor", 0.2));
        PRINCIPLES.put("variance", Map.of("factor", 0.01));
        PRINCIPLES.put("costOfCapital", numbers("rate", 0.06, "level", 0.99));
        PRINCIPLES.put("proportionalHazard", Map.of("rho", 1.2));
        PRINCIPLES.put("wang", Map.of("lambda", 0.3));
    }

    private static Map<String, Double> numbers(String a, double x, String b, double y) {
        Map<String, Double> numbers = new LinkedHashMap<>();
        numbers.put(a, x);
        numbers.put(b, y);
        return numbers;
    }

    private final Session session;
    private final HBox parameters = new HBox();
    private final ComboBox<String> principle = new ComboBox<>();
    private String shown = "";

    PricingForm(Session session) {
        this.session = session;
        getStyleClass().add("lw-form");
        parameters.getStyleClass().add("lw-form-row");
        principle.getItems().setAll(PRINCIPLES.keySet());
        principle.setMaxWidth(Double.MAX_VALUE);
        principle.setAccessibleText("Loading principle");
        principle.setOnAction(chosen -> take(principle.getValue()));
        getChildren().addAll(new TreeText(session, Side.PROGRAMME, "name", "Name of the programme", "name of the programme", (d, name) -> d.withProgramme(t -> t.set("name", name))),
                section("Loading"), principle, parameters, section("Charges"),
                row(part("pricing.brokerage", "Brokerage"), part("pricing.expenses", "Expenses")),
                new TreeTruth(session, Side.PROGRAMME, "pricing.brokerageOnReinstatements", "Brokerage on reinstatement premiums too", true, "brokerage on reinstatements"),
                section("What the buyer looks at"),
                new TreeNumbers(session, Side.PROGRAMME, "buyer.returnPeriods", "Return periods, years", "10; 50; 100; 200; 250", "return periods", AmountText.Kind.NUMBER),
                row(part("buyer.tailLevel", "Tail level"), part("buyer.capitalCost", "Cost of capital")));
        session.document().addListener((is, was, now) -> refresh());
        refresh();
    }

    private AmountField part(String path, String label) {
        return new TreeNumber(session, Side.PROGRAMME, path, label, label.toLowerCase(Locale.ROOT), AmountText.Kind.PART).field().orBlank("as usual");
    }

    private static HBox row(AmountField... fields) {
        HBox row = new HBox(fields);
        row.getStyleClass().add("lw-form-row");
        for (AmountField field : fields) {
            HBox.setHgrow(field, Priority.ALWAYS);
        }
        return row;
    }

    private static Label section(String words) {
        Label label = new Label(words);
        label.getStyleClass().addAll("lw-strong", "lw-section");
        return label;
    }

    private String now() {
        String now = session.document().get().programme().text(LOADING + ".principle");
        return now == null ? "none" : now;
    }

    private void take(String name) {
        if (name != null && !name.equals(now())) {
            Map<String, Object> loading = new LinkedHashMap<>();
            loading.put("principle", name);
            loading.putAll(PRINCIPLES.get(name));
            session.edit("change of loading", d -> d.withProgramme(t -> t.set(LOADING, loading)));
        }
    }

    private void refresh() {
        String now = now();
        principle.setValue(now);
        if (!now.equals(shown)) {
            shown = now;
            parameters.getChildren().clear();
            for (String field : PRINCIPLES.getOrDefault(now, Map.of()).keySet()) {
                AmountText.Kind kind = List.of("rate", "level").contains(field) ? AmountText.Kind.PART : AmountText.Kind.NUMBER;
                AmountField number = new TreeNumber(session, Side.PROGRAMME, LOADING + "." + field, field.substring(0, 1).toUpperCase(Locale.ROOT) + field.substring(1),
                        "loading", kind).field();
                HBox.setHgrow(number, Priority.ALWAYS);
                parameters.getChildren().add(number);
            }
        }
    }
}
