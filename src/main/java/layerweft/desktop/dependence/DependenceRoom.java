package layerweft.desktop.dependence;

import java.util.Locale;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Separator;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.RowConstraints;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import layerweft.desktop.Reading;
import layerweft.desktop.Room;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.Panel;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.desktop.session.TauState;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.portfolio.Portfolio;
import layerweft.study.BadYears;

/** The families at the present τ, the joint years of two perils, how often both are bad, every pair, and groups. */
public final class DependenceRoom implements Room {
    private static final double READ_AT = 50;

    private final Session session;
    private final FamilyTiles tiles;
    private final YearsPanel years;
    private final BadYearsPanel bad;
    private final PairsPanel pairs;
    private final GroupsPanel groups;
    private final GridPane all = new GridPane();
    private final Panel one;
    private final StackPane view = new StackPane();
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);
    private boolean shown;

    public DependenceRoom(RoomTools tools) {
        this.session = tools.session();
        tiles = new FamilyTiles(session, tools.theme());
        years = new YearsPanel(tools.theme());
        bad = new BadYearsPanel(tools.theme());
        pairs = new PairsPanel(session);
        groups = new GroupsPanel(session);
        all.getStyleClass().add("lw-tiles");
        column(48.5);
        column(51.5);
        row(58);
        row(42);
        all.add(tiles, 0, 0);
        all.add(bad.panel(), 0, 1);
        all.add(new Panel(years), 1, 0);
        all.add(pairsAndGroups(), 1, 1);
        Label nothing = new Label("One peril has nothing to depend on: the copula joins the years of several.");
        nothing.setWrapText(true);
        Button add = new Button("Add a peril");
        add.getStyleClass().add("lw-main-button");
        add.setOnAction(asked -> tools.goTo().accept("Perils"));
        VBox words = new VBox(nothing, add);
        words.getStyleClass().add("lw-column");
        one = new Panel(words);
        one.setVisible(false);
        // where the window is low the room scrolls; otherwise it fills its area
        ScrollPane scroll = new ScrollPane(all);
        scroll.setFitToWidth(true);
        scroll.setFitToHeight(true);
        scroll.getStyleClass().add("lw-scroll");
        scroll.visibleProperty().bind(all.visibleProperty());
        view.getChildren().addAll(scroll, one);
        years.onChoice(this::show);
        session.prices().addListener((is, was, now) -> changed());
        session.document().addListener((is, was, now) -> show());
        session.selectedLayer().addListener((is, was, now) -> changed());
    }

    private Region pairsAndGroups() {
        VBox left = new VBox(title("Pairs", "above: latent τ, below: counts’ τ-b"), scrolling(pairs));
        left.getStyleClass().add("lw-column-tight");
        HBox.setHgrow(left, Priority.ALWAYS);
        VBox right = new VBox(title("Groups", ""), scrolling(groups));
        right.getStyleClass().add("lw-column-tight");
        right.setPrefWidth(236);
        right.setMinWidth(200);
        HBox both = new HBox(left, new Separator(Orientation.VERTICAL), right);
        both.getStyleClass().add("lw-row");
        return new Panel(both);
    }

    private static HBox title(String words, String note) {
        Label title = new Label(words);
        title.getStyleClass().add("lw-panel-title");
        title.setMinWidth(Region.USE_PREF_SIZE);
        Label beside = new Label(note);
        beside.getStyleClass().add("lw-note");
        HBox line = new HBox(title, beside);
        line.getStyleClass().add("lw-panel-head");
        return line;
    }

    private static ScrollPane scrolling(Region content) {
        ScrollPane scroll = new ScrollPane(content);
        scroll.setFitToWidth(true);
        scroll.getStyleClass().add("lw-scroll");
        VBox.setVgrow(scroll, Priority.ALWAYS);
        return scroll;
    }

    private void column(double percent) {
        ColumnConstraints column = new ColumnConstraints();
        column.setPercentWidth(percent);
        all.getColumnConstraints().add(column);
    }

    private void row(double percent) {
        RowConstraints row = new RowConstraints();
        row.setPercentHeight(percent);
        all.getRowConstraints().add(row);
    }

    @Override
    public void entered() {
        shown = true;
        changed();
    }

    @Override
    public void left() {
        shown = false;
        tiles.stop();
    }

    /** Another treaty, τ or layer: the figures of the families at the same τ are computed behind. */
    private void changed() {
        show();
        if (shown && session.prices().get() != null && session.tau().get() != null) {
            tiles.price(session.prices().get(), session.tau().get());
        }
    }

    private void show() {
        LivePrices prices = session.prices().get();
        TauState tau = session.tau().get();
        if (prices == null || tau == null || !shown) {
            return;
        }
        Portfolio portfolio = prices.treaty().portfolio();
        all.setVisible(tau.turns());
        one.setVisible(!tau.turns());
        if (!tau.turns()) {
            reading.set(Reading.of("One peril: there is no copula."));
            return;
        }
        years.offer(portfolio);
        tiles.show(prices, tau);
        years.show(portfolio);
        pairs.show(portfolio);
        Copula copula = portfolio.dependence().copula();
        groups.show(portfolio, tau.family() == null ? copula.label().matches("(survival-)?(gumbel|clayton|frank|joe)") : tau.family().archimedean().isPresent());
        if (years.first() != years.second()) {
            String first = portfolio.perils().get(years.first()).name();
            String second = portfolio.perils().get(years.second()).name();
            Copula pair = copula.pair(years.first(), years.second());
            bad.show(pair, first, second, tau, this::take);
            reading.set(Reading.of(sentence(first) + " and " + second + " both have a 1-in-50 year ")
                    .strong("once in " + Digits.years(1 / BadYears.bothBeyond(pair, READ_AT)) + " years").plain("; were they independent, once in 2,500."));
        }
    }

    private static String sentence(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }

    private void take(CopulaFamily family) {
        if (family.hasStrength()) {
            session.setFamily(family);
        }
    }

    @Override
    public String name() {
        return "Dependence";
    }

    @Override
    public Node view() {
        return view;
    }

    @Override
    public ObservableValue<Reading> reading() {
        return reading.getReadOnlyProperty();
    }
}
