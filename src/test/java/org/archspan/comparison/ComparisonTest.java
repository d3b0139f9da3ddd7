package org.archspan.comparison;

import static org.assertj.core.api.Assertions.assertThat;
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
import org.archspan.disk.GasLayer;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.TanhGravity;
import org.archspan.spacing.Arm;
import org.archspan.spacing.SearchOptions;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The same disk under several assumptions. */
class ComparisonTest {
  private static final double PARSEC = 3.0856775814913673e18;
  private static final Gas ONE = new Gas.Isothermal(6.4e5, OptionalDouble.of(2.3e-24), OptionalDouble.empty());
  private static final Gas TWO = new Gas.Components(List.of(new GasComponent("cold", 4e5, 1.5e-24),
      new GasComponent("warm", 9e5, 0.5e-24)));

  private static final Gas LAYERED = new Gas.Layered(List.of(new GasLayer(0.0, 3.6e11, 50.0 * PARSEC),
      new GasLayer(300.0 * PARSEC, 8.1e11, 50.0 * PARSEC)), OptionalDouble.of(2e-24), OptionalDouble.empty());

  private static Disk disk(Gas gas, double microgauss) {
    return new Disk(gas, new GasClosure(1.0), new MagneticField.BottomStrength(1e-6 * microgauss), CosmicRays.none(),
        List.of(new TanhGravity(2.5e-9, 160.0 * PARSEC)),
        Domain.aboutMidplane(Optional.of(Height.centimetres(800.0 * PARSEC)), TopBoundary.LID));
  }

  /** The held amount is the same in a disk of another field, one gas or several, to the settling of the root. */
  @ParameterizedTest
  @EnumSource(value = HeldAmount.class, names = {"SURFACE_DENSITY", "MIDPLANE_DENSITY"})
  void theHeldAmountStays(HeldAmount held) {
    for (Gas gas : List.of(ONE, TWO, LAYERED)) {
      Equilibrium before = EquilibriumBuilder.build(disk(gas, 3.0), 1e-8);
      Equilibrium after = EquilibriumBuilder.build(GasAmount.of(disk(gas, 3.0), held, 1e-8).in(disk(gas, 5.0)), 1e-8);
      double column = after.surfaceDensity() / before.surfaceDensity() - 1.0;
      double bottom = after.at(0.0).density() / before.at(0.0).density() - 1.0;
      // 1e-10: quadrature of the column
      assertThat(held == HeldAmount.SURFACE_DENSITY ? column : bottom).isCloseTo(0.0, within(1e-10));
      // a stronger field thickens the disk: less density for the same column, more column for the same density
      assertThat(held == HeldAmount.SURFACE_DENSITY ? -bottom : column).isGreaterThan(0.05);
    }
  }

  @Test
  void aCaseThatFailsDoesNotStopTheOthersAndThreadsChangeNothing() {
    VariedInput input = new VariedInput("field.strength", List.of("1", "2", "3", "4"), List.of(1.0, 2.0, 3.0, 4.0),
        "uG");
    VariedModel model = values -> solve(values.get(0));
    Comparison one = Comparison.solve(List.of(input), model, 1, () -> { });
    Comparison three = Comparison.solve(List.of(input), model, 3, () -> { });
    assertThat(one.failures()).isEqualTo(1);
    assertThat(one.cases().get(2).reason()).isEqualTo("no state with 3");
    for (int i = 0; i < 4; i++) {
      assertThat(three.cases().get(i).values()).isEqualTo(one.cases().get(i).values());
      assertThat(three.cases().get(i).result().flatMap(SpacingResult::spacingPeak))
          .isEqualTo(one.cases().get(i).result().flatMap(SpacingResult::spacingPeak));
    }
  }

  private static SpacingResult solve(String microgauss) {
    if (microgauss.equals("3")) {
      throw new RefusedModelException("no state with 3");
    }
    return new SpacingStudy(disk(ONE, Double.parseDouble(microgauss)), SearchOptions.defaults(), Arm.unknown()).solve();
  }

  @Test
  void theLastInputVariesFastest() {
    VariedInput first = new VariedInput("a", List.of("1", "2"), List.of(), "");
    VariedInput second = new VariedInput("b", List.of("x", "y", "z"), List.of(), "");
    Comparison grid = Comparison.solve(List.of(first, second), values -> {
      throw new RefusedModelException("none");
    }, 2, () -> { });
    assertThat(grid.cases().stream().map(one -> String.join("", one.values())))
        .containsExactly("1x", "1y", "1z", "2x", "2y", "2z");
  }
}
