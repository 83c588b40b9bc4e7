package layerweft.command;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import layerweft.file.TreatyReader;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import layerweft.report.HtmlWriter;
import layerweft.report.PdfWriter;
import layerweft.report.Report;
import layerweft.report.ReportInput;
import layerweft.report.ReportModel;
import layerweft.report.SourceFile;
import layerweft.report.XlsxWriter;
import layerweft.study.SweepRequest;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code report}: a quote as a document. */
@Command(name = "report", sortOptions = false, mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "Write a quote as a document with everything that is needed to defend it and to make it again: figures with errors, premium build-up, "
                + "dependence, drivers, terms in full, method, seed and hashes of the files; with several programmes also their comparison.",
        footerHeading = "%nExamples:%n", footer = {
            "  report book.json cats.json --out quote.html",
            "  report book.json cats.json aggregate.json --out choice.pdf",
            "  report book.json cats.json --years 5000000 --seed 7 --out quote.xlsx",
            "", "Exit status: 0 done, 1 a failure of the program, 2 the command or a file is wrong."})
final class ReportCommand implements Callable<Integer> {
    private static final String NONE = "none";

    @Parameters(index = "0", paramLabel = "PORTFOLIO", description = "Portfolio file (JSON).")
    private Path portfolio;

    @Parameters(index = "1..*", arity = "1..*", paramLabel = "PROGRAMME", description = "Programme files (JSON), one or more.")
    private List<Path> programmes;

    @Option(names = "--out", paramLabel = "FILE", required = true, description = "The document: its form follows its ending, .html, .pdf or .xlsx.")
    private Path out;

    @Option(names = "--families", paramLabel = "A,B,…", description = "Families of the break-evens between programmes, written as gumbel, survival-clayton, student:4; "
            + "none: no break-evens (default: gumbel,student:4,frank,survival-clayton,joe,gaussian,clayton).")
    private String families;

    @Mixin
    private SimulationOptions simulation;

    @Override
    public Integer call() {
        Form form = Form.of(out);
        OutputFile target = new OutputFile(out);
        target.check();
        List<CopulaFamily> asked = NONE.equals(families) ? List.of() : StudyOptions.families(families, SweepRequest.USUAL_FAMILIES);
        List<Programme> read = new ArrayList<>();
        List<SourceFile> files = new ArrayList<>();
        Treaty last = null;
        for (Path file : programmes) {
            last = TreatyReader.read(portfolio, file);
            read.add(last.programme());
        }
        files.add(SourceFile.read(portfolio));
        programmes.forEach(file -> files.add(SourceFile.read(file)));
        try (Progress progress = new Progress("report")) {
            target.write(form.write(Report.of(ReportInput.of(last.portfolio(), read, asked, simulation.settings(), files, Version.current(), progress))));
        }
        return 0;
    }

    /** Forms of a document. */
    private enum Form {
        HTML,
        PDF,
        XLSX;

        static Form of(Path file) {
            String name = String.valueOf(file.getFileName()).toLowerCase(Locale.ROOT);
            for (Form form : values()) {
                if (name.endsWith("." + form.name().toLowerCase(Locale.ROOT))) {
                    return form;
                }
            }
            throw new RunFailedException("--out: " + file + " has no form of a document: admissible is a name that ends in .html, .pdf or .xlsx");
        }

        byte[] write(ReportModel model) {
            return switch (this) {
                case HTML -> HtmlWriter.write(model);
                case PDF -> PdfWriter.write(model);
                case XLSX -> XlsxWriter.write(model);
            };
        }
    }
}
