package layerweft.desktop.dependence;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.geometry.Pos;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import layerweft.desktop.control.FigureTable;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.picture.JointYears;
import layerweft.desktop.picture.JointYearsPicture;
import layerweft.desktop.theme.Theme;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Independence;
import layerweft.model.copula.Student;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.study.CountConcordance;

/** The years of two perils to choose, the count of joint bad ones, and the numbers behind. */
final class YearsPanel extends VBox {
    private static final int YEARS = 4_000;
    private static final long SEED = 1;

    private final ComboBox<String> first = chooser("First peril");
    private final ComboBox<String> second = chooser("Second peril");
    private final SegmentedSwitch<Boolean> ranks = new SegmentedSwitch<>(List.of(false, true), r -> r ? "Rank" : "Return period");
    private final JointYearsPicture picture;
    private final Label count = new Label();
    private final FigureTable facts = new FigureTable(1);
    private final Label note = new Label();
    private Runnable onChoice = () -> {};
    private JointYears drawn;
    private Copula drawnOf;
    private boolean filling;

    YearsPanel(Theme theme) {
        getStyleClass().add("lw-column-tight");
        picture = new JointYearsPicture(theme);
        picture.setPrefSize(theme.px(330), theme.px(320));
        picture.ranks().bind(ranks.value());
        picture.corner().addListener((is, was, now) -> count());
        HBox.setHgrow(picture, Priority.ALWAYS);
        Label title = new Label("Both bad");
        title.getStyleClass().addAll("lw-panel-title", "lw-warm-text");
        count.setWrapText(true);
        count.setMinHeight(USE_PREF_SIZE);
        note.getStyleClass().add("lw-note");
        note.setWrapText(true);
        VBox words = new VBox(title, count, facts, note);
        words.getStyleClass().add("lw-column-tight");
        words.setMinWidth(theme.px(214));
        words.setPrefWidth(theme.px(280));
        words.setMaxWidth(theme.px(290));
        HBox inside = new HBox(picture, words);
        inside.getStyleClass().add("lw-row");
        VBox.setVgrow(inside, Priority.ALWAYS);
        Label of = new Label("Years of");
        of.getStyleClass().add("lw-panel-title");
        of.setMinWidth(USE_PREF_SIZE);
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        ranks.setMinWidth(USE_PREF_SIZE);
        HBox line = new HBox(of, first, new Label("×"), second, gap, ranks);
        line.getStyleClass().add("lw-controls");
        line.setAlignment(Pos.CENTER_LEFT);
        getChildren().addAll(line, inside);
        first.valueProperty().addListener((is, was, now) -> chosen());
        second.valueProperty().addListener((is, was, now) -> chosen());
    }

    private static ComboBox<String> chooser(String what) {
        ComboBox<String> box = new ComboBox<>();
        box.setAccessibleText(what);
        box.setMinWidth(96);
        box.setCellFactory(list -> new PerilCell(box));
        box.setButtonCell(new PerilCell(box));
        return box;
    }

    /** A peril with the colour of its thread. */
    private static final class PerilCell extends ListCell<String> {
        private final ComboBox<String> box;

        PerilCell(ComboBox<String> box) {
            this.box = box;
        }

        @Override
        protected void updateItem(String name, boolean empty) {
            super.updateItem(name, empty);
            setText(empty ? "" : name);
            setGraphic(empty || name == null ? null : thread(box.getItems().indexOf(name)));
        }
    }

    /** A short piece of a peril's thread. */
    static Region thread(int peril) {
        Region thread = new Region();
        thread.getStyleClass().addAll("lw-thread-mark", "lw-peril-" + (peril % 8 + 1));
        return thread;
    }

    /** Called when other perils are chosen. */
    void onChoice(Runnable action) {
        onChoice = action;
    }

    private void chosen() {
        if (!filling) {
            onChoice.run();
        }
    }

    int first() {
        return first.getItems().indexOf(first.getValue());
    }

    int second() {
        return second.getItems().indexOf(second.getValue());
    }

