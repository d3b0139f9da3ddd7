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

  /** Digits: converged dense and sparse SciPy solutions, benchmarks/peer; kx = 0.4, lid at 10 H. */
  @ParameterizedTest
  @CsvSource({"MIRROR, 0, 0.6372721022", "FLEXING, 0, 0.6466101414", "MIRROR, 1, 0.7299625664",
      "FLEXING, 1, 0.7305786588"})
  void agreesWithThePeerScripts(Parity parity, double ky, double expected) {
    ShootingReference shooting = new ShootingReference(SimpleEquilibrium.tanh(1.0, 1.0, 10.0),
        new GasClosure(1.0), CosmicRayClosure.instantDiffusion(), parity);
    // 2e-10: rounding of the dense eigenvalues, 1e-10, and of the digits quoted
    assertThat(shooting.growthRate(0.4, ky, 0)).isCloseTo(expected, within(2e-10));
  }

  private static ShootingReference shooting(Equilibrium equilibrium, UniformAtmosphere atmosphere) {
    return new ShootingReference(equilibrium, new GasClosure(atmosphere.gasIndex()),
        new CosmicRayClosure(atmosphere.cosmicRayIndex(), atmosphere.diffusivity()), Parity.FLOOR);
  }
}
