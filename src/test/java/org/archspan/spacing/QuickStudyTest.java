package org.archspan.spacing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.Set;
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
import org.archspan.disk.Rotation;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.LinearGravity;
import org.archspan.gravity.TanhGravity;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;

/** The quick answer is the answer of the main job. */
class QuickStudyTest {
  private static final double PARSEC = 3.0856775814913673e18;

  private static Disk disk(Random random) {
    GravityLaw gravity = random.nextBoolean() ? new TanhGravity(2.5e-9 * (0.7 + 0.6 * random.nextDouble()),
        160.0 * PARSEC)
        : new LinearGravity(2.2e-11 / PARSEC * (0.7 + 0.6 * random.nextDouble()));
    double index = random.nextInt(4) == 0 ? 3.0 : 1.0;
    double top = (300.0 + 1200.0 * random.nextDouble()) * PARSEC;
    boolean open = gravity instanceof TanhGravity && top > 900.0 * PARSEC && random.nextBoolean();
    return new Disk(new Gas.Isothermal(6.4e5, OptionalDouble.of(2.3e-24), OptionalDouble.empty()),
        new GasClosure(index), new MagneticField.ConstantRatio(0.3 + random.nextDouble()),
        new CosmicRays.PressureRatio(random.nextDouble(), CosmicRayClosure.instantDiffusion()), List.of(gravity),
        Domain.aboutMidplane(Optional.of(Height.centimetres(top)), open ? TopBoundary.OPEN : TopBoundary.LID));
  }

  @RepeatedTest(24)
  void isTheAnswerOfTheMainJob(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    Disk disk = disk(random);
    SearchOptions standard = SearchOptions.defaults();
    SearchOptions options = random.nextBoolean() ? standard : new SearchOptions(standard.crossWavelength(),
        Set.of(Parity.MIRROR), standard.shortest(), standard.longest(), standard.gatheringHeight(), 1e-8, 6);
    QuickStudy study = new QuickStudy(options, true);
    Optional<QuickSpacing> quick = study.solve(disk, study.equilibrium(disk));
    SpacingResult full = new SpacingStudy(disk, options, Arm.unknown()).solve();
    assertThat(quick.isPresent()).isEqualTo(!full.stable());
    if (quick.isPresent()) {
      BranchPeak peak = full.spacingPeak().orElseThrow();
      // the same root by the same steps; 1e-10 leaves room for another order of the parities
      assertThat(quick.get().wavelength()).isCloseTo(peak.wavelength(), within(1e-10 * peak.wavelength()));
      assertThat(quick.get().growthRate()).isCloseTo(peak.growthRate(), within(1e-10 * peak.growthRate()));
      assertThat(quick.get().gathers()).isEqualTo(full.spacing().isPresent());
      assertThat(quick.get().heldBy()).contains(peak.heldBy());
    }
    assertThat(new QuickStudy(options, false).solve(disk,
        study.equilibrium(disk)).flatMap(QuickSpacing::heldBy)).isEmpty();
  }

  /** With rotation too, however slow, it is the answer of the main job; rotation at no speed is none. */
  @Test
  void rotationIsLeftToTheMainJob() {
    SearchOptions standard = SearchOptions.defaults();
    SearchOptions options = new SearchOptions(standard.crossWavelength(), Set.of(Parity.MIRROR), standard.shortest(),
        standard.longest(), standard.gatheringHeight(), 1e-8, 1);
    QuickStudy study = new QuickStudy(options, true);
    Disk still = disk(new Random(1));
    Optional<QuickSpacing> without = study.solve(still, study.equilibrium(still));
    Disk rotating = rotating(still, 8e-16);
    assertThat(study.solve(rotating, study.equilibrium(rotating)).map(QuickSpacing::growthRate)).isEqualTo(
        new SpacingStudy(rotating, options, Arm.unknown()).solve().spacingPeak().map(BranchPeak::growthRate));
    Disk resting = rotating(still, 0.0);
    assertThat(study.solve(resting, study.equilibrium(resting))).isEqualTo(without);
  }

  private static Disk rotating(Disk disk, double angularSpeed) {
    return new Disk(disk.gas(), disk.gasClosure(), disk.selfGravity(), disk.field(), disk.cosmicRays(), disk.gravity(),
        Optional.of(new Rotation(angularSpeed, OptionalDouble.empty())), disk.domain());
  }
}
