package org.archspan.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Checks the references on each other: dense collocation, closed forms, shooting. */
class DenseReferenceTest {
  /** Closed forms between walls: every growing mode that the points can carry, and no other. */
  @ParameterizedTest
  @CsvSource({
      "1, 1, 1, 0, 0.5, 0", "1, 1, 1, Infinity, 0.5, 0", "1, 1, 1, Infinity, 0.5, 1",
      "1, 1, 1, Infinity, 0.5, 3",
      "0.6, 0.8, 0.9, 0, 0.3, 1", "0.6, 0.8, 0.9, 2.5, 0.3, 0", "0.6, 0.8, 0.9, 2.5, 0.3, 1"})
  void agreesWithTheUniformAtmosphere(double alpha, double beta, double gamma, double kappa, double kx,
      double ky) {
    UniformAtmosphere atmosphere = new UniformAtmosphere(alpha, beta, gamma, 4.0 / 3.0, kappa);
    double wall = 10.0;
    double[] rates = new DenseReference(atmosphere.equilibrium(wall, TopBoundary.LID), new GasClosure(gamma),
        new CosmicRayClosure(4.0 / 3.0, kappa), Parity.FLOOR, 32).growthRates(kx, ky);
    int modes = atmosphere.unstableModes(kx, ky, wall);
    if (modes <= 10) {
      // the wiggly end of a longer list is beyond 32 points
      assertThat(rates).hasSize(modes);
    }
    for (int n = 1; n <= Math.min(3, modes); n++) {
      // 1e-9: the rounding of dense eigenvalues, about 1e-12 of the largest entry, 1e3
      assertThat(rates[n - 1]).isCloseTo(atmosphere.growthRate(kx, ky, wall, n), within(1e-9));
    }
  }

  @ParameterizedTest
  @CsvSource({
      "MIRROR, LID, Infinity, 0", "FLEXING, LID, Infinity, 0", "MIRROR, LID, Infinity, 1",
      "FLEXING, LID, 0, 1",
      "FLEXING, LID, 2, 0", "MIRROR, LID, 2, 1", "FLOOR, FREE, Infinity, 0", "FLEXING, FREE, Infinity, 1"})
  void agreesWithShootingInTanhGravity(Parity parity, TopBoundary top, double kappa, double ky) {
    SimpleEquilibrium disk = SimpleEquilibrium.tanh(1.0, 0.7, 8.0, top);
    CosmicRayClosure rays = new CosmicRayClosure(4.0 / 3.0, kappa);
    GasClosure gas = new GasClosure(1.0);
    double[] rates = new DenseReference(disk, gas, rays, parity, 40).growthRates(0.4, ky);
    ShootingReference shooting = new ShootingReference(disk, gas, rays, parity);
    assertThat(rates).hasSizeGreaterThanOrEqualTo(2);
    for (int order = 0; order < 2; order++) {
      // 1e-9: truncation at 40 points and the rounding of the dense eigenvalues
      assertThat(rates[order]).isCloseTo(shooting.growthRate(0.4, ky, order), within(1e-9));
    }
  }
}
