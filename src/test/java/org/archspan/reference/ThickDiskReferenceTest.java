package org.archspan.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.GasClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.GasStratum;
import org.archspan.disk.GasStratum.Shape;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.GravityLaw;
import org.archspan.units.Constants;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The thick disk near the Sun (Kim et al. 2000, ApJ 531, 873) by both references and by SciPy, which has
 * the base state in closed form: benchmarks/peer.
 */
class ThickDiskReferenceTest {
  private static final double KILOPARSEC = 1e3 * Constants.PARSEC;
  private static final Equilibrium DISK = thickDisk();

  /** Digits in (km/s)/pc: converged dense and sparse SciPy solutions, wavelength 3 kpc, lid at 5 kpc. */
  @ParameterizedTest
  @CsvSource({"MIRROR, 0, 0.02815373308", "FLEXING, 0, 0.02818063608", "MIRROR, 1, 0.02895304771",
      "FLEXING, 1, 0.02895565769"})
  void bothReferencesAgreeWithThePeerScripts(Parity parity, double obliqueness, double expected) {
    double kx = 2.0 * Math.PI / (3.0 * KILOPARSEC);
    double unit = 1e5 / Constants.PARSEC;
    GasClosure gas = new GasClosure(1.0);
    double dense = new DenseReference(DISK, gas, CosmicRays.none().closure(), parity, 92)
        .growthRates(kx, obliqueness * kx)[0] / unit;
    double shot = new ShootingReference(DISK, gas, CosmicRays.none().closure(), parity)
        .growthRate(kx, obliqueness * kx, 0) / unit;
    // 1e-6 percent: truncation of the collocation, which meets the middle of the disk with few of its points
    assertThat(dense).isCloseTo(expected, withinPercentage(1e-6));
    // 2e-7 percent: the peer's rounding and its ten digits; the state's own tolerance is below that
    assertThat(shot).isCloseTo(expected, withinPercentage(2e-7));
  }

  private static Equilibrium thickDisk() {
    double nucleus = 1.27 * Constants.HYDROGEN_MASS;
    Gas gas = new Gas.Stratified(List.of(
        stratum(Shape.GAUSSIAN, 0.6 * nucleus, 70.0), stratum(Shape.GAUSSIAN, 0.3 * nucleus, 135.0),
        stratum(Shape.GAUSSIAN, 0.07 * nucleus, 135.0), stratum(Shape.EXPONENTIAL, 0.1 * nucleus, 400.0),
        stratum(Shape.EXPONENTIAL, 0.03 * nucleus, 900.0)), OptionalDouble.empty());
    Domain domain = Domain.aboutMidplane(Optional.of(Height.centimetres(5.0 * KILOPARSEC)), TopBoundary.LID);
    MagneticField field = new MagneticField.Balance(OptionalDouble.of(5e-6));
    List<GravityLaw> gravity = List.of(new Saturating());
    return EquilibriumBuilder.build(
        new Disk(gas, new GasClosure(1.0), field, CosmicRays.none(), gravity, domain), 1e-12);
  }

  private static GasStratum stratum(Shape shape, double density, double parsecs) {
    return new GasStratum(shape, density, parsecs * Constants.PARSEC);
  }

  /** {@code g = 8e-9 [1 - 0.52 exp(-z/325 pc) - 0.48 exp(-z/900 pc)]} cm s^-2 (Martos & Cox 1998). */
  private record Saturating() implements GravityLaw {
    private static final double NEAR = 325.0 * Constants.PARSEC;
    private static final double FAR = 900.0 * Constants.PARSEC;

    @Override
    public double acceleration(double height) {
      return 8e-9 * (1.0 - 0.52 * Math.exp(-height / NEAR) - 0.48 * Math.exp(-height / FAR));
    }

    @Override
    public double potential(double height) {
      double near = 0.52 * NEAR * Math.expm1(-height / NEAR);
      return 8e-9 * (height + near + 0.48 * FAR * Math.expm1(-height / FAR));
    }

    @Override
    public double[] landmarks() {
      return new double[] {NEAR, FAR};
    }
  }
}
