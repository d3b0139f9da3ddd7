package org.archspan.spacing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Height;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.ModeProblem;
import org.archspan.stability.TestDisks;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;

/** A field whose direction turns with height. */
class TurningFieldTest {
  private static Disk turning(Disk straight, double radiansPerScaleHeight) {
    double rate = radiansPerScaleHeight / EquilibriumBuilder.build(straight, 1e-8).scaleHeight();
    return new Disk(straight.gas(), straight.gasClosure(), straight.selfGravity(), straight.field(), rate,
        straight.cosmicRays(), straight.gravity(), straight.rotation(), straight.domain());
  }

  private static SearchOptions options(OptionalDouble direction) {
    return new SearchOptions(Optional.empty(), Set.of(Parity.MIRROR), Optional.of(Height.scaleHeights(4.0)),
        Optional.empty(), direction, Height.scaleHeights(2.0), 1e-8, 1);
  }

  /**
   * Turning everything by one angle changes nothing: in a straight field a wave of a direction is the wave with those
   * components along and across it; finite diffusivity included (random disks have it).
   */
  @RepeatedTest(12)
  void aStraightFieldTurnedAsAWholeChangesNothing(RepetitionInfo repetition) {
    int seed = repetition.getCurrentRepetition();
    Disk disk = TestDisks.random(seed);
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, 1e-8);
    double direction = 0.1 + 0.11 * seed;
    double k = 0.9 / equilibrium.scaleHeight();
    double straight = new BranchSolver(ModeProblem.of(disk, equilibrium, Parity.FLEXING, k * Math.sin(direction), 1e-10))
        .growth(k * Math.cos(direction), 0).map(point -> point.growthRate()).orElse(0.0);
    double directed = new BranchSolver(ModeProblem.turning(disk, equilibrium, Parity.FLEXING, direction, 1e-10))
        .growth(k, 0).map(point -> point.growthRate()).orElse(0.0);
    // both are asked to 1e-10
    assertThat(directed).isCloseTo(straight, within(3e-10 * straight));
  }

  /** A field that turns one way lets waves grow as its mirror image does for waves that lean the other way. */
  @Test
  void theOtherHandIsTheMirrorImage() {
    Disk disk = turning(TestDisks.random(3), 0.4);
    Disk other = turning(TestDisks.random(3), -0.4);
    SpacingResult one = new SpacingStudy(disk, options(OptionalDouble.of(0.7)), Arm.unknown()).solve();
    SpacingResult two = new SpacingStudy(other, options(OptionalDouble.of(-0.7)), Arm.unknown()).solve();
    assertThat(one.fastest()).isPresent();
    assertThat(two.fastest().orElseThrow().growthRate()).isCloseTo(one.fastest().orElseThrow().growthRate(),
        within(1e-9 * one.fastest().orElseThrow().growthRate()));
  }

  /** No direction on a finer scan grows faster than the one that the search finds. */
  @Test
  void theSearchFindsTheFastestDirection() {
    Disk disk = turning(TestDisks.isothermal(TestDisks.law(0), 1.0, 0.5, 1.0, CosmicRayClosure.instantDiffusion(), 4.0),
        0.3);
    SpacingResult found = new SpacingStudy(disk, options(OptionalDouble.empty()), Arm.unknown()).solve();
    double fastest = found.fastest().orElseThrow().growthRate();
    for (int i = 0; i < 90; i++) {
      double direction = Math.toRadians(-90.0 + 2.0 * i);
      double growth = new SpacingStudy(disk, options(OptionalDouble.of(direction)), Arm.unknown()).solve().fastest()
          .map(BranchPeak::growthRate).orElse(0.0);
      // the proof of each leaves a gap of 1e-6, rounding much less
      assertThat(growth).as("direction %g", direction).isLessThanOrEqualTo(fastest * (1.0 + 1e-8));
    }
    assertThat(found.range().direction()).isPresent();
    assertThat(found.warnings()).anySatisfy(warning -> assertThat(warning).contains("scan"));
  }

  @Test
  void aWavelengthAcrossIsRefused() {
    Disk disk = turning(TestDisks.random(1), 0.4);
    SearchOptions across = new SearchOptions(Optional.of(Height.scaleHeights(5.0)), Set.of(Parity.MIRROR),
        Optional.empty(), Optional.empty(), Height.scaleHeights(2.0), 1e-8, 1);
    assertThatThrownBy(() -> new SpacingStudy(disk, across, Arm.unknown()).solve())
        .isInstanceOf(RefusedModelException.class).hasMessageContaining("waves.cross-wavelength")
        .hasMessageContaining("waves.direction");
  }

  @Test
  void anOpenTopIsRefused() {
    Disk lid = turning(TestDisks.random(1), 0.4);
    Disk open = new Disk(lid.gas(), lid.gasClosure(), lid.selfGravity(), lid.field(), lid.fieldTurn(), lid.cosmicRays(),
        lid.gravity(), lid.rotation(), Domain.aboutMidplane(lid.domain().top(), TopBoundary.OPEN));
    assertThatThrownBy(() -> new SpacingStudy(open, options(OptionalDouble.empty()), Arm.unknown()).solve())
        .isInstanceOf(RefusedModelException.class).hasMessageContaining("open top").hasMessageContaining("field.turn");
  }
}
