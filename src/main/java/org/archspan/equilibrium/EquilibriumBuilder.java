package org.archspan.equilibrium;

import java.util.Locale;
import java.util.Optional;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.GasComponent;
import org.archspan.disk.MagneticField;
import org.archspan.disk.RefusedModelException;
import org.archspan.disk.SelfGravity;
import org.archspan.units.Constants;

/** Builds the base state of a disk. */
public final class EquilibriumBuilder {
  private EquilibriumBuilder() {
  }

  /**
   * The equilibrium of a disk over its domain.
   *
   * @param disk      the physical model
   * @param tolerance relative accuracy asked of growth rates, dimensionless: decides where an open top may stand
   * @throws RefusedModelException when no such state exists, or the domain does not suit it
   */
  public static Equilibrium build(Disk disk, double tolerance) {
    ExternalGravity gravity = new ExternalGravity(disk.gravity());
    double bottom = bottom(disk);
    requireGravity(disk);
    Stratification stratification = stratification(disk, gravity, bottom);
    double sides = disk.domain().aboutMidplane() ? 2.0 : 1.0;
    double surfaceDensity = sides * stratification.columnAbove(bottom);
    double scaleHeight = surfaceDensity / (sides * Math.exp(stratification.logDensity(bottom)));
    DomainEnd end = DomainEnd.of(closedWhereTurning(disk), stratification, bottom, scaleHeight, tolerance);
    LayeredBuild.requireInside(disk, bottom, end.top());
    if (stratification instanceof BalanceStratification balance) {
      FieldSupport.require(balance, bottom, end.top());
    }
    return new BoundedEquilibrium(stratification, bottom, end.top(), disk.domain().aboutMidplane(), end.boundary(),
        surfaceDensity);
  }

  /** Above an open top the atmosphere must be uniform, and a field that goes on turning is not. */
  private static Domain closedWhereTurning(Disk disk) {
    Domain domain = disk.domain();
    if (disk.fieldTurn() == 0.0) {
      return domain;
    }
    if (domain.topBoundary().filter(boundary -> boundary == TopBoundary.OPEN).isPresent()) {
      throw new RefusedModelException("an open top needs a uniform atmosphere above it, and there this field goes on turning"
          + " (field.turn); use domain.top-boundary = \"lid\"");
    }
    return new Domain(domain.floor(), domain.top(), Optional.of(domain.topBoundary().orElse(TopBoundary.LID)));
  }

  private static void requireGravity(Disk disk) {
    if (disk.gravity().isEmpty() && disk.selfGravity() == SelfGravity.OFF) {
      throw new RefusedModelException("nothing holds the gas: give a [gravity] law, or gas.self-gravity =" 
          + " \"equilibrium\" or \"full\"");
    }
    if (disk.selfGravity() != SelfGravity.OFF && !disk.domain().aboutMidplane()) {
      throw new RefusedModelException("gas.self-gravity needs a disk about its midplane: above a floor (domain.bottom) the"
          + " gas below it would be missing; remove domain.bottom, or set gas.self-gravity = \"off\"");
    }
  }

  private static double bottom(Disk disk) {
    if (disk.domain().aboutMidplane()) {
      return 0.0;
    }
    if (disk.domain().floor().orElseThrow().inScaleHeights()) {
      throw new RefusedModelException("the floor (domain.bottom) cannot be given in scale heights, which are counted"
          + " from the density on it; give it as a length");
    }
    double bottom = disk.domain().floor().orElseThrow().value();
    if (bottom < 0.0) {
      throw new RefusedModelException("the floor (domain.bottom) must not lie below the midplane");
    }
    return bottom;
  }

