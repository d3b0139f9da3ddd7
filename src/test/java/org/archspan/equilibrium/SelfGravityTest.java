package org.archspan.equilibrium;

import static org.archspan.equilibrium.TestStates.DENSITY;
import static org.archspan.equilibrium.TestStates.DISPERSION;
import static org.archspan.equilibrium.TestStates.PC;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.GasClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.GasComponent;
import org.archspan.disk.GasStratum;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.disk.RefusedModelException;
import org.archspan.disk.SelfGravity;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.TanhGravity;
import org.archspan.gravity.UniformGravity;
import org.archspan.units.Constants;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Base states in which the gas holds itself, alone or with an external gravity. */
class SelfGravityTest {
  private static final double FOUR_PI_G = 4.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT;

  private static Equilibrium build(Gas gas, MagneticField field, CosmicRays cosmicRays, GravityLaw... gravity) {
    return EquilibriumBuilder.build(new Disk(gas, new GasClosure(1.0), SelfGravity.EQUILIBRIUM, field, cosmicRays,
        List.of(gravity), Optional.empty(),
        Domain.aboutMidplane(Optional.of(Height.scaleHeights(8.0)), TopBoundary.LID)), 1e-8);
  }

  private static Equilibrium sheet(double density, double alpha, double beta, GravityLaw... gravity) {
    return build(TestStates.ofDensity(density), new MagneticField.ConstantRatio(alpha), TestStates.ratio(beta), gravity);
  }

  /** Spitzer (1942), ApJ 95, 329: rho_0 sech^2(z/H), H^2 = (1 + alpha + beta) c^2/(2 pi G rho_0). */
  @ParameterizedTest
  @CsvSource({"2.34e-24, 0, 0", "2.34e-24, 1, 1", "1e-20, 0.3, 0", "1e-28, 8, 2"})
  void alone(double density, double alpha, double beta) {
    Equilibrium state = sheet(density, alpha, beta);
    double height = Math.sqrt((1.0 + alpha + beta) * 2.0 / (FOUR_PI_G * density)) * DISPERSION;
    // 1e-13: a few hundred roundings of the running integrals
    assertThat(state.scaleHeight()).isCloseTo(height, within(1e-13 * height));
    for (double x = 0.0; x <= 20.0; x += 0.37) {
      GasState here = state.at(x * height);
      double logSech = Math.log(2.0) - x - Math.log1p(Math.exp(-2.0 * x));
      // of exponents up to 40, to the rounding of the potential, here a few 1e-14 of it
      assertThat(here.logDensity()).isCloseTo(Math.log(density) + 2.0 * logSech, within(1e-13 * (10.0 + x)));
      assertThat(here.gravity()).isCloseTo(FOUR_PI_G * density * height * Math.tanh(x),
          within(1e-13 * FOUR_PI_G * density * height));
    }
    assertThat(ForceBalance.required(state)).isLessThan(1e-10);
  }

  /** The surface density of that sheet is 2 rho_0 H, hence rho_0 = pi G Sigma^2/[2 (1 + alpha + beta) c^2]. */
  @ParameterizedTest
  @CsvSource({"1e-3, 0, 0", "5e-3, 1, 0.5"})
  void aSurfaceDensityIsMet(double column, double alpha, double beta) {
    Equilibrium state = build(TestStates.ofSurfaceDensity(column), new MagneticField.ConstantRatio(alpha),
        TestStates.ratio(beta));
    double expected = FOUR_PI_G * column * column / (8.0 * (1.0 + alpha + beta) * DISPERSION * DISPERSION);
    // 1e-12: the root of ln(column) is sought to 1e-14, the column itself is good to 1e-13
    assertThat(state.surfaceDensity()).isCloseTo(column, within(1e-12 * column));
    assertThat(Math.exp(state.at(0.0).logDensity())).isCloseTo(expected, within(1e-12 * expected));
  }

  /** A light gas has the state that the external gravity alone gives it. */
  @ParameterizedTest
  @ValueSource(doubles = {1e-32, 1e-30})
  void aLightGasFeelsTheExternalGravityOnly(double density) {
    GravityLaw law = new TanhGravity(2.5e-9, 150.0 * PC);
    Equilibrium heavy = sheet(density, 1.0, 0.5, law);
    Equilibrium light = TestStates.build(TestStates.ofDensity(density), new MagneticField.ConstantRatio(1.0),
        TestStates.ratio(0.5), Domain.aboutMidplane(Optional.of(Height.scaleHeights(8.0)), TopBoundary.LID), law);
    // its own gravity is 4 pi G rho H/g of the external one: 1e-7 of it at most
    double share = FOUR_PI_G * density * light.scaleHeight() / 2.5e-9;
    assertThat(share).isLessThan(1e-6);
    assertThat(heavy.scaleHeight()).isCloseTo(light.scaleHeight(), within((2.0 * share + 1e-13) * light.scaleHeight()));
  }

