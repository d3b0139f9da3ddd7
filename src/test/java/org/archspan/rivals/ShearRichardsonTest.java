package org.archspan.rivals;

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
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.UniformGravity;
import org.junit.jupiter.api.Test;

/** Isothermal atmosphere in uniform gravity, c = g = 1, no field: H = 1 and N^2 = 1 - 1/gamma at every height. */
class ShearRichardsonTest {
  private static Equilibrium atmosphere() {
    return EquilibriumBuilder.build(new Disk(new Gas.Isothermal(1.0, OptionalDouble.of(1.0), OptionalDouble.empty()),
        new GasClosure(2.0), new MagneticField.ConstantRatio(0.0), CosmicRays.none(),
        List.of(new UniformGravity(1.0)), new Domain(Optional.of(Height.centimetres(0.0)),
            Optional.of(Height.centimetres(5.0)), Optional.of(TopBoundary.LID))), 1e-8);
  }

  @Test
  void theNumberIsBuoyancyOverShear() {
    ShearRichardson shear = new ShearRichardson(atmosphere(), 2.0, 2.0);
    // closed form; 1e-10: the base state's
    assertThat(shear.buoyancySquared(2.0)).isCloseTo(0.5, within(1e-10));
    assertThat(shear.least()).isCloseTo(0.125, within(1e-10));
    // Howard (1961): growth is at most sqrt(V'^2/4 - N^2)
    assertThat(shear.growthBound()).isCloseTo(Math.sqrt(1.0 - 0.5), within(1e-9));
  }

  @Test
  void weakShearIsStable() {
    ShearRichardson shear = new ShearRichardson(atmosphere(), 2.0, 1.0);
    assertThat(shear.least()).isGreaterThan(ShearRichardson.STABLE);
    assertThat(shear.growthBound()).isZero();
  }
}
