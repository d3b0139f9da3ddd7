package org.archspan.modelfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import org.archspan.boundary.Parity;
import org.archspan.reference.UniformAtmosphere;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.HeldBy;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import org.archspan.units.Constants;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** From a file that ships to an answer known from elsewhere: units, reader, equilibrium and solver together. */
class ShippedAnswersTest {
  private static final double KILOPARSEC = 1e3 * Constants.PARSEC;

  private static SpacingResult solve(String name, String... settings) {
    Model model = ModelTexts.model(ShippedModels.text(name), settings);
    SpacingResult result = new SpacingStudy(model.disk(), model.options(), model.arm()).solve();
    // what was published, and the closed forms, are without rotation
    return result.withoutRotation();
  }

  private static BranchPeak fastestOf(SpacingResult result, Parity parity) {
    return result.branches().stream().filter(peak -> peak.parity() == parity).findFirst().orElseThrow();
  }

  /**
   * Kim, Franco, Hong, Santillan and Martos (2000), ApJ 531, 873: sound speed about 8.4 km/s (abstract), fastest wave
   * about 3 kpc, growth time about 3e7 yr, nearly the same for both parities; midplane pressure 2.7e-12 dyn/cm^2 (from
   * memory).
   */
  @Test
  void thickDiskAsPublished() {
    SpacingResult result = solve("thick-disk-near-the-sun");
    var midplane = result.equilibrium().at(0.0);
    // 5 and 20 per cent: "about"; the published state was tabulated, and its coefficients come from memory
    assertThat(Math.sqrt(midplane.gasPerMass())).isCloseTo(8.4e5, withinPercentage(5.0));
    assertThat(midplane.totalPressure()).isCloseTo(2.7e-12, withinPercentage(5.0));
    assertThat(midplane.fieldStrength()).isCloseTo(5e-6, withinPercentage(1e-9));
    for (Parity parity : List.of(Parity.MIRROR, Parity.FLEXING)) {
      BranchPeak peak = fastestOf(result, parity);
      assertThat(peak.wavelength()).isCloseTo(3.0 * KILOPARSEC, withinPercentage(20.0));
      assertThat(peak.growthTime()).isCloseTo(30.0 * Constants.MEGAYEAR, withinPercentage(20.0));
    }
    assertThat(fastestOf(result, Parity.MIRROR).growthRate())
        .isCloseTo(fastestOf(result, Parity.FLEXING).growthRate(), withinPercentage(2.0));
  }

  /** An independent dense collocation of the same state gave these three digits for mirror-symmetric modes. */
  @ParameterizedTest
  @CsvSource({"3 kpc, 3.10, 38.9", "5 kpc, 3.41, 34.5", "8 kpc, 3.66, 32.8"})
  void thickDiskUnderLidsOfSeveralHeights(String top, double kiloparsecs, double megayears) {
    BranchPeak fastest = fastestOf(solve("thick-disk-near-the-sun", "domain.top=" + top), Parity.MIRROR);
    // 0.2 per cent: half a unit of the last digit
    assertThat(fastest.wavelength() / KILOPARSEC).isCloseTo(kiloparsecs, withinPercentage(0.2));
    assertThat(fastest.growthTime() / Constants.MEGAYEAR).isCloseTo(megayears, withinPercentage(0.2));
  }

  /** Closed form of Parker's atmosphere between walls: every branch at its own fastest wave. */
  @Test
  void uniformAtmosphereBetweenWalls() {
    UniformAtmosphere exact = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    double height = 3.0 * 6.4e5 * 6.4e5 / 2.489e-9;
    SpacingResult result = solve("uniform-gravity-atmosphere");
    double walls = (result.equilibrium().top() - result.equilibrium().bottom()) / height;
    assertThat(result.branches()).isNotEmpty();
    for (BranchPeak peak : result.branches()) {
      double kx = peak.wavenumber() * height;
      double rate = exact.growthRate(kx, 0.0, walls, peak.order() + 1);
      // 1e-8: the tolerance asked for
      assertThat(peak.growthRate() * height / 6.4e5).isCloseTo(rate, within(1e-8 * rate));
      // fastest: no faster half a per cent to either side, where the closed form has fallen by some 1e-5
      assertThat(exact.growthRate(0.995 * kx, 0.0, walls, peak.order() + 1)).isLessThan(rate);
      assertThat(exact.growthRate(1.005 * kx, 0.0, walls, peak.order() + 1)).isLessThan(rate);
    }
  }

  /** With an open top nothing outgrows the atmosphere above: the edge at kz = 0 of Parker's atmosphere. */
  @Test
  void tanhHaloEndsAtTheContinuumEdge() {
    UniformAtmosphere exact = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    double height = 3.0 * 6.4e5 * 6.4e5 / 2.489e-9;
    BranchPeak edge = solve("tanh-halo").fastest().orElseThrow();
    assertThat(edge.heldBy()).isEqualTo(HeldBy.HALO);
    double rate = exact.growthRate(edge.wavenumber() * height, 0.0, 0.0);
    // 1e-6: the height of the file, 160 pc, matches the scale height to four digits only, gravity above is uniform
    assertThat(edge.growthRate() * height / 6.4e5).isCloseTo(rate, within(1e-6 * rate));
  }

  /** A range that the user sets too narrow is never mistaken for an answer about the gas. */
  @ParameterizedTest
  @CsvSource({"waves.longest=500 pc, the gas is stable there", "waves.shortest=20 kpc, growth rises beyond it",
      "waves.longest=2 kpc, growth rises beyond it"})
  void narrowRangesAreNamed(String setting, String warning) {
    assertThat(String.join(" ", solve("thick-disk-near-the-sun", setting).warnings())).contains(warning);
    assertThat(String.join(" ", solve("thick-disk-near-the-sun", "waves.longest=9 kpc").warnings()))
        .doesNotContain(warning);
  }

  /** Newcomb (1961) and Parker (1967): stable when gamma exceeds 1 + alpha + beta, unstable when it does not. */
  @ParameterizedTest
  @CsvSource({"1.6666666666666667, true", "1.51, true", "1.0, false"})
  void stableByTheIndexOfTheGas(double index, boolean stable) {
    assertThat(solve("stable-disk", "gas.adiabatic-index=" + index).stable()).isEqualTo(stable);
  }

  /** Rotation slows every branch of the thick disk, and never one more than the bound allows. */
  @Test
  void rotationOnlySlowsGrowth() {
    Model model = ModelTexts.model(ShippedModels.text("thick-disk-near-the-sun"), "waves.branches=2");
    SpacingResult rotating = new SpacingStudy(model.disk(), model.options(), model.arm()).solve();
    SpacingResult still = rotating.rotation().orElseThrow().without();
    for (Parity parity : List.of(Parity.MIRROR, Parity.FLEXING)) {
      assertThat(fastestOf(rotating, parity).growthRate()).isLessThan(fastestOf(still, parity).growthRate());
    }
    assertThat(rotating.rotation().orElseThrow().contourPoints()).isGreaterThan(10);
  }
}
