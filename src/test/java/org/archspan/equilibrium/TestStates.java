package org.archspan.equilibrium;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.TableGravity;
import org.archspan.stability.TestDisks;
import org.archspan.units.Constants;

/** Base states for tests, in CGS. */
final class TestStates {
  static final double PC = Constants.PARSEC;
  static final double DISPERSION = 6.4e5;
  static final double DENSITY = 2.34e-24;
  /** Number of laws that {@link #law} knows. */
  static final int LAWS = 8;

  private TestStates() {
  }

  /** Every law by formula, and one by table. */
  static GravityLaw law(int i) {
    if (i == LAWS - 1) {
      return new TableGravity(new double[] {50.0 * PC, 150.0 * PC, 400.0 * PC, 1e3 * PC, 2e4 * PC},
          new double[] {8e-10, 2e-9, 3.5e-9, 5e-9, 6e-9});
    }
    return TestDisks.law(i);
  }

  static Equilibrium build(Gas gas, MagneticField field, CosmicRays cosmicRays, Domain domain,
      GravityLaw... gravity) {
    return EquilibriumBuilder.build(
        new Disk(gas, new GasClosure(1.0), field, cosmicRays, List.of(gravity), domain), 1e-8);
  }

  /** Isothermal gas of the usual density and dispersion under a lid at six scale heights. */
  static Equilibrium isothermal(double alpha, double beta, GravityLaw... gravity) {
    return build(ofDensity(DENSITY), new MagneticField.ConstantRatio(alpha), ratio(beta), lid(6.0), gravity);
  }

  static Gas ofDensity(double density) {
    return new Gas.Isothermal(DISPERSION, OptionalDouble.of(density), OptionalDouble.empty());
  }

  static Gas ofSurfaceDensity(double surfaceDensity) {
    return new Gas.Isothermal(DISPERSION, OptionalDouble.empty(), OptionalDouble.of(surfaceDensity));
  }

  static CosmicRays ratio(double beta) {
    return new CosmicRays.PressureRatio(beta, CosmicRayClosure.instantDiffusion());
  }

  static CosmicRays pressure(double pressure) {
    return new CosmicRays.BottomPressure(pressure, CosmicRayClosure.instantDiffusion());
  }

  /** A disk about its midplane with a lid at so many scale heights. */
  static Domain lid(double scaleHeights) {
    return Domain.aboutMidplane(Optional.of(Height.scaleHeights(scaleHeights)), TopBoundary.LID);
  }
}
