package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.TreeSet;
import layerweft.report.ReportInput.OfProgramme;
import layerweft.report.ReportModel.Section;

/** How the figures were made, what they leave out, and what is needed to make them again. */
final class MethodPage {
    static final String CARE = "A price supports qualified judgement; it does not replace it, and it defers to local regulation and licensed practice. The figures "
            + "leave out errors of the models and their parameters, perils that are not modelled, the wording of contracts, and credit risk.";

    private MethodPage() {}

    static Section of(ReportInput input) {
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Block.Heading("Method"));
        blocks.add(new Block.Points(List.of(
                "Each peril has a law of its annual number of events and a law of the loss of an event; a copula joins the perils' annual counts or annual totals.",
                "Terms apply in this order: quota share; franchise or retention and limit of each event; the annual deductible; the annual limit last.",
                "The transform engine computes the law of a layer's annual loss on a lattice by fast Fourier transform, averaging over the copula's latent variables; its errors "
                        + "are estimates from finer lattices and rules.",
                "The simulation engine plays years from streams keyed by seed and block: the same seed gives the same digits whatever the number of threads. Its errors are "
                        + "one standard error. Programmes are compared on the same years, so that errors of differences are small.",
                "Proven bounds of an expected loss hold for every dependence between the perils' annual sums; attained ones were found by rearrangement "
                        + "(Embrechts, Puccetti and Rüschendorf 2013).")));
        blocks.add(new Block.Heading("Limits and care"));
        blocks.add(new Block.Paragraph(CARE));
        blocks.add(new Block.Points(List.of(
                "An error shown is of computation only: it says nothing of whether the models are right.",
                "Dependence is the least known of all inputs: the pages on dependence show how far it can move a price.",
                "Figures beyond the return periods that the data reach are extrapolations of the models.")));
        blocks.add(new Block.Heading("To make it again"));
        blocks.add(new Table("", List.of("What", "value"), facts(input)));
        return new Section("Method, limits, reproduction", blocks);
    }

    private static List<List<Cell>> facts(ReportInput input) {
        List<List<Cell>> facts = new ArrayList<>();
        facts.add(fact("program", "Layerweft " + input.version()));
        facts.add(fact("seed", Long.toString(input.settings().seed())));
        facts.add(fact("simulated years", String.format(Locale.ROOT, "%,d", input.settings().years())));
        for (OfProgramme programme : input.programmes()) {
            TreeSet<String> engines = new TreeSet<>();
            programme.quote().layers().forEach(layer -> engines.add(layer.engine().label()));
            facts.add(fact("engines of " + programme.treaty().programme().name(), "layers by " + String.join(" and ", engines) + "; the whole by simulation"));
        }
        input.files().forEach(file -> facts.add(fact("SHA-256 of " + file.name(), file.sha256())));
        return facts;
    }

    private static List<Cell> fact(String what, String value) {
        return List.of(Cell.words(what), Cell.words(value));
    }
}