    /** Offers the perils; keeps those that were chosen where they are still there. */
    void offer(Portfolio portfolio) {
        List<String> names = portfolio.perils().stream().map(Peril::name).toList();
        if (names.equals(first.getItems())) {
            return;
        }
        filling = true;
        String a = first.getValue();
        String b = second.getValue();
        first.getItems().setAll(names);
        second.getItems().setAll(names);
        first.setValue(names.contains(a) ? a : names.get(0));
        second.setValue(names.contains(b) && !first.getValue().equals(b) ? b : names.stream().filter(n -> !n.equals(first.getValue())).findFirst().orElse(names.get(0)));
        filling = false;
    }

    void show(Portfolio portfolio) {
        if (first() == second()) {
            count.setText("Choose two different perils.");
            return;
        }
        Copula pair = portfolio.dependence().copula().pair(first(), second());
        if (drawn == null || !pair.equals(drawnOf) || !drawn.first().equals(first.getValue()) || !drawn.second().equals(second.getValue())) {
            drawn = JointYears.drawn(first.getValue(), second.getValue(), pair, YEARS, SEED);
            drawnOf = pair;
            picture.show(drawn);
        }
        count();
        facts(pair, portfolio);
    }

    private void count() {
        if (drawn != null) {
            double years = picture.corner().get();
            count.setText(String.format(Locale.ROOT, "%,d of these %,d years lie in the shaded corner, 1 in %.3g or worse for both; independence: %.0f.",
                    drawn.bothBeyond(years), YEARS, years, YEARS / (years * years)));
        }
    }

    private void facts(Copula pair, Portfolio portfolio) {
        boolean counts = portfolio.dependence().links() == Dependence.Links.COUNTS;
        double tau = pair instanceof Independence ? 0 : pair.kendallTau(0, 1);
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("latent τ", Digits.two(tau), "set"));
        if (counts) {
            double tauB = CountConcordance.tauB(pair, portfolio.perils().get(first()).frequency(), portfolio.perils().get(second()).frequency());
            rows.add(List.of("counts’ τ-b", Digits.two(tauB), "follows from τ"));
        }
        rows.add(parameter(pair));
        rows.add(List.of("upper tail λU", Digits.two(pair.upperTail(0, 1)), upperFormula(pair)));
        rows.add(List.of("lower tail λL", Digits.two(pair.lowerTail(0, 1)), ""));
        facts.show(List.of("", "", ""), rows);
        note.setText(counts ? "The copula joins annual counts. Ties between counts make their own rank correlation differ from the latent τ."
                : "The copula joins annual totals, whose rank correlation is the latent τ.");
    }

    private static List<String> parameter(Copula pair) {
        if (pair instanceof Archimedean a) {
            String formula = switch (a.family()) {
                case CLAYTON -> "2τ/(1 − τ)";
                case GUMBEL -> "1/(1 − τ)";
                case FRANK, JOE -> "from τ";
            };
            return List.of("θ", String.format(Locale.ROOT, "%.4g", a.theta()).replace('-', '−'), formula);
        }
        if (pair instanceof Gaussian g) {
            return List.of("ρ", Digits.two(g.correlation().rho(0, 1)), "sin(πτ/2)");
        }
        return pair instanceof Student s ? List.of("ρ", Digits.two(s.correlation().rho(0, 1)), String.format(Locale.ROOT, "sin(πτ/2), ν %.3g", s.degreesOfFreedom()))
                : List.of("parameter", "—", "");
    }

    private static String upperFormula(Copula pair) {
        boolean powers = pair instanceof Archimedean a && !a.survival() && (a.family() == ArchimedeanFamily.GUMBEL || a.family() == ArchimedeanFamily.JOE);
        boolean clayton = pair instanceof Archimedean a && a.survival() && a.family() == ArchimedeanFamily.CLAYTON;
        return powers ? "2 − 2^(1/θ)" : clayton ? "2^(−1/θ)" : "";
    }
}
