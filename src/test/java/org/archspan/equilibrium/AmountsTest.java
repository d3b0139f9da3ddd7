package org.archspan.equilibrium;

import static org.archspan.equilibrium.TestStates.DENSITY;
import static org.archspan.equilibrium.TestStates.DISPERSION;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.GasComponent;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.PointMassGravity;
import org.archspan.gravity.UniformGravity;
import org.archspan.units.Constants;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What the model gives is what the state has: columns, fields, pressures, sums. */
class AmountsTest {
  /** A few roundings of an exponential of ln rho, which is near -54 in CGS. */
  private static final double ROUNDING = 3e-14;

  /** Surface density from 0.1 to 100 Msun/pc^2, with ratios given. */
  @ParameterizedTest
  @ValueSource(ints = {0, 1, 2, 3, 4, 5, 6, 7})
  void surfaceDensityIsReproduced(int law) {
    for (double surfaceDensity : new double[] {2e-5, 2e-3, 2e-2}) {
      Equilibrium state = TestStates.build(TestStates.ofSurfaceDensity(surfaceDensity),
          new MagneticField.ConstantRatio(1.0), TestStates.ratio(0.5), TestStates.lid(5.0), TestStates.law(law));
      assertColumn(state, surfaceDensity);
    }
  }

  /** The ratios then depend on the density that is sought. */
  @ParameterizedTest
  @ValueSource(ints = {0, 1, 2, 3, 4, 5, 6, 7})
  void surfaceDensityIsReproducedUnderAGivenFieldAndCosmicRayPressure(int law) {
    Equilibrium state = TestStates.build(TestStates.ofSurfaceDensity(2e-3), new MagneticField.BottomStrength(3e-6),
        TestStates.pressure(3e-13), TestStates.lid(5.0), TestStates.law(law));
    assertColumn(state, 2e-3);
    assertBottom(state, 3e-6, 3e-13);
  }

  /** Around a point mass a thinner gas under the same field would not be bound: the search must not go there. */
  @ParameterizedTest
  @CsvSource({"1e-6", "2e-6", "3e-6", "4e-6", "5e-6", "6e-6"})
  void surfaceDensityAroundAPointMassNeedsNoUnboundState(double strength) {
    GravityLaw ring = new PointMassGravity(1e10 * Constants.SOLAR_MASS, 800.0 * TestStates.PC);
    Equilibrium given = TestStates.build(TestStates.ofDensity(DENSITY), new MagneticField.BottomStrength(strength),
        TestStates.ratio(0.0), TestStates.lid(5.0), ring);
    Equilibrium state = TestStates.build(TestStates.ofSurfaceDensity(given.surfaceDensity()),
        new MagneticField.BottomStrength(strength), TestStates.ratio(0.0), TestStates.lid(5.0), ring);
    assertColumn(state, given.surfaceDensity());
    // 1e-11: the column answers a change of density with a share of it only where the field carries most of it
    assertThat(state.at(0.0).density()).isCloseTo(DENSITY, within(1e-11 * DENSITY));
  }

  private static void assertColumn(Equilibrium state, double surfaceDensity) {
    assertThat(state.surfaceDensity()).isCloseTo(surfaceDensity, within(1e-12 * surfaceDensity));
  }

  @ParameterizedTest
  @CsvSource({"0, 0", "1e-6, 1e-13", "5e-6, 1e-12", "3e-5, 0"})
  void fieldAndCosmicRaysOfTheMidplaneAreReproduced(double strength, double pressure) {
    for (int law : new int[] {0, 2, 3, 7}) {
      Equilibrium state = TestStates.build(TestStates.ofDensity(DENSITY), new MagneticField.BottomStrength(strength),
          TestStates.pressure(pressure), TestStates.lid(4.0), TestStates.law(law));
      assertBottom(state, strength, pressure);
      assertThat(state.at(0.0).density()).isCloseTo(DENSITY, within(ROUNDING * DENSITY));
      ForceBalanceTest.assertBalanced(state);
    }
  }

  private static void assertBottom(Equilibrium state, double strength, double pressure) {
    assertThat(state.at(0.0).fieldStrength()).isCloseTo(strength, within(ROUNDING * strength));
    assertThat(state.at(0.0).cosmicRayPressure()).isCloseTo(pressure, within(ROUNDING * pressure));
  }

