package org.archspan.stability;

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
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.GravityLaw;
import org.archspan.units.Constants;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Modes of a gas that feels the gravity of its own perturbation. */
class SelfGravityModesTest {
  static Disk disk(double alpha, double beta, double gasIndex, double top, SelfGravity selfGravity,
      GravityLaw... gravity) {
    return new Disk(new Gas.Isothermal(6.4e5, OptionalDouble.of(2.34e-24), OptionalDouble.empty()),
        new GasClosure(gasIndex), selfGravity, new MagneticField.ConstantRatio(alpha),
        new CosmicRays.PressureRatio(beta, CosmicRayClosure.instantDiffusion()), List.of(gravity), Optional.empty(),
        Domain.aboutMidplane(Optional.of(Height.scaleHeights(top)), TopBoundary.LID));
  }

  private static BranchSolver solver(Disk disk, Parity parity) {
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, 1e-8);
    return new BranchSolver(ModeProblem.of(disk, equilibrium, parity, 0.0, 1e-9));
  }

  private static double jeansFrequency() {
    return Math.sqrt(4.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * 2.34e-24);
  }

  /**
   * The isothermal sheet without field: marginal at kH = 1 (Ledoux 1951, Ann. Ap. 14, 438), and fastest at kH = 0.4658 with
   * s = 0.4718 sqrt(4 pi G rho_0) (four digits, from an independent solution of the same equations). The lid at 20 scale
   * heights leaves exp(-40) of the gas above it.
   */
  @Test
  void theSheetIsMarginalAtOneScaleHeight() {
    BranchSolver solver = solver(disk(0.0, 0.0, 1.0, 20.0, SelfGravity.FULL), Parity.MIRROR);
    double height = solver.problem().equilibrium().scaleHeight();
    assertThat(solver.marginalWavenumber(0) * height).isCloseTo(1.0, within(1e-9));
    Peak peak = solver.fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0).orElseThrow();
    assertThat(peak.wavenumber() * height).isCloseTo(0.4658, within(5e-5));
    assertThat(peak.growthRate() / jeansFrequency()).isCloseTo(0.4718, within(5e-5));
    assertThat(peak.unstableModes()).isEqualTo(1);
  }

  /**
   * Larson (1985), MNRAS 214, 379, gives 4.4 c^2/(G Sigma) for the fastest wavelength, quoted from memory; with kH = 0.4658
   * and H = c^2/(pi G Sigma) it is 4.29. The tolerance covers the difference.
   */
  @Test
  void theFastestWavelengthIsNearLarsons() {
    BranchSolver solver = solver(disk(0.0, 0.0, 1.0, 20.0, SelfGravity.FULL), Parity.MIRROR);
    Equilibrium sheet = solver.problem().equilibrium();
    double wavelength = 2.0 * Math.PI
        / solver.fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0).orElseThrow().wavenumber();
    double unit = 6.4e5 * 6.4e5 / (Constants.GRAVITATIONAL_CONSTANT * sheet.surfaceDensity());
    assertThat(wavelength / unit).isCloseTo(4.4, within(0.15));
  }

  /** A sheet that only flexes does not gather gas: without field it is stable in that parity. */
  @Test
  void theSheetIsStableToFlexing() {
    assertThat(solver(disk(0.0, 0.0, 1.0, 12.0, SelfGravity.FULL), Parity.FLEXING)
        .fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0)).isEmpty();
  }

  /** The perturbed gravity of a light gas changes nothing; that of a heavy one only destabilises mirror-symmetric waves. */
  @ParameterizedTest
  @EnumSource(value = Parity.class, names = {"MIRROR", "FLEXING"})
  void aLightGasDoesNotFeelItself(Parity parity) {
    GravityLaw law = TestDisks.law(0);
    Disk full = disk(1.0, 0.5, 1.0, 4.0, SelfGravity.FULL, law);
    Disk light = new Disk(new Gas.Isothermal(6.4e5, OptionalDouble.of(1e-34), OptionalDouble.empty()),
        full.gasClosure(), SelfGravity.FULL, full.field(), full.cosmicRays(), full.gravity(), Optional.empty(),
        full.domain());
    Disk external = disk(1.0, 0.5, 1.0, 4.0, SelfGravity.OFF, law);
    double kx = 0.4 / EquilibriumBuilder.build(external, 1e-8).scaleHeight();
    double expected = solver(external, parity).growth(kx, 0).orElseThrow().growthRate();
    // 4 pi G rho is 1e-10 of s^2 there
    assertThat(solver(light, parity).growth(kx, 0).orElseThrow().growthRate())
        .isCloseTo(expected, within(2e-9 * expected));
  }

  /** Gravity on the perturbations is a minimum over the potential: it can only speed a mode up. */
  @RepeatedTest(12)
  void perturbedGravityNeverSlowsAMode(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    double alpha = 0.2 + 2.0 * random.nextDouble();
    double top = 2.5 + 2.0 * random.nextDouble();
    Parity parity = random.nextBoolean() ? Parity.MIRROR : Parity.FLEXING;
    BranchSolver base = solver(disk(alpha, 0.3, 1.0, top, SelfGravity.EQUILIBRIUM), parity);
    BranchSolver full = solver(disk(alpha, 0.3, 1.0, top, SelfGravity.FULL), parity);
    double kx = (0.1 + random.nextDouble()) / base.problem().equilibrium().scaleHeight();
    double without = base.growth(kx, 0).map(GrowthPoint::growthRate).orElse(0.0);
    double with = full.growth(kx, 0).map(GrowthPoint::growthRate).orElse(0.0);
    assertThat(with).isGreaterThanOrEqualTo(without * (1.0 - 1e-8));
  }

  /** The proved peak of random disks: nothing on a scan is faster, the slope is that of the curve, the work adds up. */
  @RepeatedTest(16)
  void thePeakStandsAndItsWorkAddsUp(RepetitionInfo repetition) {
    Random random = new Random(100 + repetition.getCurrentRepetition());
    GravityLaw[] laws = random.nextInt(3) == 0 ? new GravityLaw[0] : new GravityLaw[] {TestDisks.law(random.nextInt(7))};
    Disk disk = disk(2.0 * random.nextDouble(), random.nextDouble(), 0.9 + 0.4 * random.nextDouble(),
        2.5 + 3.0 * random.nextDouble(), SelfGravity.FULL, laws);
    for (Parity parity : List.of(Parity.MIRROR, Parity.FLEXING)) {
      BranchSolver solver = solver(disk, parity);
      Optional<Peak> peak = solver.fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0);
      double marginal = solver.marginalWavenumber(0);
      for (int i = 1; i < 40 && marginal > 0.0; i++) {
        assertThat(solver.growth(marginal * i / 40.0, 0).map(GrowthPoint::growthRate).orElse(0.0))
            .isLessThanOrEqualTo(solver.provedBound());
      }
      if (peak.isPresent() && peak.get().wavenumber() > 0.0) {
        double square = peak.get().growthRate() * peak.get().growthRate();
        WorkTerms work = peak.get().mode().work();
        double greatest = Math.max(Math.abs(work.weight()), Math.abs(work.selfGravity()));
        // 1e-7 of the largest term: s itself is good to 1e-9, and the terms cancel
        assertThat(work.sum()).isCloseTo(square, within(1e-7 * (square + greatest)));
        assertThat(work.selfGravity()).isPositive();
      }
    }
  }

  /** Beyond the margin that is found, nothing grows, and just before it something does. */
  @RepeatedTest(12)
  void theMarginIsTheEnd(RepetitionInfo repetition) {
    Random random = new Random(200 + repetition.getCurrentRepetition());
    Disk disk = disk(random.nextDouble(), random.nextDouble(), 1.0, 3.0 + random.nextDouble(), SelfGravity.FULL);
    BranchSolver solver = solver(disk, Parity.MIRROR);
    double marginal = solver.marginalWavenumber(0);
    assertThat(marginal).isPositive();
    // one per cent on either side: growth there stands out from rounding
    assertThat(solver.growth(1.01 * marginal, 0)).isEmpty();
    assertThat(solver.growth(0.99 * marginal, 0)).isPresent();
  }
}
