package org.archspan.stability;

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
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.DiskAndHaloGravity;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.IsothermalSheetGravity;
import org.archspan.gravity.LinearGravity;
import org.archspan.gravity.PointMassGravity;
import org.archspan.gravity.SaturatingGravity;
import org.archspan.gravity.TanhGravity;
import org.archspan.gravity.UniformGravity;
import org.archspan.units.Constants;

/** Disks for tests: random ones of every gravity law, in CGS, with the length unit of choice. */
public final class TestDisks {
  static final double PC = Constants.PARSEC;

  private TestDisks() {
  }

  /** Isothermal gas of 6.4 km/s and 1 hydrogen atom in a cubic centimetre under a lid. */
  public static Disk isothermal(GravityLaw gravity, double alpha, double beta, double gasIndex,
      CosmicRayClosure cosmicRays, double topScaleHeights) {
    return new Disk(new Gas.Isothermal(6.4e5, OptionalDouble.of(2.34e-24), OptionalDouble.empty()),
        new GasClosure(gasIndex), new MagneticField.ConstantRatio(alpha),
        new CosmicRays.PressureRatio(beta, cosmicRays), List.of(gravity),
        Domain.aboutMidplane(Optional.of(Height.scaleHeights(topScaleHeights)), TopBoundary.LID));
  }

  /** Every law, bent near 150 pc. */
  public static GravityLaw law(int i) {
    return switch (Math.floorMod(i, 7)) {
      case 0 -> new TanhGravity(2.5e-9, 150.0 * PC);
      case 1 -> new UniformGravity(2e-9);
      case 2 -> new LinearGravity(7e-30);
      case 3 -> new DiskAndHaloGravity(4.4e-9, 200.0 * PC, 1.7e-9 / (1e3 * PC));
      case 4 -> new IsothermalSheetGravity(0.01, 15e5);
      case 5 -> new SaturatingGravity(8e-9, 0.52, 325.0 * PC, 900.0 * PC);
      default -> new PointMassGravity(1e10 * Constants.SOLAR_MASS, 800.0 * PC);
    };
  }

  /** A random disk: any law, alpha 0.1 to 10, beta 0 to 1.5, gamma 0.9 to 1.2, any diffusivity, 3 to 7 scale heights. */
  public static Disk random(long seed) {
    Random random = new Random(seed);
    double diffusivity = new double[] {0.0, Double.POSITIVE_INFINITY, Math.pow(10.0, 26.0 + 3.0 * random.nextDouble())}
        [random.nextInt(3)];
    return isothermal(law(random.nextInt(7)), Math.pow(10.0, -1.0 + 2.0 * random.nextDouble()),
        random.nextInt(3) == 0 ? 0.0 : 1.5 * random.nextDouble(), 0.9 + 0.3 * random.nextDouble(),
        new CosmicRayClosure(4.0 / 3.0, diffusivity), 3.0 + 4.0 * random.nextDouble());
  }

  static ModeProblem problem(Disk disk, Parity parity, double crossWavenumber, double tolerance) {
    return new ModeProblem(EquilibriumBuilder.build(disk, tolerance), disk.gasClosure(), disk.cosmicRays().closure(),
        parity, crossWavenumber, tolerance);
  }
}