  /** Against an independent integration of the coupled equations with a general-purpose integrator (Hipparchus). */
  @ParameterizedTest
  @CsvSource({"2.34e-24, 1, 1, 2.5e-9, 150", "1e-23, 0, 0, 1e-9, 500", "3e-25, 4, 0, 5e-9, 60"})
  void withAnExternalGravity(double density, double alpha, double beta, double strength, double parsecs) {
    GravityLaw law = new TanhGravity(strength, parsecs * PC);
    Equilibrium state = sheet(density, alpha, beta, law);
    double length = state.scaleHeight();
    double support = (1.0 + alpha + beta) * DISPERSION * DISPERSION;
    OrdinaryDifferentialEquation coupled = new OrdinaryDifferentialEquation() {
      @Override
      public int getDimension() {
        return 2;
      }

      @Override
      public double[] computeDerivatives(double x, double[] y) {
        double own = y[1];
        return new double[] {-(law.acceleration(x * length) + own) * length / support,
            FOUR_PI_G * density * Math.exp(y[0]) * length};
      }
    };
    DormandPrince853Integrator integrator = new DormandPrince853Integrator(1e-9, 0.1, 1e-14, 1e-14);
    double[] end = integrator.integrate(coupled, new ODEState(0.0, new double[] {0.0, 0.0}), 6.0).getPrimaryState();
    GasState here = state.at(6.0 * length);
    // 1e-11: the integrator's own tolerance over some hundred steps, on exponents of order ten
    assertThat(here.logDensity() - Math.log(density)).isCloseTo(end[0], within(1e-11));
    assertThat(here.gravity()).isCloseTo(law.acceleration(6.0 * length) + end[1], within(1e-11 * here.gravity()));
    assertThat(ForceBalance.required(state)).isLessThan(1e-10);
  }

  /** Two components in one potential: dg/dz = 4 pi G (rho_1 + rho_2), each falling with its own dispersion. */
  @Test
  void componentsShareThePotential() {
    Gas gas = new Gas.Components(List.of(new GasComponent("cold", 4e5, 4e-24), new GasComponent("warm", 9e5, 6e-25)));
    Equilibrium state = build(gas, new MagneticField.ConstantRatio(0.5), TestStates.ratio(0.2));
    double step = 1e-3 * state.scaleHeight();
    for (double x = 0.1; x < 6.0; x += 0.7) {
      double z = x * state.scaleHeight();
      double slope = (state.at(z + step).gravity() - state.at(z - step).gravity()) / (2.0 * step);
      // 1e-5: the central difference is good to (step/H)^2 times a few
      assertThat(slope).isCloseTo(FOUR_PI_G * state.at(z).density(), within(1e-5 * FOUR_PI_G * state.at(z).density()));
    }
    assertThat(ForceBalance.required(state)).isLessThan(1e-10);
  }

  /** A prescribed sech^2 law of half-column rho_0 h pulls with 4 pi G rho_0 h tanh(z/h). */
  @Test
  void aPrescribedStratificationPulls() {
    double height = 120.0 * PC;
    Gas gas = new Gas.Stratified(List.of(new GasStratum(GasStratum.Shape.SECH2, DENSITY, height)),
        OptionalDouble.of(3e5));
    Equilibrium state = build(gas, new MagneticField.Balance(OptionalDouble.empty()), TestStates.ratio(0.0),
        new UniformGravity(1e-9));
    double expected = 1e-9 + FOUR_PI_G * DENSITY * height * Math.tanh(1.3);
    // a few roundings
    assertThat(state.at(1.3 * height).gravity()).isCloseTo(expected, within(1e-13 * expected));
    assertThat(ForceBalance.required(state)).isLessThan(1e-10);
  }

  @Test
  void nothingThatHoldsTheGasIsRefused() {
    assertThatThrownBy(() -> TestStates.build(TestStates.ofDensity(DENSITY), new MagneticField.ConstantRatio(1.0),
        TestStates.ratio(0.0), TestStates.lid(6.0))).isInstanceOf(RefusedModelException.class)
        .hasMessageContaining("nothing holds the gas").hasMessageContaining("gas.self-gravity");
  }

  @Test
  void aFloorIsRefused() {
    assertThatThrownBy(() -> EquilibriumBuilder.build(new Disk(TestStates.ofDensity(DENSITY), new GasClosure(1.0),
        SelfGravity.FULL, new MagneticField.ConstantRatio(1.0), TestStates.ratio(0.0),
        List.of(new UniformGravity(1e-9)), Optional.empty(), new Domain(Optional.of(Height.centimetres(1e20)),
            Optional.empty(), Optional.of(TopBoundary.LID))), 1e-8)).isInstanceOf(RefusedModelException.class)
        .hasMessageContaining("midplane").hasMessageContaining("domain.bottom");
  }
}
