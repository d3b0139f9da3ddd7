package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
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
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.reference.UniformAtmosphere;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The terms of the energy principle add up to the square of the growth rate. */
class WorkTermsTest {
  @RepeatedTest(40)
  void addUpToTheSquareOfTheGrowthRate(RepetitionInfo repetition) {
    long seed = repetition.getCurrentRepetition();
    Disk disk = TestDisks.random(seed);
    double height = EquilibriumBuilder.build(disk, 1e-9).scaleHeight();
    BranchSolver solver = new BranchSolver(TestDisks.problem(disk, seed % 2 == 0 ? Parity.MIRROR : Parity.FLEXING,
        (seed % 3) / height, 1e-9));
    Optional<EigenMode> mode = solver.mode(0.5 / height, 0);
    if (mode.isPresent()) {
      check(mode.get());
    }
  }

  private static void check(EigenMode mode) {
    double square = mode.growthRate() * mode.growthRate();
    WorkTerms work = mode.work();
    double size = Math.abs(work.weight()) + Math.abs(work.stratification()) + square;
    // 1e-8: the vector belongs to a growth rate within 1e-7 of the root, and the sum errs by its square
    assertThat(work.sum()).isCloseTo(square, within(1e-8 * size));
    assertThat(work.gasCompression()).isLessThanOrEqualTo(0.0);
    assertThat(work.cosmicRayCompression()).isLessThanOrEqualTo(0.0);
    assertThat(work.fieldCompression()).isLessThanOrEqualTo(0.0);
    assertThat(work.fieldTension()).isLessThanOrEqualTo(0.0);
    assertThat(work.stratification()).isLessThanOrEqualTo(0.0);
    assertThat(work.weight()).isPositive();
  }

  /** A free surface does work of its own, and the part above an open top counts. */
  @ParameterizedTest
  @EnumSource(TopBoundary.class)
  void withEveryTop(TopBoundary boundary) {
    double alpha = 1.0;
    Disk disk = new Disk(new Gas.Isothermal(1.0, OptionalDouble.of(1.0), OptionalDouble.empty()), new GasClosure(1.0),
        new MagneticField.ConstantRatio(alpha),
        new CosmicRays.PressureRatio(1.0, new CosmicRayClosure(4.0 / 3.0, 3.0)),
        List.of(new org.archspan.gravity.SaturatingGravity(3.0, 0.5, 0.6, 0.9)),
        Domain.aboutMidplane(Optional.of(Height.centimetres(boundary == TopBoundary.OPEN ? 9.0 : 5.0)), boundary));
    double kx = boundary == TopBoundary.OPEN ? 1.4 : 0.7;
    BranchSolver solver = new BranchSolver(TestDisks.problem(disk, Parity.FLEXING, 0.3, 1e-9));
    Optional<EigenMode> mode = solver.mode(kx, 0);
    if (boundary != TopBoundary.OPEN) {
      assertThat(mode).isPresent();
    }
    mode.ifPresent(WorkTermsTest::check);
    mode.ifPresent(shape -> assertThat(shape.work().topSurface() < 0.0).isEqualTo(boundary == TopBoundary.FREE));
  }

  /** In the uniform atmosphere (Parker 1966) the tension is exactly -kx^2 v_A^2 times the share of Z in the inertia. */
  @RepeatedTest(1)
  void tensionOfTheUniformAtmosphere() {
    UniformAtmosphere atmosphere = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    BranchSolver solver = new BranchSolver(new ModeProblem(atmosphere.equilibrium(10.0), new GasClosure(1.0),
        CosmicRayClosure.instantDiffusion(), Parity.FLOOR, 0.0, 1e-10));
    EigenMode mode = solver.mode(0.5, 0).orElseThrow();
    check(mode);
    // kx^2 v_A^2 = 0.25 * 2; the tension cannot exceed it, nor be less than the vertical share of the motion
    assertThat(-mode.work().fieldTension()).isBetween(0.0, 0.5);
  }
}
