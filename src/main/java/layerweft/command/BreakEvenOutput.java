package layerweft.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import layerweft.study.BreakEven;

/** Break-even strengths for programs and spreadsheets. */
final class BreakEvenOutput {

    private BreakEvenOutput() {}

    static String json(BreakEven found) {
        ObjectNode root = Json.object();
        root.put("portfolio", found.portfolio().name());
        root.put("currency", found.portfolio().currency());
        root.put("unit", found.portfolio().unit());
        root.put("version", Version.current());
        ArrayNode answers = root.putArray("breakEven");
        found.answers().forEach(a -> answer(answers.addObject(), found, a));
        return Json.write(root);
    }

    static void answer(ObjectNode node, BreakEven found, BreakEven.Answer a) {
        node.put("first", found.first().name());
        node.put("second", found.second().name());
        node.put("measure", found.measure().label());
        node.put("family", a.family().label());
        node.put("answer", word(a));
        ArrayNode taus = node.putArray("taus");
        ArrayNode errors = node.putArray("errors");
        a.taus().forEach(tau -> {
            taus.add(tau.value());
            errors.add(tau.error());
        });
        node.put("cheaperBelow", a.cheaperBelow());
        node.put("from", a.from());
        node.put("to", a.to());
        ObjectNode difference = node.putObject("difference");
        Json.put(difference, "from", a.differenceFrom().value());
        Json.put(difference, "fromError", a.differenceFrom().error());
        Json.put(difference, "to", a.differenceTo().value());
        Json.put(difference, "toError", a.differenceTo().error());
    }

    static String csv(BreakEven found) {
        Csv csv = new Csv();
        List.of("first", "second", "measure", "family", "answer", "taus", "cheaperBelow", "from", "to").forEach(csv::cell);
        csv.pair("difference at from").pair("difference at to").endOfRow();
        for (BreakEven.Answer a : found.answers()) {
            csv.cell(found.first().name()).cell(found.second().name()).cell(found.measure().label()).cell(a.family().label()).cell(word(a));
            csv.cell(a.taus().stream().map(tau -> Double.toString(tau.value())).collect(Collectors.joining(" ")));
            csv.cell(a.cheaperBelow() == null ? "" : a.cheaperBelow()).cell(a.from()).cell(a.to());
            csv.pair(a.differenceFrom()).pair(a.differenceTo()).endOfRow();
        }
        return csv.toString();
    }

    private static String word(BreakEven.Answer a) {
        return a.outcome().name().toLowerCase(Locale.ROOT);
    }
}
