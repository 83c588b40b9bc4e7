package layerweft.desktop.dependence;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javafx.css.PseudoClass;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import layerweft.desktop.control.AmountField;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.form.Side;
import layerweft.desktop.form.TreeNames;
import layerweft.desktop.form.TreeNumber;
import layerweft.desktop.session.Session;
import layerweft.file.FileTree;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Portfolio;

/** Perils that move closer together than the rest, inside the same family; and whether the copula links counts or annual totals. */
final class GroupsPanel extends VBox {
    /** Marks a peril that is dragged. */
    static final String PERIL = "layerweft peril ";

    private static final PseudoClass OVER = PseudoClass.getPseudoClass("over");
    private static final String COPULA = "dependence.copula";
    private static final String GROUPS = COPULA + ".groups";
    /** How much closer a new group is than the rest. */
    private static final double CLOSER = 0.2;
    private static final double MOST = 0.95;

    private final Session session;
    private final Label note = new Label("Perils that move closer together than the rest, inside the same family.");
    private final VBox groups = new VBox();
    private final Label drop = new Label();
    private final Button add = new Button("Add a group");
    private final Label reason = new Label();
    private final SegmentedSwitch<String> links = new SegmentedSwitch<>(List.of("counts", "annualTotals"), l -> l.equals("counts") ? "Counts" : "Annual totals");
    private String waiting;
    private String shape = "";
    private boolean filling;

    GroupsPanel(Session session) {
        this.session = session;
        getStyleClass().add("lw-column-tight");
        for (Label words : List.of(note, reason, drop)) {
            words.getStyleClass().add("lw-note");
            words.setWrapText(true);
            words.setMinHeight(USE_PREF_SIZE);
        }
        groups.getStyleClass().add("lw-column-tight");
        drop.getStyleClass().add("lw-drop");
        drop.setMaxWidth(Double.MAX_VALUE);
        drop.setOnDragOver(event -> {
            if (event.getDragboard().hasString() && event.getDragboard().getString().startsWith(PERIL)) {
                event.acceptTransferModes(TransferMode.COPY);
                drop.pseudoClassStateChanged(OVER, true);
            }
        });
        drop.setOnDragExited(event -> drop.pseudoClassStateChanged(OVER, false));
        drop.setOnDragDropped(event -> {
            dropped(event.getDragboard().getString().substring(PERIL.length()));
            event.setDropCompleted(true);
        });
        add.getStyleClass().add("lw-small-button");
        add.setOnAction(asked -> {
            List<String> free = free(tree());
            addGroup(free.subList(0, Math.min(2, free.size())));
        });
        Label linked = new Label("Links");
        linked.getStyleClass().add("lw-label");
        HBox line = new HBox(linked, links);
        line.getStyleClass().add("lw-controls");
        links.setAccessibleText("What the copula links");
        links.value().addListener((is, was, now) -> {
            if (!filling) {
                session.edit("change of links", d -> d.withPortfolio(t -> t.set("dependence.links", now)));
            }
        });
        getChildren().addAll(note, groups, drop, add, reason, line);
    }

    private FileTree tree() {
        return session.document().get().portfolio();
    }

    void show(Portfolio portfolio, boolean archimedean) {
        filling = true;
        links.value().set(portfolio.dependence().links() == Dependence.Links.COUNTS ? "counts" : "annualTotals");
        filling = false;
        links.setDisable(!tree().has("dependence"));
        int count = tree().size(GROUPS);
        String now = count + " " + perils(tree());
        if (!now.equals(shape)) {
            shape = now;
            build(count);
        }
        boolean room = archimedean && free(tree()).size() >= 2;
        reason.setText(archimedean ? room ? "" : "No two perils are left for a group." : "Gumbel, Clayton, Frank and Joe can have groups.");
        reason.setVisible(!reason.getText().isEmpty());
        reason.setManaged(reason.isVisible());
        add.setDisable(!room);
        drop.setVisible(room && count == 0);
        drop.setManaged(drop.isVisible());
        drop.setText(waiting != null && free(tree()).contains(waiting) ? "With " + waiting + ": drop another here"
                : String.format(Locale.ROOT, "Drop two perils here by their names; τ inside at least %s", Digits.two(rest())));
    }

    private void build(int count) {
        groups.getChildren().clear();
        for (int k = 0; k < count; k++) {
            String path = GROUPS + "[" + k + "]";
            int place = k;
            boolean byTheta = tree().has(path + ".theta");
            AmountField strength = new TreeNumber(session, Side.PORTFOLIO, path + (byTheta ? ".theta" : ".kendallTau"), byTheta ? "θ inside" : "τ inside", "τ of a group",
                    AmountText.Kind.NUMBER).field();
            Button remove = new Button("Remove");
            remove.getStyleClass().add("lw-small-button");
            remove.setOnAction(asked -> session.edit("removal of a group", d -> d.withPortfolio(t -> without(t, place))));
            HBox line = new HBox(strength, remove);
            line.getStyleClass().add("lw-controls");
            VBox group = new VBox(new TreeNames(session, Side.PORTFOLIO, path + ".perils", () -> perils(tree()), false, "perils of a group"), line);
            group.getStyleClass().add("lw-group");
            if (tree().size(path + ".groups") > 0) {
                Label inner = new Label("with " + tree().size(path + ".groups") + " closer groups inside, kept as they are in the file");
                inner.getStyleClass().add("lw-note");
                inner.setWrapText(true);
                group.getChildren().add(inner);
            }
            groups.getChildren().add(group);
        }
    }

    private static FileTree without(FileTree tree, int place) {
        FileTree rest = tree.remove(GROUPS + "[" + place + "]");
        return rest.size(GROUPS) == 0 ? rest.remove(GROUPS) : rest;
    }

    private void dropped(String peril) {
        if (waiting == null || waiting.equals(peril) || !free(tree()).contains(waiting)) {
            waiting = peril;
            drop.setText("With " + peril + ": drop another here");
        } else {
            addGroup(List.of(waiting, peril));
            waiting = null;
        }
    }

    private void addGroup(List<String> perils) {
        double tau = Math.min(MOST, Math.rint(100 * (rest() + CLOSER)) / 100);
        Map<String, Object> group = new LinkedHashMap<>();
        group.put("perils", perils);
        group.put("kendallTau", tau);
        session.edit("a new group", d -> d.withPortfolio(t -> {
            FileTree listed = t.has(GROUPS) ? t : t.set(GROUPS, List.of());
            return listed.insert(GROUPS, listed.size(GROUPS), group);
        }));
    }

    /** τ of the perils outside of all groups. */
    private double rest() {
        double tau = tree().number(COPULA + ".kendallTau");
        return Double.isNaN(tau) ? 0 : tau;
    }

    private static List<String> perils(FileTree tree) {
        List<String> names = new ArrayList<>();
        for (int i = 0; i < tree.size("perils"); i++) {
            names.add(String.valueOf(tree.text("perils[" + i + "].name")));
        }
        return names;
    }

    /** Perils in no group. */
    private static List<String> free(FileTree tree) {
        List<String> free = new ArrayList<>(perils(tree));
        taken(tree, COPULA, free);
        return free;
    }

    private static void taken(FileTree tree, String path, List<String> free) {
        for (int k = 0; k < tree.size(path + ".groups"); k++) {
            String group = path + ".groups[" + k + "]";
            if (tree.get(group + ".perils") instanceof List<?> names) {
                free.removeAll(names);
            }
            taken(tree, group, free);
        }
    }
}
