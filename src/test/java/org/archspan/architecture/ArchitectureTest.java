package org.archspan.architecture;

import static com.tngtech.archunit.core.domain.JavaModifier.FINAL;
import static com.tngtech.archunit.core.domain.JavaModifier.PRIVATE;
import static com.tngtech.archunit.core.domain.JavaModifier.STATIC;
import static com.tngtech.archunit.core.domain.JavaModifier.SYNTHETIC;
import static com.tngtech.archunit.lang.conditions.ArchPredicates.are;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noFields;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaCall;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaField;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.Architectures.LayeredArchitecture;
import java.util.Formatter;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Keeps the packages apart: who may know whom, and what numbers must never touch. */
class ArchitectureTest {
  private static final JavaClasses CODE = new ClassFileImporter()
      .withImportOption(new ImportOption.DoNotIncludeTests()).importPackages("org.archspan");

  private static final List<String> MODEL = List.of("units", "gravity", "closure", "field", "boundary");
  private static final List<String> KERNELS = List.of("linalg", "mesh");
  private static final List<String> NUMBERS = join(List.of(MODEL, KERNELS,
      List.of("disk", "equilibrium", "stability", "spacing", "shear", "comparison", "uncertainty", "inference",
          "observe", "rivals")));

  /** Every package and the packages that it may use; a new package is added here. */
  private static Map<String, List<String>> mayUse() {
    Map<String, List<String>> table = new LinkedHashMap<>();
    table.put("units", List.of());
    List.of("gravity", "closure", "field", "boundary").forEach(part -> table.put(part, List.of("units")));
    table.put("disk", MODEL);
    table.put("linalg", List.of());
    table.put("mesh", List.of("linalg"));
    table.put("equilibrium", join(List.of(MODEL, KERNELS, List.of("disk"))));
    table.put("stability", join(List.of(MODEL, KERNELS, List.of("disk", "equilibrium"))));
    table.put("spacing", join(List.of(MODEL, KERNELS, List.of("disk", "equilibrium", "stability"))));
    table.put("shear", join(List.of(MODEL, KERNELS, List.of("disk", "equilibrium", "stability", "spacing"))));
    table.put("comparison", join(List.of(MODEL, List.of("disk", "equilibrium", "stability", "spacing"))));
    table.put("rivals", join(List.of(MODEL, List.of("disk", "equilibrium", "stability", "spacing"))));
    table.put("uncertainty", List.of("units"));
    table.put("inference", List.of("uncertainty"));
    table.put("observe", List.of("units"));
    table.put("catalogue", List.of("units"));
    table.put("table", NUMBERS);
    table.put("figure", NUMBERS);
    table.put("report", join(List.of(NUMBERS, List.of("table", "figure"))));
    table.put("modelfile", join(List.of(MODEL, List.of("disk", "spacing", "comparison", "uncertainty", "inference",
        "rivals"))));
    table.put("cli", join(List.of(NUMBERS, List.of("catalogue", "table", "figure", "report", "modelfile"))));
    return table;
  }

  @Test
  void scanSawTheCode() {
    // a floor, to be raised with the code: an empty scan would satisfy every other rule
    assertThat(CODE.size()).isGreaterThanOrEqualTo(35);
  }

  @Test
  void packagesUseOnlyTheOnesBelow() {
    LayeredArchitecture layers = layeredArchitecture().consideringOnlyDependenciesInLayers()
        .withOptionalLayers(true);
    for (String name : mayUse().keySet()) {
      layers = layers.layer(name).definedBy("org.archspan." + name + "..");
    }
    for (Map.Entry<String, List<String>> entry : mayUse().entrySet()) {
      String[] below = entry.getValue().toArray(String[]::new);
      layers = below.length == 0 ? layers.whereLayer(entry.getKey()).mayNotAccessAnyLayer()
          : layers.whereLayer(entry.getKey()).mayOnlyAccessLayers(below);
    }
    layers.ensureAllClassesAreContainedInArchitecture().check(CODE);
  }

  @Test
  void packagesAreFreeOfCycles() {
    slices().matching("org.archspan.(*)..").should().beFreeOfCycles().check(CODE);
  }

  @Test
  void kernelsNeedNothingButTheJdk() {
    check(classes().that().resideInAPackage("org.archspan.linalg..").should().onlyDependOnClassesThat()
        .resideInAnyPackage("java..", "org.archspan.linalg.."));
  }

  @Test
  void numbersNeverTouchFiles() {
    check(noClasses().that().resideInAnyPackage(packages(NUMBERS)).should().dependOnClassesThat()
        .resideInAnyPackage("java.io..", "java.nio.file..", "java.nio.channels..", "java.net.."));
  }

