package dayworth;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import org.junit.jupiter.api.Test;

/** The arrows between the packages, and who may touch the world. */
class ArchitectureTest {

  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("dayworth");

  @Test
  void packagesUseOnlyWhatStandsAboveThem() {
    layeredArchitecture()
        .consideringOnlyDependenciesInLayers()
        .layer("value")
        .definedBy("dayworth.value")
        .layer("network")
        .definedBy("dayworth.network")
        .layer("engine")
        .definedBy("dayworth.engine..")
        .layer("contract")
        .definedBy("dayworth.contract")
        .layer("decision")
        .definedBy("dayworth.decision")
        .layer("casefile")
        .definedBy("dayworth.casefile")
        .layer("report")
        .definedBy("dayworth.report..")
        .layer("command")
        .definedBy("dayworth.command")
        .whereLayer("command")
        .mayNotBeAccessedByAnyLayer()
        .whereLayer("report")
        .mayOnlyBeAccessedByLayers("command")
        .whereLayer("casefile")
        .mayOnlyBeAccessedByLayers("command")
        .whereLayer("decision")
        .mayOnlyBeAccessedByLayers("casefile", "report", "command")
        .whereLayer("contract")
        .mayOnlyBeAccessedByLayers("decision", "casefile", "report", "command")
        .whereLayer("engine")
        .mayOnlyBeAccessedByLayers("contract", "decision", "casefile", "report", "command")
        .whereLayer("network")
        .mayOnlyBeAccessedByLayers(
            "engine", "contract", "decision", "casefile", "report", "command")
        .check(CLASSES);
  }

  @Test
  void theTwoWaysAndTheCheckerDoNotKnowEachOther() {
    for (String one : new String[] {"stepping", "linear", "proof"}) {
      for (String other : new String[] {"stepping", "linear", "proof"}) {
        if (!one.equals(other)) {
          noClasses()
              .that()
              .resideInAPackage("dayworth.engine." + one + "..")
              .should()
              .dependOnClassesThat()
              .resideInAPackage("dayworth.engine." + other + "..")
              .check(CLASSES);
        }
      }
    }
  }

  @Test
  void onlyTheEndsTouchFilesClocksAndStreams() {
    noClasses()
        .that()
        .resideOutsideOfPackages("dayworth.casefile", "dayworth.report..", "dayworth.command")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("java.io", "java.nio..", "java.time..")
        .check(CLASSES);
  }

  @Test
  void librariesStayWhereTheyBelong() {
    noClasses()
        .that()
        .resideOutsideOfPackage("dayworth.command")
        .should()
        .dependOnClassesThat()
        .resideInAPackage("picocli..")
        .check(CLASSES);
    noClasses()
        .that()
        .resideOutsideOfPackages("dayworth.casefile", "dayworth.report..")
        .should()
        .dependOnClassesThat()
        .resideInAPackage("org.apache.commons.csv..")
        .check(CLASSES);
    noClasses()
        .that()
        .resideOutsideOfPackage("dayworth.report..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("tools.jackson..", "com.fasterxml..")
        .check(CLASSES);
    noClasses()
        .that()
        .resideOutsideOfPackage("dayworth.report.picture")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("org.knowm..", "org.apache.batik..", "java.awt..", "org.w3c.dom..")
        .check(CLASSES);
    noClasses()
        .that()
        .resideOutsideOfPackages("dayworth.report.picture", "dayworth.command")
        .should()
        .dependOnClassesThat()
        .resideInAPackage("dayworth.report.picture")
        .check(CLASSES);
    noClasses()
        .that()
        .resideOutsideOfPackages("dayworth.engine.linear", "dayworth.engine.measures")
        .should()
        .dependOnClassesThat()
        .resideInAPackage("org.ojalgo..")
        .check(CLASSES);
  }
}
