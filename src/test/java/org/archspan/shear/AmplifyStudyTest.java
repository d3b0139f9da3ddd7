package org.archspan.shear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
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
import org.archspan.disk.RefusedModelException;
import org.archspan.disk.Rotation;
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.TanhGravity;
import org.archspan.spacing.SearchOptions;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.ModeProblem;
import org.archspan.units.Constants;
import org.junit.jupiter.api.Test;

/** The whole question to a disk: errors that hold, rigid and static growth met, motions that no other motion beats. */
class AmplifyStudyTest {
  private static final double KPC = 1e3 * Constants.PARSEC;
  private static final double OMEGA = 27e5 / KPC;
  private static final double WAVELENGTH = 0.8 * KPC;
  private static final double DURATION = 60.0 * Constants.MEGAYEAR;

  /** The stated error covers what a hundred times smaller tolerance changes. */
  @Test
  void statedErrorIsHonest() {
    Amplification rough = solve(disk(37e5 / KPC), -2.0, 1e-3);
    Amplification fine = solve(disk(37e5 / KPC), -2.0, 1e-5);
    assertThat(fine.error()).isLessThan(1e-5);
    assertThat(Math.abs(rough.eFoldings() - fine.eFoldings())).isLessThan(rough.error() + fine.error());
    // what was asked: start, and radial wavenumber after a time of -(dOmega/dlnR) t
    assertThat(fine.winding()[0]).isEqualTo(-2.0);
    int last = fine.time().length - 1;
    double shear = (37.0 * 37.0 - 54.0 * 54.0) / 54.0 * 1e5 / KPC;
    assertThat(fine.winding()[last]).isCloseTo(-2.0 - shear * DURATION, within(1e-12));
    assertThat(fine.time()[last]).isCloseTo(DURATION, within(1e-9 * DURATION));
  }

  /** Growth without rotation is that of the eigenproblem; rotation slows it. */
  @Test
  void linesBesideAreTheEigenmodes() {
    Disk disk = disk(37e5 / KPC);
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, 1e-8);
    Amplification answer = solve(disk, -1.0, 1e-4);
    double exact = new BranchSolver(ModeProblem.of(disk, equilibrium, answer.parity(), 0.0, 1e-8))
        .growth(answer.wavenumber(), 0).orElseThrow().growthRate();
    // 1e-6: elements of degree 10 that the amplification asked for, not the growth rate
    assertThat(answer.staticGrowth()).isCloseTo(exact, within(1e-6 * exact));
    assertThat(answer.rigidGrowth()).isBetween(0.3 * exact, 0.999 * exact);
    assertThat(answer.limitGrowth()).isGreaterThan(exact);
  }

  /** Without shear, a long time grows at the rate of rigid rotation. */
  @Test
  void withoutShearTheWaveGrowsAsTheRigidMode() {
    Disk disk = disk(2.0 * OMEGA);
    Amplification answer = new AmplifyStudy(disk, SearchOptions.defaults(), new AmplifyOptions(
        OptionalDouble.of(WAVELENGTH), OptionalDouble.empty(), OptionalDouble.of(600.0 * Constants.MEGAYEAR), 1e-4))
            .solve(EquilibriumBuilder.build(disk, 1e-8));
    assertThat(answer.shear()).isZero();
    // 1e-4: what is asked of the late growth
    assertThat(answer.lateGrowth()).isCloseTo(answer.rigidGrowth(), within(1e-4 * answer.rigidGrowth()));
  }

  /** No random motion gains more than the best one. */
  @Test
  void noMotionBeatsTheBest() {
    Disk disk = disk(37e5 / KPC);
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, 1e-8);
    Swing swing = new Swing(disk, equilibrium, Parity.MIRROR, 2.0 * Math.PI / WAVELENGTH, DURATION);
    WindingWave winding = swing.winding(swing.column(org.archspan.stability.MeshGrading.initial(equilibrium, 10)));
    BestKick best = swing.kick(winding, -1.0, 40);
    best.improve(1e-8, 60);
    for (int seed = 1; seed <= 20; seed++) {
      WaveState other = RigidGrowthTest.kick(winding, 5, seed);
      assertThat(swing.track(winding, -1.0, 40, other).logGain()).isLessThan(0.5 * Math.log(best.gain()));
    }
    // the gain that the iteration states is the one that its motion has
    assertThat(swing.track(winding, -1.0, 40, best.kick()).logGain())
        .isCloseTo(0.5 * Math.log(best.gain()), within(1e-6));
  }

  @Test
  void refusesWhatItDoesNotTreat() {
    Disk disk = disk(37e5 / KPC);
    assertThatThrownBy(() -> solve(disk.withoutRotation(), 0.0, 1e-3)).isInstanceOf(RefusedModelException.class)
        .hasMessageContaining("[rotation]");
    Disk heavy = new Disk(disk.gas(), disk.gasClosure(), SelfGravity.FULL, disk.field(), disk.cosmicRays(),
        disk.gravity(), disk.rotation(), disk.domain());
    assertThatThrownBy(() -> solve(heavy, 0.0, 1e-3)).isInstanceOf(RefusedModelException.class)
        .hasMessageContaining("gas.self-gravity");
  }

  private static Amplification solve(Disk disk, double start, double tolerance) {
    return new AmplifyStudy(disk, SearchOptions.defaults(), new AmplifyOptions(OptionalDouble.of(WAVELENGTH),
        OptionalDouble.of(start), OptionalDouble.of(DURATION), tolerance)).solve(EquilibriumBuilder.build(disk, 1e-8));
  }

  private static Disk disk(double epicyclicFrequency) {
    return new Disk(new Gas.Isothermal(6.4e5, OptionalDouble.of(2.34e-24), OptionalDouble.empty()), new GasClosure(1.0),
        SelfGravity.OFF, new MagneticField.ConstantRatio(1.0),
        new CosmicRays.PressureRatio(0.5, CosmicRayClosure.instantDiffusion()),
        List.of(new TanhGravity(2.5e-9, 150.0 * Constants.PARSEC)),
        Optional.of(new Rotation(OMEGA, OptionalDouble.of(epicyclicFrequency))),
        Domain.aboutMidplane(Optional.of(Height.scaleHeights(4.0)), TopBoundary.LID));
  }
}
