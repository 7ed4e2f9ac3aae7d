package saltspoke;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import org.junit.jupiter.api.Test;

/**
 * Holds the one-way arrow of the packages and keeps each outside library in its room. Plain tests
 * instead of ArchUnit's own fields: the build ran none of the fields ("Tests run: 0").
 */
class ArchitectureTest {
  private static final JavaClasses SALTSPOKE =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("saltspoke");

  @Test
  void packagesDependOneWay() {
    ArchRule rule =
        layeredArchitecture()
            .consideringOnlyDependenciesInLayers()
            .withOptionalLayers(true)
            .layer("values")
            .definedBy("saltspoke.values..")
            .layer("sources")
            .definedBy("saltspoke.sources..")
            .layer("fields")
            .definedBy("saltspoke.fields..")
            .layer("places")
            .definedBy("saltspoke.places..")
            .layer("atmosphere")
            .definedBy("saltspoke.atmosphere..")
            .layer("wheel")
            .definedBy("saltspoke.wheel..")
            .layer("advice")
            .definedBy("saltspoke.advice..")
            .layer("atlas")
            .definedBy("saltspoke.atlas..")
            .layer("faces")
            .definedBy("saltspoke.faces..")
            .whereLayer("faces")
            .mayNotBeAccessedByAnyLayer()
            .whereLayer("atlas")
            .mayOnlyBeAccessedByLayers("faces")
            .whereLayer("advice")
            .mayOnlyBeAccessedByLayers("atlas", "faces")
            .whereLayer("wheel")
            .mayOnlyBeAccessedByLayers("advice", "atlas", "faces")
            .whereLayer("atmosphere")
            .mayOnlyBeAccessedByLayers("wheel", "advice", "atlas", "faces")
            .whereLayer("places")
            .mayOnlyBeAccessedByLayers("atmosphere", "wheel", "advice", "atlas", "faces")
            .whereLayer("fields")
            .mayOnlyBeAccessedByLayers("places", "atmosphere", "wheel", "advice", "atlas", "faces")
            .whereLayer("sources")
            .mayOnlyBeAccessedByLayers(
                "fields", "places", "atmosphere", "wheel", "advice", "atlas", "faces");
    rule.check(SALTSPOKE);
  }

  @Test
  void serverAndJsonLiveInFaces() {
    ArchRule rule =
        noClasses()
            .that()
            .resideOutsideOfPackage("saltspoke.faces..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                "org.eclipse.jetty..",
                "com.fasterxml.jackson.databind..",
                "com.fasterxml.jackson.annotation..",
                "picocli..");
    rule.check(SALTSPOKE);
  }

  /** Readers of JSON packages stream tokens; binding JSON to objects stays with the faces. */
  @Test
  void jsonTokensLiveInSourcesAndFaces() {
    ArchRule rule =
        noClasses()
            .that()
            .resideOutsideOfPackages("saltspoke.sources..", "saltspoke.faces..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("com.fasterxml.jackson.core..");
    rule.check(SALTSPOKE);
  }

  @Test
  void csvLivesInSourcesAndExport() {
    ArchRule rule =
        noClasses()
            .that()
            .resideOutsideOfPackages("saltspoke.sources..", "saltspoke.faces.export..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.apache.commons.csv..");
    rule.check(SALTSPOKE);
  }

  @Test
  void geotoolsLivesAtTheEdges() {
    ArchRule rule =
        noClasses()
            .that()
            .resideOutsideOfPackages(
                "saltspoke.sources..",
                "saltspoke.fields..",
                "saltspoke.places..",
                "saltspoke.faces.export..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.geotools..");
    rule.check(SALTSPOKE);
  }

  /** A clock that jumps can then move no time limit and no answer. */
  @Test
  void nothingReadsTheClockInMilliseconds() {
    ArchRule rule =
        noClasses()
            .should()
            .callMethod(System.class, "currentTimeMillis")
            .orShould()
            .callMethod(java.time.Instant.class, "now");
    rule.check(SALTSPOKE);
  }

  @Test
  void physicsIsPure() {
    ArchRule rule =
        noClasses()
            .that()
            .resideInAnyPackage(
                "saltspoke.values..",
                "saltspoke.atmosphere..",
                "saltspoke.wheel..",
                "saltspoke.advice..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                "java.io..",
                "java.nio.file..",
                "java.net..",
                "java.time..",
                "org.slf4j..",
                "java.util.logging..");
    rule.check(SALTSPOKE);
  }
}
