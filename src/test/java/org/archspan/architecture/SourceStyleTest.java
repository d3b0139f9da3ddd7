package org.archspan.architecture;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import org.archspan.architecture.JavaSource.Declaration;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Reads the sources: every public double says its unit, and files and methods stay short. */
class SourceStyleTest {
  private static final int LONGEST_FILE = 300;
  private static final int LONGEST_METHOD = 40;
  private static final int LONGEST_KERNEL = 60;
  private static final List<JavaSource> SOURCES = JavaSource.under(Path.of("src", "main", "java"));

  @Test
  void everyPublicDoubleNamesItsUnit() {
    List<Declaration> doubles = SOURCES.stream().flatMap(s -> s.publicDoubles().stream()).toList();
    // a floor: a reader that sees nothing would find no fault
    assertThat(doubles).hasSizeGreaterThan(50);
    assertThat(doubles.stream().filter(d -> !UnitWords.present(d.documentation())).map(Declaration::where))
        .as("public doubles whose Javadoc names neither a unit nor \"dimensionless\"").isEmpty();
  }

  @Test
  void filesStayShort() {
    assertThat(SOURCES.stream().filter(s -> s.codeLines() > LONGEST_FILE)
        .map(s -> s.name() + ": " + s.codeLines() + " code lines").toList())
        .as("files over %d code lines", LONGEST_FILE).isEmpty();
  }

  @Test
  void methodsStayShort() {
    assertThat(SOURCES.stream().flatMap(s -> s.methods().stream()
        .filter(m -> m.codeLines() > (s.isKernel() ? LONGEST_KERNEL : LONGEST_METHOD)))
        .map(m -> m.where() + ": " + m.codeLines() + " code lines").toList())
        .as("methods over %d code lines (%d in kernels)", LONGEST_METHOD, LONGEST_KERNEL).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(strings = {"gravity, cm s^-2", "Density, g cm^-3.", "Field strength, G.",
      "Potential, cm^2 s^-2, zero at the midplane", "s^-1; 0 when stable", "beta, dimensionless",
      "lid height in pc", "Length (kpc) of an arm",
      "in the unit of the argument", "Densities g cm^-3", "1/Myr"})
  void unitsAreRecognised(String text) {
    assertThat(UnitWords.present(text)).isTrue();
  }

  @ParameterizedTest
  @ValueSource(strings = {"growth rate s of the mode", "gravity g(z)", "the field G", "Sum of the pressures.",
      "", "height of the centroid", "a mode of K waves"})
  void symbolsAreNotUnits(String text) {
    assertThat(UnitWords.present(text)).isFalse();
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', value = {
      "/** A. @param b height */ public record A(double b) {} | A.b",
      "/** All numbers are odd. */ public class A { public double v() { return 1; } } | A.v",
      "public class A { /** Speed. */ public double v() { return 1; } } | A.v",
      "public interface A { double v(); } | A.v",
      "public class A { /** Mass. */ public static final double M = 1; } | A.M"})
  void faultsAreSeen(String text, String where) {
    assertThat(JavaSource.parse("A.java", text).publicDoubles())
        .anySatisfy(d -> {
          assertThat(d.where()).endsWith(where);
          assertThat(UnitWords.present(d.documentation())).isFalse();
        });
  }

  @Test
  void aTypeMaySpeakForItsMembers() {
    String text = "/** All numbers are dimensionless. */ public class A { public double v() { return 1; } }";
    assertThat(JavaSource.parse("A.java", text).publicDoubles()).singleElement()
        .satisfies(d -> assertThat(UnitWords.present(d.documentation())).isTrue());
  }

  @Test
  void codeLinesLeaveOutCommentsAndBlanks() {
    JavaSource source = JavaSource.parse("A.java", """
        /** Doc. */
        class A {

          // why
          int a() {
            /* long
               story */
            return 1
                * 2;
          }
        }
        """);
    assertThat(source.codeLines()).isEqualTo(6);
    assertThat(source.methods()).singleElement().satisfies(m -> assertThat(m.codeLines()).isEqualTo(4));
  }
}
