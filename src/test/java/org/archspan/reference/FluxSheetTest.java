package org.archspan.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.GasLayer;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.equilibrium.ForceBalance;
import org.archspan.gravity.UniformGravity;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.ModeProblem;
import org.archspan.stability.Peak;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Flux sheets in layered atmospheres above a rigid floor; units c = g = 1 at the floor, taken as cm and s. */
class FluxSheetTest {
  private static Disk disk(double gasIndex, List<GasLayer> layers, MagneticField field, double top) {
    return new Disk(new Gas.Layered(layers, OptionalDouble.of(1e-7), OptionalDouble.empty()), new GasClosure(gasIndex),
        field, CosmicRays.none(), List.of(new UniformGravity(1.0)),
        new Domain(Optional.of(Height.centimetres(0.0)), Optional.of(Height.centimetres(top)),
            Optional.of(TopBoundary.LID)));
  }

  private static Disk reference(double gasIndex) {
    return disk(gasIndex, List.of(new GasLayer(0.0, 1.0, 1.0), new GasLayer(16.0, 25.0, 0.5)),
        new MagneticField.Sheet(4.0, 8.0, 0.5, OptionalDouble.of(1.0), OptionalDouble.empty()), 40.0);
  }

  private static BranchSolver solver(Disk disk) {
    return new BranchSolver(
        ModeProblem.of(disk, EquilibriumBuilder.build(disk, 1e-8), Parity.FLOOR, 0.0, 1e-9));
  }

  /**
   * alpha(z) = 0.25 [1 + tanh((z - 4)/0.5)] [1 - tanh((z - 8)/0.5)], T = 1 + 12 [1 + tanh((z - 16)/0.5)], floor at 0, lid at 40.
   * The numbers were made independently of this program, by a dense solution of the same equations, to the digits given.
   */
  @ParameterizedTest
  @CsvSource({"1.05, 0.27433, 0.127919", "1.2, 0.19251, 0.0633150"})
  void theFastestModeOfASheetIsThatOfAnIndependentSolution(double gasIndex, double wavenumber, double growthRate) {
    Peak peak = solver(reference(gasIndex)).fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0).orElseThrow();
    // half a unit of the last digit given
    assertThat(peak.wavenumber()).isCloseTo(wavenumber, within(5e-6));
    assertThat(peak.growthRate()).isCloseTo(growthRate, within(gasIndex == 1.05 ? 5e-7 : 5e-8));
    assertThat(peak.unstableModes()).isEqualTo(1);
  }

  /** From the same source: with gamma = 5/3 the sheet is stable along the field. */
  @Test
  void anAdiabaticSheetIsStableAlongTheField() {
    assertThat(solver(reference(5.0 / 3.0)).fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0)).isEmpty();
  }

  private static Disk random(Random random) {
    double bottom = 1.0 + 2.0 * random.nextDouble();
    MagneticField sheet = new MagneticField.Sheet(bottom, bottom + 2.0 + 2.0 * random.nextDouble(),
        0.4 + 0.4 * random.nextDouble(), OptionalDouble.of(0.3 + 3.0 * random.nextDouble()), OptionalDouble.empty());
    double hot = 2.0 + 6.0 * random.nextDouble();
    return disk(1.0 + 0.15 * random.nextDouble(), List.of(new GasLayer(0.0, 1.0, 1.0),
        new GasLayer(7.5 + random.nextDouble(), hot, 0.5 + 0.3 * random.nextDouble())), sheet, 12.0);
  }

  /** The balance, checked from the pressures alone. */
  @RepeatedTest(20)
  void layeredStatesBalance(RepetitionInfo repetition) {
    Disk disk = random(new Random(repetition.getCurrentRepetition()));
    assertThat(ForceBalance.required(EquilibriumBuilder.build(disk, 1e-8))).isLessThan(1e-10);
  }

  /** The slope of the density is the derivative of the density. */
  @RepeatedTest(10)
  void theGradientIsThatOfTheDensity(RepetitionInfo repetition) {
    Equilibrium state = EquilibriumBuilder.build(random(new Random(repetition.getCurrentRepetition())), 1e-8);
    double step = 1e-4;
    for (double z = 0.5; z < 11.5; z += 0.37) {
      double slope = (state.at(z + step).logDensity() - state.at(z - step).logDensity()) / (2.0 * step);
      // the central difference is good to step^2 times the third derivative, some 10, and rounding/step
      assertThat(state.at(z).logDensityGradient()).isCloseTo(slope, within(1e-6));
    }
  }

  /** All growing modes of random layered states against the dense problem in (X, Y, Z). */
  @RepeatedTest(10)
  void growthRatesAgreeWithTheDenseProblem(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    Disk disk = random(random);
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, 1e-8);
    double kx = 0.15 + 0.2 * random.nextDouble();
    double ky = random.nextBoolean() ? 0.0 : random.nextDouble();
    double[] expected = new DenseReference(equilibrium, disk.gasClosure(), CosmicRayClosure.instantDiffusion(),
        Parity.FLOOR, 100).growthRates(kx, ky);
    BranchSolver solver = new BranchSolver(ModeProblem.of(disk, equilibrium, Parity.FLOOR, ky, 1e-9));
    for (int order = 0; order < Math.min(2, expected.length) && expected[order] > 0.05; order++) {
      // 1e-5: a hundred Chebyshev points resolve edges of half a unit in twelve to about that
      assertThat(solver.growth(kx, order).orElseThrow().growthRate()).isCloseTo(expected[order],
          within(1e-5 * expected[order]));
    }
    if (expected.length == 0) {
      assertThat(solver.growth(kx, 0).filter(point -> point.growthRate() > 1e-3)).isEmpty();
    }
  }

  /** A sheet given by its strength has that strength in its middle. */
  @Test
  void theStrengthIsMet() {
    Disk disk = disk(1.1, List.of(new GasLayer(0.0, 1.0, 1.0)),
        new MagneticField.Sheet(3.0, 6.0, 0.3, OptionalDouble.empty(), OptionalDouble.of(1e-4)), 12.0);
    Equilibrium state = EquilibriumBuilder.build(disk, 1e-8);
    // the root is sought to 1e-14
    assertThat(state.at(4.5).fieldStrength()).isCloseTo(1e-4, within(1e-12 * 1e-4));
  }
}