  /** Above a floor all the gas counts once, and the field is that on the floor. */
  @Test
  void aFloorHoldsOneSide() {
    double floor = 500.0 * TestStates.PC;
    Domain domain = new Domain(Optional.of(Height.centimetres(floor)),
        Optional.of(Height.centimetres(4.0 * floor)), Optional.of(TopBoundary.LID));
    double strength = 2e-9;
    Equilibrium state = TestStates.build(TestStates.ofSurfaceDensity(1e-3), new MagneticField.BottomStrength(2e-6),
        TestStates.ratio(0.4), domain, new UniformGravity(strength));
    GasState bottom = state.at(floor);
    assertThat(state.bottom()).isEqualTo(floor);
    assertThat(bottom.fieldStrength()).isCloseTo(2e-6, within(ROUNDING * 2e-6));
    // an exponential atmosphere carries its column: p_total = Sigma g; 1e-12 as for every surface density
    assertThat(bottom.totalPressure()).isCloseTo(1e-3 * strength, within(1e-12 * 1e-3 * strength));
    assertThat(state.scaleHeight()).isCloseTo(1e-3 / bottom.density(), within(1e-12 * state.scaleHeight()));
    ForceBalanceTest.assertBalanced(state);
  }

  /** Each component falls as if it were alone: density, pressure and column are the sums (same C per c^2). */
  @Test
  void componentsAddUp() {
    List<GasComponent> parts = List.of(new GasComponent("cold", 4e5, 3e-24), new GasComponent("warm", 9e5, 6e-25),
        new GasComponent("hot", 5e6, 5e-27));
    MagneticField field = new MagneticField.ConstantRatio(0.7);
    Domain domain = Domain.aboutMidplane(Optional.of(Height.centimetres(2e3 * TestStates.PC)), TopBoundary.LID);
    Equilibrium all = TestStates.build(new Gas.Components(parts), field, TestStates.ratio(0.3), domain,
        TestStates.law(3));
    List<Equilibrium> alone = parts.stream().map(part -> TestStates.build(new Gas.Components(List.of(part)), field,
        TestStates.ratio(0.3), domain, TestStates.law(3))).toList();
    double column = alone.stream().mapToDouble(Equilibrium::surfaceDensity).sum();
    assertThat(all.surfaceDensity()).isCloseTo(column, within(1e-12 * column));
    for (int i = 0; i <= 10; i++) {
      double z = all.top() * i / 10.0;
      double density = alone.stream().mapToDouble(state -> state.at(z).density()).sum();
      double pressure = alone.stream().mapToDouble(state -> state.at(z).totalPressure()).sum();
      assertThat(all.at(z).density()).isCloseTo(density, within(ROUNDING * density));
      assertThat(all.at(z).totalPressure()).isCloseTo(pressure, within(ROUNDING * pressure));
    }
  }

  /** One gas cut into three equal components is the same gas. */
  @Test
  void equalComponentsAreOneGas() {
    GasComponent third = new GasComponent("", DISPERSION, DENSITY / 3.0);
    Equilibrium one = TestStates.isothermal(1.0, 0.5, TestStates.law(0));
    Equilibrium three = TestStates.build(new Gas.Components(List.of(third, third, third)),
        new MagneticField.ConstantRatio(1.0), TestStates.ratio(0.5), TestStates.lid(6.0), TestStates.law(0));
    assertThat(three.scaleHeight()).isCloseTo(one.scaleHeight(), within(1e-13 * one.scaleHeight()));
    assertThat(three.dispersion()).isCloseTo(DISPERSION, within(ROUNDING * DISPERSION));
  }

  /** Two laws of half the strength are one law. */
  @Test
  void lawsAddUp() {
    Equilibrium one = TestStates.isothermal(1.0, 1.0, new UniformGravity(2e-9));
    Equilibrium two = TestStates.isothermal(1.0, 1.0, new UniformGravity(0.5e-9), new UniformGravity(1.5e-9));
    assertThat(two.surfaceDensity()).isCloseTo(one.surfaceDensity(), within(1e-13 * one.surfaceDensity()));
  }
}
