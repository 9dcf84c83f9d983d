package org.rolltrace.ui;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** What the front ends may know of each other and of the libraries beneath. */
@AnalyzeClasses(packages = "org.rolltrace.ui", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
  @ArchTest
  static final ArchRule NO_CYCLES =
      slices().matching("org.rolltrace.ui.(*)..").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule FILES_ARE_READ_IN_CORE =
      noClasses().should().dependOnClassesThat().resideInAPackage("com.fasterxml.jackson..");

  @ArchTest
  static final ArchRule EQUATIONS_ARE_INTEGRATED_IN_CORE =
      noClasses().should().dependOnClassesThat().resideInAPackage("org.hipparchus..");

  @ArchTest
  static final ArchRule COMMANDS_OPEN_NO_WINDOW =
      noClasses()
          .that()
          .resideInAnyPackage("org.rolltrace.ui.command..", "org.rolltrace.ui.launch..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("javafx..", "java.awt..", "javax.swing..");

  @ArchTest
  static final ArchRule DRAWINGS_KNOW_NO_WINDOW =
      noClasses()
          .that()
          .resideInAPackage("org.rolltrace.ui.chart..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("javafx..", "javax.swing..", "picocli..");

  @ArchTest
  static final ArchRule ONLY_PICTURES_ARE_PAINTED_BY_AWT =
      noClasses()
          .that()
          .resideInAPackage("org.rolltrace.ui.chart..")
          .and()
          .doNotHaveSimpleName("PngPainter")
          .should()
          .dependOnClassesThat()
          .resideInAPackage("java.awt..");

  @ArchTest
  static final ArchRule ONLY_THE_LAUNCHER_ENDS_THE_PROGRAM =
      noClasses()
          .that()
          .resideOutsideOfPackage("org.rolltrace.ui.launch")
          .should()
          .callMethod(System.class, "exit", int.class);

  @ArchTest
  static final ArchRule THE_SESSION_HAS_NO_NODES =
      noClasses()
          .that()
          .resideInAPackage("org.rolltrace.ui.session..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "javafx.application..",
              "javafx.scene..",
              "javafx.stage..",
              "javafx.animation..",
              "javafx.concurrent..",
              "java.awt..",
              "javax.swing..");

  @ArchTest
  static final ArchRule WORK_KNOWS_NOTHING_OF_THE_WINDOW =
      noClasses()
          .that()
          .resideInAPackage("org.rolltrace.ui.task..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("javafx..", "java.awt..", "javax.swing..", "org.rolltrace.core..");

  @ArchTest
  static final ArchRule MODELS_KNOW_NO_NODES =
      noClasses()
          .that()
          .resideInAnyPackage("org.rolltrace.ui.manoeuvre..", "org.rolltrace.ui.build..")
          .and()
          .haveSimpleNameEndingWith("Model")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("javafx.scene..", "javafx.stage..", "javafx.application..");

  @ArchTest
  static final ArchRule WORKPLACES_KNOW_NOT_EACH_OTHER =
      noClasses()
          .that()
          .resideInAPackage("org.rolltrace.ui.build..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "org.rolltrace.ui.manoeuvre..",
              "org.rolltrace.ui.desk..",
              "java.awt..",
              "javax.swing..");

  @ArchTest
  static final ArchRule CONTROLS_KNOW_NO_WORKPLACE =
      noClasses()
          .that()
          .resideInAPackage("org.rolltrace.ui.control..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "org.rolltrace.ui.build..",
              "org.rolltrace.ui.manoeuvre..",
              "org.rolltrace.ui.desk..");
}
