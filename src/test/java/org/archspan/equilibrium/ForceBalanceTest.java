package org.archspan.equilibrium;

import static org.archspan.equilibrium.TestStates.PC;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.archspan.disk.Gas;
import org.archspan.disk.GasComponent;
import org.archspan.disk.MagneticField;
import org.archspan.disk.RefusedModelException;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.PointMassGravity;
import org.archspan.gravity.TanhGravity;
import org.archspan.reference.SimpleEquilibrium;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every state stands: its pressures carry the weight of its gas. */
class ForceBalanceTest {
  /** Greatest residual of a state, relative to the weight of the gas. */
  private static final double BALANCED = 1e-10;

  /** Each law five times, alpha from 0.01 to 100 and beta up to 3. */
  @RepeatedTest(5 * TestStates.LAWS)
  void everyLawWithAnyPressureRatios(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    int law = repetition.getCurrentRepetition() % TestStates.LAWS;
    double alpha = Math.pow(10.0, -2.0 + 4.0 * random.nextDouble());
    double beta = 3.0 * random.nextDouble();
    boolean bindsAny = !(TestStates.law(law) instanceof PointMassGravity);
    Equilibrium state = TestStates.isothermal(bindsAny ? alpha : Math.min(alpha, 3.0), beta, TestStates.law(law));
    assertBalanced(state);
  }

  /** Two laws added, three components of gas that share the sum. */
  @RepeatedTest(20)
  void sumsOfLawsAndOfComponents(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    GravityLaw first = TestStates.law(random.nextInt(TestStates.LAWS));
    GravityLaw second = TestStates.law(random.nextInt(TestStates.LAWS - 2));
    Gas gas = new Gas.Components(List.of(
        new GasComponent("cold", 3e5, TestStates.DENSITY * (0.5 + random.nextDouble())),
        new GasComponent("warm", 8e5, TestStates.DENSITY * 0.3 * random.nextDouble()),
        new GasComponent("hot", 2e6, TestStates.DENSITY * 0.02 * random.nextDouble())));
    assertBalanced(TestStates.build(gas, new MagneticField.ConstantRatio(2.0 * random.nextDouble()),
        TestStates.ratio(random.nextDouble()), TestStates.lid(6.0), first, second));
  }

  static void assertBalanced(Equilibrium state) {
    assertThat(ForceBalance.residual(state)).isLessThan(BALANCED);
    for (int i = 1; i < 40; i++) {
      double z = state.bottom() + (state.top() - state.bottom()) * i / 40.0;
      if (farFromKinks(state, z)) {
        assertPointwise(state, z);
      }
    }
  }

  /**
   * The same at one height, without the integral of the weight: the slope of the pressure by a central difference of
   * sixth order.
   */
  private static void assertPointwise(Equilibrium state, double z) {
    GasState here = state.at(z);
    double h = step(state, z);
    double slope = (45.0 * (logPressure(state, z + h) - logPressure(state, z - h))
        - 9.0 * (logPressure(state, z + 2.0 * h) - logPressure(state, z - 2.0 * h))
        + logPressure(state, z + 3.0 * h) - logPressure(state, z - 3.0 * h)) / (60.0 * h);
    double perMass = here.gasPerMass() + here.magneticPerMass() + here.cosmicRayPerMass();
    // truncation of the difference stays below 1e-11 with this step (twice the step gives up to 1.4e-10, and 64 to 100
    // times less for each halving); rounding is that of ln p (about 60) over the step
    double rounding = 60.0 * Math.ulp(1.0) * perMass / (h * here.gravity());
    assertThat(-slope * perMass / here.gravity()).as("z = %s pc", z / PC)
        .isCloseTo(1.0, within(BALANCED + rounding));
  }

  private static double step(Equilibrium state, double z) {
    double bend = z;
    for (double landmark : state.landmarks()) {
      bend = Math.min(bend, landmark);
    }
    return 0.005 * Math.min(bend, state.at(z).densityScaleHeight());
  }

  private static boolean farFromKinks(Equilibrium state, double z) {
    for (double kink : state.kinks()) {
      if (Math.abs(z - kink) < 4.0 * step(state, z)) {
        return false;
      }
    }
    return true;
  }

  private static double logPressure(Equilibrium state, double z) {
    GasState at = state.at(z);
    return at.logDensity() + Math.log(at.gasPerMass() + at.magneticPerMass() + at.cosmicRayPerMass());
  }

  /** A state whose gravity is wrong by a known share is found out by that share, and refused. */
  @ParameterizedTest
  @ValueSource(doubles = {1e-9, 1e-6, 1e-3, 0.1})
  void aStateOutOfBalanceIsFoundOut(double share) {
    SimpleEquilibrium right = SimpleEquilibrium.tanh(1.0, 0.5, 6.0);
    SimpleEquilibrium wrong = new SimpleEquilibrium(z -> (1.0 + share) * right.gravity().applyAsDouble(z),
        right.potential(), 1.0, 0.5, 1.0, 6.0, true, right.topBoundary());
    assertThat(ForceBalance.required(right)).isLessThan(BALANCED);
    // share/(1 + share) exactly; 1e-12: rounding of the pressures beside the weight of a slab of 0.06 scale heights
    assertThat(ForceBalance.residual(wrong)).isCloseTo(share / (1.0 + share), within(1e-12));
    assertThatThrownBy(() -> ForceBalance.required(wrong)).isInstanceOf(RefusedModelException.class)
        .hasMessageContaining("the force balance holds to");
  }

  /** The same gas ten thousand times larger: one length unit is as good as another. */
  @Test
  void scaleDoesNotMatter() {
    assertBalanced(TestStates.isothermal(1.0, 1.0, new TanhGravity(2.5e-13, 1.5e6 * PC)));
    assertBalanced(TestStates.isothermal(1.0, 1.0, new TanhGravity(2.5e4, 1.5e-11 * PC)));
  }
}
