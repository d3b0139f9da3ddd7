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
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.archspan.gravity.GravityLaw;
import org.archspan.mesh.Mesh;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Ends of the domain. */
class BoundaryTest {
  /** Gravity that is strong near the disk and becomes uniform above: a disk that holds a mode of its own. */
  private record PeakedGravity(double strength, double height, double excess) implements GravityLaw {
    @Override
    public double acceleration(double z) {
      double t = Math.tanh(z / height);
      return strength * t * (1.0 + excess * (1.0 - t * t));
    }

    @Override
    public double potential(double z) {
      double t = Math.tanh(z / height);
      return strength * height * (Math.log(Math.cosh(Math.min(z / height, 300.0)))
          + Math.max(0.0, z / height - 300.0) + 0.5 * excess * t * t);
    }

    @Override
    public double[] landmarks() {
      return new double[] {height};
    }
  }

  private static Disk peaked(Optional<Height> top, TopBoundary boundary) {
    return new Disk(new Gas.Isothermal(6.4e5, OptionalDouble.of(1e-24), OptionalDouble.empty()), new GasClosure(1.0),
        new MagneticField.ConstantRatio(1.0), new CosmicRays.PressureRatio(1.0, CosmicRayClosure.instantDiffusion()),
        List.of(new PeakedGravity(5e-10, 250.0 * TestDisks.PC, 20.0)), Domain.aboutMidplane(top, boundary));
  }

  /** An open top gives what a lid far away gives, for a mode that the disk holds. */
  @ParameterizedTest
  @CsvSource({"MIRROR, 800", "FLEXING, 800", "MIRROR, 3500", "FLEXING, 3500"})
  void openTopIsALidFarAway(Parity parity, double wavelength) {
    double kx = 2.0 * Math.PI / (wavelength * TestDisks.PC);
    ModeProblem open = TestDisks.problem(peaked(Optional.empty(), TopBoundary.OPEN), parity, 0.0, 1e-9);
    ModeProblem lower = TestDisks.problem(peaked(Optional.of(Height.centimetres(3000.0 * TestDisks.PC)),
        TopBoundary.OPEN), parity, 0.0, 1e-9);
    ModeProblem lid = TestDisks.problem(peaked(Optional.of(Height.centimetres(25e3 * TestDisks.PC)), TopBoundary.LID),
        parity, 0.0, 1e-9);
    double s = new BranchSolver(open).growth(kx, 0).orElseThrow().growthRate();
    assertThat(s).isGreaterThan(new BranchSolver(open).haloGrowth(kx));
    // 1e-7: the lid at 25 kpc is still felt at the level of exp(-2 mu z), about 1e-8 here
    assertThat(new BranchSolver(lid).growth(kx, 0).orElseThrow().growthRate()).isCloseTo(s, within(1e-7 * s));
    // 1e-6: at 3 kpc gravity still differs from its limit by exp(-24)
    assertThat(new BranchSolver(lower).growth(kx, 0).orElseThrow().growthRate()).isCloseTo(s, within(1e-6 * s));
  }

  /** The slopes with an open top are those of finite differences. */
  @Test
  void slopesWithAnOpenTopAreTrue() {
    ModeSolver solver = new ModeSolver(TestDisks.problem(peaked(Optional.empty(), TopBoundary.OPEN), Parity.MIRROR, 0.0,
        1e-10));
    double k = 2.0 * Math.PI / (800.0 * TestDisks.PC) * solver.scales().length();
    double h = 1e-3 * k;
    double difference = (8.0 * (s(solver, k + h) - s(solver, k - h)) - (s(solver, k + 2 * h) - s(solver, k - 2 * h)))
        / (12.0 * h);
    double slope = solver.growth(k, 0, Double.NaN).orElseThrow().slope();
    // 1e-7: fourth-order difference, step 1e-3, of values good to 1e-12
    assertThat(slope).isCloseTo(difference, within(1e-7 * Math.max(1.0, Math.abs(slope))));
  }

  /** The work terms count what lies above an open top. */
  @ParameterizedTest
  @CsvSource({"MIRROR, 800", "FLEXING, 3500"})
  void workAboveAnOpenTopCounts(Parity parity, double wavelength) {
    ModeProblem open = TestDisks.problem(peaked(Optional.of(Height.centimetres(2500.0 * TestDisks.PC)),
        TopBoundary.OPEN), parity, 0.0, 1e-9);
    EigenMode mode = new BranchSolver(open).mode(2.0 * Math.PI / (wavelength * TestDisks.PC), 0).orElseThrow();
    double square = mode.growthRate() * mode.growthRate();
    // 1e-8: the vector belongs to a growth rate within 1e-7 of the root, and the sum errs by its square
    assertThat(mode.work().sum()).isCloseTo(square, within(1e-8 * mode.work().weight()));
  }

  private static double s(ModeSolver solver, double k) {
    return solver.growth(k, 0, Double.NaN).orElseThrow().growth();
  }

  /**
   * An inverted free surface of nearly incompressible gas without field on a deep layer falls at s = sqrt(g k) (Rayleigh
   * 1883; Chandrasekhar 1961, ch. X, with nothing below). Without the jump term the bare natural condition gives nothing.
   */
  @Test
  void invertedFreeSurfaceFallsAtTheRateOfRayleigh() {
    double depth = 8.0;
    Equilibrium layer = new UniformLayer(depth, 1e10);
    Scales scales = new Scales(1.0, 1.0);
    Mesh mesh = new Mesh(new double[] {0.0, 2.0, 4.0, 6.0, 7.0, 8.0}, 10);
    Atmosphere atmosphere = new Atmosphere(layer, scales, mesh, false, FieldTurn.NONE);
    PressureResponse response =
        new PressureResponse(new GasClosure(1.0), CosmicRayClosure.instantDiffusion(), scales);
    DynamicStiffness stiffness = new LightStiffness(atmosphere, response, true, TopBoundary.FREE);
    double k = 1.0;
    double exact = Math.sqrt(k * Math.tanh(k * depth));
    // 1e-6: compressibility changes s by about g/(k c^2) = 1e-10; the mesh by less than 1e-8
    assertThat(stiffness.count(exact * (1.0 - 1e-6), k, 0.0)).isEqualTo(1);
    assertThat(stiffness.count(exact * (1.0 + 1e-6), k, 0.0)).isZero();
    DynamicStiffness lid = new LightStiffness(atmosphere, response, true, TopBoundary.LID);
    assertThat(lid.count(1e-3, k, 0.0)).isZero();
  }

  /** Uniform density, gravity of 1 upwards, a stiff gas. */
  private record UniformLayer(double top, double stiffness) implements Equilibrium {
    @Override
    public GasState at(double height) {
      return new GasState(0.0, 0.0, -1.0, stiffness, 0.0, 0.0);
    }

    @Override
    public double bottom() {
      return 0.0;
    }

    @Override
    public boolean aboutMidplane() {
      return false;
    }

    @Override
    public TopBoundary topBoundary() {
      return TopBoundary.FREE;
    }

    @Override
    public double surfaceDensity() {
      return top;
    }

    @Override
    public double scaleHeight() {
      return 1.0;
    }

    @Override
    public double dispersion() {
      return 1.0;
    }

    @Override
    public double[] landmarks() {
      return new double[0];
    }

    @Override
    public double[] kinks() {
      return new double[0];
    }

    @Override
    public Equilibrium withTop(double newTop) {
      return new UniformLayer(newTop, stiffness);
    }
  }
}
