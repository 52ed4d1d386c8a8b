package treadwork.viewer;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import org.junit.jupiter.api.Test;

/** What may use what: DEVELOPERS.md says it in words, this in rules. */
class ArchitectureTest {

    private static final JavaClasses PROGRAM = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("treadwork");

    @Test
    void packagesFormNoCycle() {
        slices().matching("treadwork.(**)").should().beFreeOfCycles().check(PROGRAM);
    }

    @Test
    void modelUsesTheJdkOnly() {
        classes()
                .that()
                .resideInAPackage("treadwork.model..")
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage("treadwork.model..", "java.lang..", "java.util..")
                .because("the nouns know no files and no threads")
                .check(PROGRAM);
    }

    @Test
    void fixturesUseTheModelOnly() {
        classes()
                .that()
                .resideInAPackage("treadwork.fixtures..")
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage("treadwork.model..", "treadwork.fixtures..", "java..")
                .check(PROGRAM);
    }

    @Test
    void stepsKnowNoFilesNorThreads() {
        noClasses()
                .that()
                .resideInAPackage("treadwork.solver..")
                .and()
                .resideOutsideOfPackages("treadwork.solver.run..", "treadwork.solver.cli..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(
                        "treadwork.io..",
                        "treadwork.fixtures..",
                        "java.io..",
                        "java.nio.file..",
                        "java.util.concurrent..",
                        "com.fasterxml..",
                        "picocli..")
                .because("a step is a pure function of its input and settings")
                .check(PROGRAM);
    }

    @Test
    void librariesStayOutOfSignaturesThatOtherModulesSee() {
        noClasses()
                .that()
                .resideInAnyPackage("treadwork.solver.cli..", "treadwork.solver.run..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("org.ejml..", "org.apache.commons.math3..")
                .check(PROGRAM);
    }

    @Test
    void onlyTheCommandLinePrints() {
        noClasses()
                .that()
                .resideOutsideOfPackage("treadwork.solver.cli..")
                .should()
                .accessField(System.class, "out")
                .orShould()
                .accessField(System.class, "err")
                .check(PROGRAM);
    }
}
