package org.rolltrace.core;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/** What the packages may know of each other. */
@AnalyzeClasses(
    packages = "org.rolltrace.core",
    importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
  /** The packages that each may use directly; what those may use comes with them. */
  private static final Map<String, List<String>> MAY_USE =
      Map.ofEntries(
          Map.entry("quantity", List.of()),
          Map.entry("atmosphere", List.of("quantity")),
          Map.entry("aeroplane", List.of("quantity")),
          Map.entry("derivatives", List.of("aeroplane", "atmosphere")),
          Map.entry("propeller", List.of("aeroplane", "atmosphere")),
          Map.entry("pilot", List.of("quantity")),
          Map.entry("controls", List.of("aeroplane", "atmosphere", "pilot")),
          Map.entry("motion", List.of("derivatives", "propeller", "controls")),
          Map.entry("history", List.of("quantity")),
          Map.entry("flight", List.of("motion", "history")),
          Map.entry("measures", List.of("motion", "history")),
          Map.entry("scenario", List.of("motion", "measures")),
          Map.entry("run", List.of("scenario", "flight")),
          Map.entry("files", List.of("run")));

  @ArchTest
  static final ArchRule NO_CYCLES =
      slices().matching("org.rolltrace.core.(*)..").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule NO_WINDOW_TOOLKIT =
      noClasses()
          .should()
          .dependOnClassesThat(resideInAnyPackage("javafx..", "java.awt..", "javax.swing.."));

  @ArchTest
  static final ArchRule JACKSON_ONLY_IN_FILES =
      noClasses()
          .that(not(resideInAPackage("org.rolltrace.core.files")))
          .should()
          .dependOnClassesThat(resideInAPackage("com.fasterxml.jackson.."));

  @ArchTest
  static final ArchRule INTEGRATOR_ONLY_IN_FLIGHT =
      noClasses()
          .that(not(resideInAPackage("org.rolltrace.core.flight")))
          .should()
          .dependOnClassesThat(resideInAPackage("org.hipparchus.ode.."));

  @ArchTest
  static final ArchRule NO_PRINTING =
      noClasses()
          .should()
          .accessField(System.class, "out")
          .orShould()
          .accessField(System.class, "err")
          .orShould()
          .callMethod(System.class, "exit", int.class);

  @TestFactory
  List<DynamicTest> packagesUseOnlyWhatTheyMay() {
    var classes =
        new com.tngtech.archunit.core.importer.ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("org.rolltrace.core");
    var found = new TreeSet<String>();
    classes.forEach(c -> found.add(packageOf(c.getPackageName())));
    return found.stream()
        .map(
            name ->
                DynamicTest.dynamicTest(
                    name,
                    () -> {
                      var allowed = new TreeSet<String>();
                      collect(name, allowed);
                      String[] forbidden =
                          found.stream()
                              .filter(other -> !allowed.contains(other))
                              .map(other -> "org.rolltrace.core." + other + "..")
                              .toArray(String[]::new);
                      noClasses()
                          .that(resideInAPackage("org.rolltrace.core." + name + ".."))
                          .should()
                          .dependOnClassesThat(resideInAnyPackage(forbidden))
                          .allowEmptyShould(true)
                          .check(classes);
                    }))
        .toList();
  }

  private static String packageOf(String name) {
    return name.substring("org.rolltrace.core.".length());
  }

  private static void collect(String name, TreeSet<String> allowed) {
    if (!MAY_USE.containsKey(name)) {
      throw new AssertionError("package " + name + " has no line in the table of this test");
    }
    if (allowed.add(name)) {
      MAY_USE.get(name).forEach(used -> collect(used, allowed));
    }
  }
}
