package layerweft.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.function.Function;
import layerweft.engine.simulation.PerilShares;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.portfolio.Peril;
import layerweft.study.Drivers;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** {@code drivers}: which perils a layer's loss comes from. */
@Command(name = "drivers", sortOptions = false, mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "Show which perils drive each layer, and what the buyer keeps, in all years and in bad ones: those from the value at risk at the "
                + "buyer's tail level on. A year's layer loss is shared out by what the perils brought of the year's occurrence losses; parts add up.",
        footerHeading = "%nExamples:%n", footer = {
            "  drivers book.json cats.json",
            "  drivers book.json cats.json --years 5000000 --format csv --out drivers.csv",
            "", "Exit status: 0 done, 1 a failure of the program, 2 the command or a file is wrong."})
final class DriversCommand implements Callable<Integer> {
    private static final String KEPT = "kept";

    @Spec
    private CommandSpec spec;

    @Mixin
    private TreatyFiles files;

    @Mixin
    private SimulationOptions simulation;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        output.checkTarget();
        var treaty = files.read();
        try (Progress progress = new Progress("drivers")) {
            Drivers found = Drivers.of(treaty, simulation.settings(), progress);
            output.write(switch (output.format()) {
                case TEXT -> text(found);
                case JSON -> json(found);
                case CSV -> csv(found);
            }, spec.commandLine().getOut());
        }
        return 0;
    }

    private static List<String> perils(Drivers found) {
        return found.treaty().portfolio().perils().stream().map(Peril::name).toList();
    }

    private static String text(Drivers found) {
        StringBuilder text = new StringBuilder();
        text.append(String.format(Locale.ROOT, "%s%n%,d years simulated, seed %d. ± is one standard error.%n%n", found.treaty().programme().name(),
                found.settings().years(), found.settings().seed()));
        text.append(table(found, "share of the expected loss", PerilShares::expectedShare)).append('\n');
        text.append(table(found, "share in bad years", PerilShares::badShare));
        String level = FigureText.plainPercent(found.treaty().programme().buyer().tailLevel());
        text.append("Bad years: from the value at risk at ").append(level).append(" on. Kept: gross losses less recoveries, without premiums.\n");
        return text.toString();
    }

    private static String table(Drivers found, String title, Function<PerilShares, List<Figure>> of) {
        List<String> header = new ArrayList<>(List.of(title));
        for (String peril : perils(found)) {
            header.add(peril);
            header.add("");
        }
        TextTable table = new TextTable(header.toArray(String[]::new));
        for (int j = 0; j < found.layers().size(); j++) {
            table.row(row(found.treaty().layer(j).name(), of.apply(found.layers().get(j))));
        }
        table.row(row(KEPT, of.apply(found.kept())));
        return table.toString();
    }

    private static String[] row(String name, List<Figure> shares) {
        List<String> row = new ArrayList<>(List.of(name));
        for (Figure share : shares) {
            row.add(FigureText.percent(share));
            row.add(FigureText.percentError(share));
        }
        return row.toArray(String[]::new);
    }

    private static String json(Drivers found) {
        ObjectNode root = Json.object();
        root.put("portfolio", found.treaty().portfolio().name());
        root.put("programme", found.treaty().programme().name());
        root.put("currency", found.treaty().portfolio().currency());
        root.put("unit", found.treaty().portfolio().unit());
        root.put("seed", found.settings().seed());
        root.put("years", found.settings().years());
        root.put("version", Version.current());
        Json.put(root, "tailLevel", found.treaty().programme().buyer().tailLevel());
        ArrayNode layers = root.putArray("layers");
        for (int j = 0; j < found.layers().size(); j++) {
            ObjectNode layer = layers.addObject();
            layer.put("name", found.treaty().layer(j).name());
            shares(layer, perils(found), found.layers().get(j));
        }
        shares(root.putObject(KEPT), perils(found), found.kept());
        return Json.write(root);
    }

    private static void shares(ObjectNode node, List<String> perils, PerilShares shares) {
        Json.put(node, "badFrom", shares.badFrom());
        Json.put(node, "badChance", shares.badChance());
        ArrayNode list = node.putArray("perils");
        for (int i = 0; i < perils.size(); i++) {
            ObjectNode one = list.addObject();
            ObjectNode errors = Json.object();
            one.put("peril", perils.get(i));
            Json.put(one, errors, "expected", shares.expected().get(i));
            Json.put(one, errors, "expectedShare", shares.expectedShare().get(i));
            Json.put(one, errors, "bad", shares.bad().get(i));
            Json.put(one, errors, "badShare", shares.badShare().get(i));
            one.set("errors", errors);
        }
    }

    private static String csv(Drivers found) {
        Csv csv = new Csv();
        csv.cell("layer").cell("peril").pair("expected").pair("share of expected").pair("in bad years").pair("share in bad years").endOfRow();
        for (int j = 0; j <= found.layers().size(); j++) {
            boolean last = j == found.layers().size();
            PerilShares shares = last ? found.kept() : found.layers().get(j);
            for (int i = 0; i < perils(found).size(); i++) {
                csv.cell(last ? KEPT : found.treaty().layer(j).name()).cell(perils(found).get(i)).pair(shares.expected().get(i)).pair(shares.expectedShare().get(i))
                        .pair(shares.bad().get(i)).pair(shares.badShare().get(i)).endOfRow();
            }
        }
        return csv.toString();
    }
}
