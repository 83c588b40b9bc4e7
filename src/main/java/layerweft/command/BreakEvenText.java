package layerweft.command;

import java.util.List;
import java.util.stream.Collectors;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.study.BreakEven;

/** Break-even strengths as text: a row for each family. */
final class BreakEvenText {

    private BreakEvenText() {}

    static String of(BreakEven found) {
        String money = (found.portfolio().currency() + " " + found.portfolio().unit()).strip();
        TextTable table = new TextTable("", "break-even τ", "", "cheaper below", "looked at", "difference at low τ", "", "at high τ", "");
        for (BreakEven.Answer a : found.answers()) {
            table.row(a.family().label(), taus(a), errors(a.taus()), a.cheaperBelow() == null ? "—" : a.cheaperBelow(),
                    "τ " + FigureText.plain(a.from()) + " to " + FigureText.plain(a.to()), FigureText.value(a.differenceFrom()),
                    FigureText.error(a.differenceFrom()), FigureText.value(a.differenceTo()), FigureText.error(a.differenceTo()));
        }
        StringBuilder text = new StringBuilder(found.portfolio().name()).append('\n');
        text.append("First: ").append(found.first().name()).append(". Second: ").append(found.second().name()).append(".\n");
        text.append("By ").append(basis(found.measure())).append(", ").append(money).append(". Difference: first less second.\n\n").append(table).append('\n');
        if (found.answers().size() > 1 && found.answers().stream().map(BreakEven.Answer::outcome).distinct().count() == 1
                && found.answers().get(0).outcome() != BreakEven.Outcome.CROSSES) {
            text.append("With every family: ").append(inWords(found, found.answers().get(0))).append(".\n");
        } else {
            found.answers().forEach(a -> text.append(a.family().label()).append(": ").append(inWords(found, a)).append(".\n"));
        }
        return text.toString();
    }

    private static String basis(BreakEven.Measure measure) {
        return switch (measure) {
            case EXPECTED_COST -> "expected cost to the buyer: premiums with reinstatement premium less expected recoveries";
            case COST_OF_RISK -> "cost of risk: expected net position with all premiums, and the cost of capital on what its tail has beyond that";
        };
    }

    private static String taus(BreakEven.Answer a) {
        return a.taus().isEmpty() ? "none" : a.taus().stream().map(FigureText::value).collect(Collectors.joining(", "));
    }

    private static String errors(List<Figure> taus) {
        return taus.size() == 1 ? FigureText.error(taus.get(0)) : "";
    }

    private static String inWords(BreakEven found, BreakEven.Answer a) {
        String first = found.first().name();
        String second = found.second().name();
        return switch (a.outcome()) {
            case ALWAYS -> first + " is cheaper at every τ";
            case NEVER -> second + " is cheaper at every τ";
            case EQUAL -> "the costs do not differ by more than their errors at any τ";
            case UNDEFINED -> "a cost is infinite or not defined";
            case CROSSES -> a.cheaperBelow() + " is cheaper below τ " + FigureText.value(a.taus().get(0)) + ", "
                    + (a.cheaperBelow().equals(first) ? second : first) + " above" + (a.taus().size() > 1 ? ", and so on in turn" : "");
        };
    }
}