  @Test
  void drawingStaysInFigure() {
    onlyIn(List.of("figure"), "org.jfree..", "java.awt..", "javax.swing..", "javax.imageio..",
        "org.apache.batik..");
  }

  @Test
  void commandLineStaysInCli() {
    onlyIn(List.of("cli"), "picocli..", "me.tongfei..");
  }

  @Test
  void tomlStaysInModelFile() {
    onlyIn(List.of("modelfile"), "org.tomlj..");
  }

  @Test
  void standardStreamsStayInCli() {
    check(noClasses().that().resideOutsideOfPackage("org.archspan.cli..").should(ACCESS_STANDARD_STREAMS)
        .orShould().accessField(System.class, "in").orShould().callMethod(System.class, "exit", int.class));
  }

  @Test
  void staticFieldsNeverChange() {
    check(fields().that().areStatic().should().beFinal());
    check(noFields().that(are(staticAndShared())).should().haveRawType(mutable()));
  }

  @Test
  void randomnessIsSeeded() {
    check(noClasses().should().callCodeUnitWhere(describe("draws random numbers without a seed", call -> {
      JavaClass owner = call.getTargetOwner();
      boolean constructor = call.getTarget().getName().equals("<init>");
      boolean seedless = constructor && call.getTarget().getRawParameterTypes().isEmpty();
      boolean generator = Stream.of("java.util.random.RandomGenerator",
          "org.apache.commons.math3.random.RandomGenerator").anyMatch(owner::isAssignableTo);
      return generator && seedless
          || Set.of("java.util.concurrent.ThreadLocalRandom", "java.security.SecureRandom")
              .contains(owner.getName())
          || Set.of("random", "randomUUID").contains(call.getTarget().getName())
              && Set.of("java.lang.Math", "java.lang.StrictMath", "java.util.UUID").contains(owner.getName());
    })));
  }

  @Test
  void textIsFormattedWithALocale() {
    check(noClasses().should().callCodeUnitWhere(describe("formats without a Locale", call -> {
      boolean formats = Set.of("format", "formatted", "printf", "toLowerCase", "toUpperCase")
          .contains(call.getTarget().getName());
      boolean localised = Stream.of("java.lang.String", "java.io.PrintStream", "java.io.PrintWriter",
          "java.util.Formatter").anyMatch(call.getTargetOwner()::isAssignableTo);
      boolean newFormatter = call.getTargetOwner().isEquivalentTo(Formatter.class)
          && call.getTarget().getName().equals("<init>");
      boolean named = call.getTarget().getRawParameterTypes().stream()
          .anyMatch(p -> p.isEquivalentTo(Locale.class));
      return (formats && localised || newFormatter) && !named;
    })));
  }

  /** Checks a rule that is silent about packages that are still empty. */
  private static void check(ArchRule rule) {
    rule.allowEmptyShould(true).check(CODE);
  }

  private static void onlyIn(List<String> rooms, String... libraries) {
    check(noClasses().that().resideOutsideOfPackages(packages(rooms)).should().dependOnClassesThat()
        .resideInAnyPackage(libraries));
  }

  private static DescribedPredicate<JavaCall<?>> describe(String text, Predicate<JavaCall<?>> test) {
    return DescribedPredicate.describe(text, test);
  }

  /** An array behind a private constant is an implementation table; others can be written from outside. */
  private static DescribedPredicate<JavaField> staticAndShared() {
    return DescribedPredicate.describe("static and shared", field -> field.getModifiers().contains(STATIC)
        && field.getModifiers().contains(FINAL) && !field.getModifiers().contains(SYNTHETIC)
        && !(field.getModifiers().contains(PRIVATE) && field.getRawType().isArray()));
  }

  private static DescribedPredicate<JavaClass> mutable() {
    return DescribedPredicate.describe("something that can change", type -> type.isArray()
        || type.getPackageName().equals("java.util.concurrent.atomic")
        || Stream.of("java.lang.ThreadLocal", "java.util.random.RandomGenerator",
            "java.util.AbstractCollection", "java.util.AbstractMap", "java.lang.StringBuilder")
            .anyMatch(type::isAssignableTo));
  }

  private static String[] packages(List<String> names) {
    return names.stream().map(name -> "org.archspan." + name + "..").toArray(String[]::new);
  }

  private static List<String> join(List<List<String>> parts) {
    return parts.stream().flatMap(List::stream).toList();
  }
}
