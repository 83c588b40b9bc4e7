package layerweft;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The floors of the program: arrows of use point down only. */
@AnalyzeClasses(packages = "layerweft", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    @ArchTest
    static final ArchRule arrowsOfUsePointDown = layeredArchitecture().consideringOnlyDependenciesInLayers().withOptionalLayers(true)
            .layer("main").definedBy("layerweft")
            .layer("command").definedBy("layerweft.command..")
            .layer("desktop").definedBy("layerweft.desktop..")
            .layer("report").definedBy("layerweft.report..")
            .layer("file").definedBy("layerweft.file..")
            .layer("study").definedBy("layerweft.study..")
            .layer("engine").definedBy("layerweft.engine..")
            .layer("figures").definedBy("layerweft.figures..")
            .layer("model").definedBy("layerweft.model..")
            .whereLayer("main").mayNotBeAccessedByAnyLayer()
            .whereLayer("command").mayOnlyBeAccessedByLayers("main")
            .whereLayer("desktop").mayOnlyBeAccessedByLayers("main")
            .whereLayer("report").mayOnlyBeAccessedByLayers("desktop", "command")
            .whereLayer("file").mayOnlyBeAccessedByLayers("report", "desktop", "command", "main")
            .whereLayer("study").mayOnlyBeAccessedByLayers("report", "desktop", "command", "main")
            .whereLayer("engine").mayOnlyBeAccessedByLayers("study", "report", "desktop", "command")
            .whereLayer("figures").mayOnlyBeAccessedByLayers("engine", "study", "report", "desktop", "command")
            .because("a formula lives on one floor, and whoever changes it must not have to look above");

    @ArchTest
    static final ArchRule theModelKnowsNoEdges = noClasses().that()
            .resideInAnyPackage("layerweft.model..", "layerweft.engine..", "layerweft.figures..", "layerweft.study..")
            .should().dependOnClassesThat().resideInAnyPackage("com.fasterxml..", "picocli..", "javafx..", "de.siegmar..", "me.tongfei..")
            .because("files, commands and windows come and go; the model and its prices stay");

    @ArchTest
    static final ArchRule theTwoEnginesDoNotKnowEachOther = noClasses().that().resideInAPackage("layerweft.engine.simulation..")
            .should().dependOnClassesThat().resideInAPackage("layerweft.engine.transform..")
            .because("each engine is the other's check");
}
