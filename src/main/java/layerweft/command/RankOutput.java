package layerweft.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import layerweft.figures.Figure;
import layerweft.study.Ranking;
import layerweft.study.Sensitivity;

/** A ranking for programs and spreadsheets. */
final class RankOutput {

    private RankOutput() {}

    static String json(Ranking ranking) {
        ObjectNode root = Json.object();
        root.put("portfolio", ranking.treaty().portfolio().name());
        root.put("programme", ranking.treaty().programme().name());
        root.put("currency", ranking.treaty().portfolio().currency());
        root.put("unit", ranking.treaty().portfolio().unit());
        root.put("version", Version.current());
        root.put("layer", ranking.layer().orElse(null));
        root.put("figure", ranking.figure().label());
        Json.put(root, "value", ranking.base().value());
        Json.put(root, "error", ranking.base().error());
        ArrayNode ranked = root.putArray("ranking");
        ranking.sensitivities().forEach(s -> sensitivity(ranked.addObject(), s));
        ArrayNode notVaried = root.putArray("notVaried");
        ranking.notVaried().forEach(notVaried::add);
        return Json.write(root);
    }

    private static void sensitivity(ObjectNode node, Sensitivity s) {
        node.put("assumption", s.lever().label());
        node.put("peril", s.subject().isEmpty() ? null : s.subject());
        node.put("step", s.step());
        Json.put(node, "value", s.value().value());
        Json.put(node, "change", s.change().value());
        Json.put(node, "error", s.change().error());
        s.reach().ifPresent(r -> {
            ObjectNode reach = node.putObject("reach");
            reach.put("lowest", r.lowest());
            Json.put(reach, "atLowest", r.atLowest().value());
            reach.put("highest", r.highest());
            Json.put(reach, "atHighest", r.atHighest().value());
        });
        s.perStandardError().ifPresent(change -> Json.put(node, "perStandardError", change.value()));
    }

    static String csv(Ranking ranking) {
        Csv csv = new Csv();
        List.of("assumption", "peril", "step").forEach(csv::cell);
        csv.pair("value").pair("change");
        List.of("lowest", "at lowest", "highest", "at highest", "per standard error").forEach(csv::cell);
        csv.endOfRow();
        for (Sensitivity s : ranking.sensitivities()) {
            csv.cell(s.lever().label()).cell(s.subject()).cell(s.step()).pair(s.value()).pair(s.change());
            s.reach().ifPresentOrElse(r -> csv.cell(r.lowest()).cell(r.atLowest().value()).cell(r.highest()).cell(r.atHighest().value()),
                    () -> csv.cell("").cell("").cell("").cell(""));
            csv.cell(s.perStandardError().map(Figure::value).orElse(Double.NaN)).endOfRow();
        }
        return csv.toString();
    }
}
