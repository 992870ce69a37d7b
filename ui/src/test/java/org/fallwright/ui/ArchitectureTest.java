package org.fallwright.ui;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import org.junit.jupiter.api.Test;

/** The direction of dependencies, no package cycles, and the classes that must not be used. */
@AnalyzeClasses(packages = "org.fallwright", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
  @ArchTest
  static final ArchRule CORE_KNOWS_NO_WINDOWS_PLUGIN_LOADER_OR_MAP_FILES =
      noClasses()
          .that()
          .resideInAPackage("org.fallwright.core..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "javax.swing..",
              "java.awt..",
              "org.pf4j..",
              "org.geotools..",
              "org.jxmapviewer..",
              "org.sqlite..",
              "org.fallwright.maps..",
              "org.fallwright.plugins..",
              "org.fallwright.ui..");

  @ArchTest
  static final ArchRule MAPS_KNOW_ONLY_THE_CORE =
      noClasses()
          .that()
          .resideInAPackage("org.fallwright.maps..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "org.fallwright.plugins..", "org.fallwright.ui..", "javax.swing..", "org.pf4j..");

  @ArchTest
  static final ArchRule PLUGINS_KNOW_NEITHER_MAPS_NOR_DESK =
      noClasses()
          .that()
          .resideInAPackage("org.fallwright.plugins..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "org.fallwright.maps..", "org.fallwright.ui..", "javax.swing..", "org.geotools..");

  @ArchTest
  static final ArchRule THE_DESK_MEETS_PLUGINS_ONLY_THROUGH_THE_HOST =
      noClasses()
          .that()
          .resideInAPackage("org.fallwright.ui..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "org.fallwright.plugins.handline..",
              "org.fallwright.plugins.vehicle..",
              "org.fallwright.plugins.winch..",
              "org.fallwright.plugins.blocksystem..",
              "org.pf4j..");

  @ArchTest
  static final ArchRule THE_STATICS_KNOW_NO_SOURCE =
      noClasses()
          .that()
          .resideInAnyPackage("org.fallwright.core.statics..", "org.fallwright.core.cut..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "org.fallwright.core.pull..",
              "org.fallwright.core.plan..",
              "org.fallwright.core.store..",
              "com.fasterxml.jackson..");

  @ArchTest
  static final ArchRule NOTHING_OPENS_A_CONNECTION =
      noClasses()
          .should()
          .dependOnClassesThat()
          .haveFullyQualifiedName("java.net.HttpURLConnection")
          .orShould()
          .dependOnClassesThat()
          .haveFullyQualifiedName("java.net.Socket")
          .orShould()
          .dependOnClassesThat()
          .resideInAPackage("java.net.http..")
          .orShould()
          .callMethod("java.net.URL", "openStream")
          .orShould()
          .callMethod("java.net.URL", "openConnection");

  @ArchTest
  static final ArchRule NO_CLASS_THAT_WOULD_GO_TO_THE_NETWORK_BY_ITSELF =
      noClasses()
          .should()
          .dependOnClassesThat()
          .haveFullyQualifiedName("org.jxmapviewer.JXMapKit")
          .orShould()
          .dependOnClassesThat()
          .haveFullyQualifiedName("org.jxmapviewer.OSMTileFactoryInfo")
          .orShould()
          .dependOnClassesThat()
          .haveFullyQualifiedName("org.jxmapviewer.viewer.DefaultTileFactory");

  @ArchTest
  static final ArchRule NO_PACKAGE_CYCLES_IN_THE_CORE =
      slices().matching("org.fallwright.core.(*)..").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule NO_PACKAGE_CYCLES_IN_THE_MAPS =
      slices().matching("org.fallwright.maps.(*)..").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule NO_PACKAGE_CYCLES_AT_THE_DESK =
      slices().matching("org.fallwright.ui.(**)").should().beFreeOfCycles();

  @Test
  void theRulesSeeTheWholeProgram() {
    JavaClasses all =
        new com.tngtech.archunit.core.importer.ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("org.fallwright");
    for (String room :
        new String[] {
          "org.fallwright.core.statics",
          "org.fallwright.maps.frame",
          "org.fallwright.plugins.host",
          "org.fallwright.ui.app"
        }) {
      org.assertj.core.api.Assertions.assertThat(all.containPackage(room)).as(room).isTrue();
    }
  }
}
