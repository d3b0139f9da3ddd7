package org.archspan.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Shooting against the closed forms. */
class ShootingReferenceTest {
  @ParameterizedTest
  @CsvSource({"Infinity, 0, 1", "Infinity, 1, 2", "0, 1, 1", "2.5, 0, 1", "2.5, 1, 2"})
  void agreesWithTheUniformAtmosphere(double kappa, double ky, int n) {
    UniformAtmosphere atmosphere = new UniformAtmosphere(1.0, 0.8, 0.9, 4.0 / 3.0, kappa);
    // 1e-11: a hundred steps at a tolerance of 1e-13 each
    assertThat(shooting(atmosphere.equilibrium(10.0, TopBoundary.LID), atmosphere).growthRate(0.4, ky, n - 1))
        .isCloseTo(atmosphere.growthRate(0.4, ky, 10.0, n), within(1e-11));
  }

  @Test
  void countsTheModesOfTheUniformAtmosphere() {
    UniformAtmosphere atmosphere = new UniformAtmosphere(1.0, 0.8, 0.9, 4.0 / 3.0, 2.5);
    assertThat(shooting(atmosphere.equilibrium(10.0, TopBoundary.LID), atmosphere).fasterThan(1e-5, 0.4, 1.0))
        .isEqualTo(atmosphere.unstableModes(0.4, 1.0, 10.0));
  }

  /** A top that continues the same atmosphere holds nothing: no mode above the edge of the continuum. */
  @Test
  void openTopOfTheUniformAtmosphereHoldsNoMode() {
    UniformAtmosphere atmosphere = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    double edge = atmosphere.growthRate(0.5, 1.0, 0.0);
    assertThat(shooting(atmosphere.equilibrium(5.0, TopBoundary.OPEN), atmosphere)
        .fasterThan(edge * (1.0 + 1e-9), 0.5, 1.0)).isZero();
  }

  private static ShootingReference shooting(Equilibrium equilibrium, UniformAtmosphere atmosphere) {
    return new ShootingReference(equilibrium, new GasClosure(atmosphere.gasIndex()),
        new CosmicRayClosure(atmosphere.cosmicRayIndex(), atmosphere.diffusivity()), Parity.FLOOR);
  }
}
