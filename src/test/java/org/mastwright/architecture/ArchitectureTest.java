package org.mastwright.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaField;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Who may use whom, and what is never used; each rule is seen to fail on a planted violation. */
class ArchitectureTest {
  private static final String ROOT = "org.mastwright.";
  private static final JavaClasses MAIN =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("org.mastwright");
  private static final JavaClasses PLANTED =
      new ClassFileImporter().importPackages("org.mastwright.architecture.planted");

  /** Packages of ours that a package may use besides itself. */
  private static final Map<String, List<String>> MAY_USE =
      Map.ofEntries(
          Map.entry("units", List.of()),
          Map.entry("working", List.of("units")),
          Map.entry("design", List.of("units")),
          Map.entry("forces", List.of("design", "units")),
          Map.entry("frame", List.of()),
          Map.entry("file", List.of("design", "working", "units", "assess", "forces")),
          Map.entry("wind", List.of("design", "working", "units")),
          Map.entry("rotor", List.of("wind", "design", "working", "units")),
          Map.entry("loads", List.of("wind", "rotor", "design", "forces", "working", "units")),
          Map.entry("mast", List.of("loads", "design", "frame", "forces", "working", "units")),
          Map.entry("resonance", List.of("design", "working", "units")),
          Map.entry("checks", List.of("forces", "design", "working", "units")),
          Map.entry("report", List.of("assess", "design", "forces", "working", "units")),
          Map.entry(
              "cli", List.of("file", "assess", "report", "design", "forces", "working", "units")));

  private static ArchRule onlyUses(String name, String home, List<String> allowed) {
    List<String> packages = new ArrayList<>();
    for (String other : allowed) {
      packages.add(ROOT + other);
    }
    DescribedPredicate<JavaClass> foreign =
        DescribedPredicate.describe(
            "of a package that " + name + " may not use",
            c ->
                c.getPackageName().startsWith(ROOT)
                    && !c.getPackageName().startsWith(home)
                    && packages.stream().noneMatch(p -> c.getPackageName().startsWith(p)));
    return noClasses().that().resideInAPackage(home + "..").should().dependOnClassesThat(foreign);
  }

  @Test
  void packagesUseOnlyWhatTheyMay() {
    MAY_USE.forEach((name, allowed) -> onlyUses(name, ROOT + name, allowed).check(MAIN));
  }

  @Test
  void plantedUseIsSeen() {
    assertThrows(
        AssertionError.class,
        () -> onlyUses("units", ROOT + "architecture.planted", List.of("units")).check(PLANTED));
  }

  @Test
  void noCyclesBetweenPackages() {
    slices().matching("org.mastwright.(*)..").should().beFreeOfCycles().check(MAIN);
  }

  @Test
  void checksNeverUseEachOther() {
    slices().matching("org.mastwright.checks.(*)..").should().notDependOnEachOther().check(MAIN);
  }

  private static ArchRule library(String prefix, String... homes) {
    return noClasses()
        .that()
        .resideOutsideOfPackages(homes)
        .should()
        .dependOnClassesThat()
        .resideInAPackage(prefix + "..");
  }

  @Test
  void eachLibraryHasOneHome() {
    library("org.ejml", ROOT + "frame..").check(MAIN);
    library("org.snakeyaml", ROOT + "file..").check(MAIN);
    library("tools.jackson", ROOT + "file..").check(MAIN);
    library("picocli", ROOT + "cli..").check(MAIN);
    library("org.thymeleaf", ROOT + "report..").check(MAIN);
    library("com.openhtmltopdf", ROOT + "report..").check(MAIN);
  }

  private static ArchRule noClock() {
    return noClasses()
        .that()
        .resideOutsideOfPackage(ROOT + "cli..")
        .should()
        .callMethod(System.class, "nanoTime")
        .orShould()
        .callMethod(System.class, "currentTimeMillis")
        .orShould()
        .callMethod(Math.class, "random")
        .orShould()
        .accessField(System.class, "out")
        .orShould()
        .accessField(System.class, "err");
  }

  @Test
  void noClockNoConsoleOutsideTheCommandLine() {
    noClock().check(MAIN);
    assertThrows(AssertionError.class, () -> noClock().check(PLANTED));
  }

  private static List<JavaField> mutableStatics(JavaClasses classes) {
    return classes.stream()
        .flatMap(c -> c.getFields().stream())
        .filter(f -> f.getModifiers().contains(JavaModifier.STATIC))
        .filter(f -> !f.getModifiers().contains(JavaModifier.FINAL))
        .filter(f -> !f.getName().contains("$"))
        .toList();
  }

  @Test
  void noStaticFieldCanChange() {
    assertTrue(mutableStatics(MAIN).isEmpty(), mutableStatics(MAIN).toString());
    assertTrue(!mutableStatics(PLANTED).isEmpty());
  }

  @Test
  void formatsNameTheirLocale() {
    ArchRule rule =
        noClasses().should().callMethod(String.class, "format", String.class, Object[].class);
    rule.check(MAIN);
    assertThrows(AssertionError.class, () -> rule.check(PLANTED));
  }

  @Test
  void designAndForcesAreRecordsEnumsAndSealedInterfaces() {
    for (JavaClass c : MAIN) {
      boolean data =
          c.getPackageName().equals(ROOT + "design") || c.getPackageName().equals(ROOT + "forces");
      if (data && !c.getSimpleName().equals("package-info")) {
        assertTrue(c.isRecord() || c.isEnum() || c.isInterface(), c.getName());
      }
    }
  }
}