  private static Stratification stratification(Disk disk, ExternalGravity gravity, double bottom) {
    if (disk.gas() instanceof Gas.Stratified stratified) {
      return BalanceSplit.build(disk, stratified, gravity, bottom);
    }
    if (LayeredBuild.suits(disk)) {
      return LayeredBuild.build(disk, gravity, bottom);
    }
    double[] dispersionSquared = dispersionSquared(disk.gas());
    if (disk.gas() instanceof Gas.Isothermal gas && gas.surfaceDensity().isPresent()) {
      double density = MidplaneDensity.forSurfaceDensity(gas.surfaceDensity().getAsDouble(),
          rho -> isothermal(disk, gravity, bottom, new double[] {rho}, dispersionSquared), bottom,
          disk.domain().aboutMidplane(), dispersionSquared[0], startingDensity(disk, gravity, bottom, gas));
      return isothermal(disk, gravity, bottom, new double[] {density}, dispersionSquared);
    }
    return isothermal(disk, gravity, bottom, densities(disk.gas()), dispersionSquared);
  }

  /** Density at the lower end of a gas with a surface density, g cm^-3, roughly: held by external gravity, by its own, or both. */
  private static double startingDensity(Disk disk, ExternalGravity gravity, double bottom, Gas.Isothermal gas) {
    double column = gas.surfaceDensity().orElseThrow();
    double square = gas.dispersion() * gas.dispersion();
    double density = disk.selfGravity() == SelfGravity.OFF ? 0.0
        : 0.5 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * column * column / square;
    if (disk.gravity().isEmpty()) {
      return density;
    }
    double reference = gravity.potential(bottom);
    double height = HeightPanels.heightOfFall(z -> (reference - gravity.potential(z)) / square, bottom, 1.0,
        Double.POSITIVE_INFINITY);
    return density + column / height;
  }

  private static double[] dispersionSquared(Gas gas) {
    if (gas instanceof Gas.Components several) {
      return several.components().stream().mapToDouble(part -> part.dispersion() * part.dispersion()).toArray();
    }
    double dispersion = ((Gas.Isothermal) gas).dispersion();
    return new double[] {dispersion * dispersion};
  }

  private static double[] densities(Gas gas) {
    if (gas instanceof Gas.Components several) {
      return several.components().stream().mapToDouble(GasComponent::bottomDensity).toArray();
    }
    return new double[] {((Gas.Isothermal) gas).bottomDensity().orElseThrow(() -> new IllegalArgumentException(
        "an isothermal gas needs a bottom density or a surface density, found neither"))};
  }

  private static IsothermalStratification isothermal(Disk disk, ExternalGravity gravity, double bottom,
      double[] densities, double[] dispersionSquared) {
    double pressure = 0.0;
    for (int i = 0; i < densities.length; i++) {
      pressure += densities[i] * dispersionSquared[i];
    }
    IsothermalStratification light = new IsothermalStratification(gravity, bottom, densities, dispersionSquared,
        magneticRatio(disk.field(), pressure), cosmicRayRatio(disk.cosmicRays(), pressure));
    return disk.selfGravity() == SelfGravity.OFF ? light : light.withOwnGravity();
  }

  static double magneticRatio(MagneticField field, double gasPressure) {
    if (field instanceof MagneticField.ConstantRatio constant) {
      return constant.pressureRatio();
    }
    if (field instanceof MagneticField.BottomStrength given) {
      return given.strength() * given.strength() / (8.0 * Math.PI * gasPressure);
    }
    throw new RefusedModelException("field.shape = \"balance\" needs a gas stratification (gas.stratum); with an"
        + " isothermal gas give field.pressure-ratio or field.strength");
  }

  static double cosmicRayRatio(CosmicRays cosmicRays, double gasPressure) {
    if (cosmicRays instanceof CosmicRays.PressureRatio given) {
      return given.ratio();
    }
    return ((CosmicRays.BottomPressure) cosmicRays).pressure() / gasPressure;
  }

  /** A length for messages: in parsecs, or in megametres where that is the smaller number of the two to read. */
  static String words(double length) {
    return Math.abs(length) < 1e-6 * Constants.PARSEC ? String.format(Locale.ROOT, "%.4g Mm", length / 1e8)
        : String.format(Locale.ROOT, "%.4g pc", length / Constants.PARSEC);
  }

}
