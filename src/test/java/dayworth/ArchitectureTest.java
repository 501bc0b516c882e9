package dayworth;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.assignableFrom;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.belongToAnyOf;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.syntax.elements.GivenClassesConjunction;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
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
        .layer("buildup")
        .definedBy("dayworth.buildup")
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
        .whereLayer("buildup")
        .mayOnlyBeAccessedByLayers("decision", "casefile", "report", "command")
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
  void theBuildUpKnowsNothingButValues() {
    noClasses()
        .that()
        .resideInAPackage("dayworth.buildup")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("dayworth.network..", "dayworth.engine..", "dayworth.contract..")
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
    core()
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("java.io", "java.nio..")
        .check(CLASSES);
    core()
        .should()
        .dependOnClassesThat(
            resideInAPackage("java.time..")
                .and(not(belongToAnyOf(LocalDate.class, DayOfWeek.class, ChronoUnit.class)))
                .and(not(assignableFrom(LocalDate.class)))
                .and(not(assignableFrom(ChronoUnit.class))))
        .check(CLASSES);
    core().should().callMethod(LocalDate.class, "now").check(CLASSES);
  }

  /** A date is a value; what day it is today only the ends may ask. */
  private static GivenClassesConjunction core() {
    return noClasses()
        .that()
        .resideOutsideOfPackages("dayworth.casefile", "dayworth.report..", "dayworth.command");
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
