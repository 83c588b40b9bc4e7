package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.portfolio.Portfolio;
import layerweft.report.ReportInput.OfProgramme;
import layerweft.report.ReportModel.Section;

/** The content of a document, from the figures to the terms they rest on. */
public final class Report {

    private Report() {}

    public static ReportModel of(ReportInput input) {
        List<Section> sections = new ArrayList<>();
        sections.add(SummaryPage.of(input));
        boolean several = input.programmes().size() > 1;
        if (several) {
            sections.add(StructuresPage.of(input.comparison()));
        }
        for (OfProgramme programme : input.programmes()) {
            String of = several ? ": " + programme.treaty().programme().name() : "";
            sections.add(FiguresPage.of(programme, "Programme and figures" + of));
            sections.add(PremiumPage.of(programme.quote(), "Premium build-up" + of));
            sections.add(DependencePage.of(programme, "Dependence" + of));
            sections.add(DriversPage.of(programme.drivers(), "What drives the layers" + of));
        }
        input.files().forEach(file -> sections.add(TermsPage.of(file)));
        sections.add(MethodPage.of(input));
        String programmes = several ? input.programmes().size() + " programmes" : input.programmes().get(0).treaty().programme().name();
        return new ReportModel(input.portfolio().name(), programmes + ". Amounts in " + money(input.portfolio()) + ".", sections);
    }

    /** Currency and unit. */
    static String money(Portfolio portfolio) {
        return (portfolio.currency() + " " + portfolio.unit()).strip();
    }
}
