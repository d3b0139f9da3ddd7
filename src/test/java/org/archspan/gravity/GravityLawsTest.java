package org.archspan.gravity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.stream.Stream;
import org.archspan.units.Constants;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class GravityLawsTest {
  private static final double PC = Constants.PARSEC;

  static Stream<GravityLaw> laws() {
    return Stream.of(new UniformGravity(1e-9), new LinearGravity(3e-30), new TanhGravity(2e-9, 150.0 * PC),
        new DiskAndHaloGravity(4.4e-9, 200.0 * PC, 1.7e-9 / (1e3 * PC)), new PointMassGravity(4e6 * 2e33, 100.0 * PC),
        new IsothermalSheetGravity(50.0 * 2.09e-4, 20e5), new SaturatingGravity(8e-9, 0.52, 325.0 * PC, 900.0 * PC),
        new TableGravity(new double[] {100.0 * PC, 300.0 * PC, 700.0 * PC, 20e3 * PC},
            new double[] {1e-9, 2.5e-9, 4e-9, 5e-9}));
  }

  /** The potential is the integral of the acceleration: central difference of fourth order. */
  @ParameterizedTest
  @MethodSource("laws")
  void potentialIsTheIntegralOfTheAcceleration(GravityLaw law) {
    Random random = new Random(7);
    for (int i = 0; i < 200; i++) {
      double z = Math.exp(Math.log(1e-2) + random.nextDouble() * Math.log(1e6)) * PC;
      double h = 1e-3 * z;
      double slope = (8.0 * (law.potential(z + h) - law.potential(z - h))
          - (law.potential(z + 2.0 * h) - law.potential(z - 2.0 * h))) / (12.0 * h);
      // 1e-8: rounding of the difference (1e-16/1e-3, times the ratio of potential to its change) and (1e-3)^4; a table
      // has jumps of its second derivative, which the difference may straddle
      double tolerance = law instanceof TableGravity ? 1e-5 : 1e-8;
      assertThat(slope).as("z = %s pc", z / PC).isCloseTo(law.acceleration(z), within(tolerance * law.acceleration(z)));
    }
  }

  /** Near the midplane the potential is g z/2 of a linear law, without loss of digits. */
  @ParameterizedTest
  @MethodSource("laws")
  void keepsItsDigitsNearTheMidplane(GravityLaw law) {
    double z = 1e-7 * PC;
    double share = law instanceof UniformGravity ? 1.0 : 0.5;
    assertThat(law.potential(z)).isCloseTo(share * law.acceleration(z) * z, within(1e-7 * law.acceleration(z) * z));
  }

  @ParameterizedTest
  @MethodSource("laws")
  void staysFiniteFarAway(GravityLaw law) {
    double z = Math.min(law.greatestHeight(), 1e12 * PC);
    assertThat(law.potential(z)).isFinite().isPositive();
    assertThat(law.acceleration(z)).isFinite();
  }

  /** The stars' own sheet: far away g = 2 pi G Sigma (Gauss's theorem). */
  @Test
  void sheetOfStarsPullsWithTwoPiGSigma() {
    IsothermalSheetGravity sheet = new IsothermalSheetGravity(0.01, 2e6);
    assertThat(sheet.acceleration(1e24)).isCloseTo(2.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * 0.01,
        within(1e-22));
  }

  @Test
  void tableIsMonotoneBetweenItsEntries() {
    TableGravity law = new TableGravity(new double[] {0, 1, 2, 3, 10}, new double[] {0, 0.1, 5, 5.1, 5.2});
    for (double z = 0.0; z < 9.99; z += 0.01) {
      assertThat(law.acceleration(z + 0.01)).isGreaterThanOrEqualTo(law.acceleration(z) - 1e-12);
    }
    assertThat(law.acceleration(2.0)).isCloseTo(5.0, within(1e-14));
  }

  @Test
  void refusesImpossibleInputs() {
    assertThatThrownBy(() -> new UniformGravity(-1.0)).hasMessageContaining("strength must be positive");
    assertThatThrownBy(() -> new SaturatingGravity(1, 1.5, 1, 1)).hasMessageContaining("between 0 and 1");
    assertThatThrownBy(() -> new TableGravity(new double[] {0, 2, 1}, new double[] {0, 1, 2}))
        .hasMessageContaining("entry 3");
    assertThatThrownBy(() -> new TableGravity(new double[] {0}, new double[] {0})).hasMessageContaining("at least two");
  }

  @Test
  void everyKindMakesItsLaw() {
    for (GravityLawKind kind : GravityLaws.all()) {
      double[] inputs = kind.inputs().stream().mapToDouble(input -> 0.5).toArray();
      assertThat(kind.factory().apply(inputs).acceleration(1.0)).as(kind.name()).isPositive();
      assertThat(GravityLaws.named(kind.name())).contains(kind);
    }
  }
}
