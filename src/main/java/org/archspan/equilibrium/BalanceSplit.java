package org.archspan.equilibrium;

import java.util.Arrays;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Gas;
import org.archspan.disk.MagneticField;
import org.archspan.disk.RefusedModelException;
import org.archspan.disk.SelfGravity;

/** Splits the total pressure of a prescribed stratification into gas, field and cosmic rays. */
final class BalanceSplit {
  private BalanceSplit() {
  }

  static BalanceStratification build(Disk disk, Gas.Stratified gas, ExternalGravity gravity, double bottom) {
    if (!(disk.field() instanceof MagneticField.Balance field)) {
      throw new RefusedModelException("a gas stratification (gas.stratum) leaves no choice of the field: set"
          + " field.shape = \"balance\" and remove field.pressure-ratio");
    }
    StratumSum strata = new StratumSum(gas.strata());
    BalanceStratification total =
        BalanceStratification.integrate(strata, gravity(disk, strata, gravity), bottom);
    double density = Math.exp(strata.logDensity(bottom));
    double pressure = density * total.totalPerMass(bottom);
    double gasPressure = gas.dispersion().isPresent()
        ? density * gas.dispersion().getAsDouble() * gas.dispersion().getAsDouble()
        : gasPressure(pressure, field.bottomStrength(), disk.cosmicRays());
    return total.split(gasPressure / density, EquilibriumBuilder.cosmicRayRatio(disk.cosmicRays(), gasPressure));
  }

  private static ExternalGravity gravity(Disk disk, StratumSum strata, ExternalGravity external) {
    if (disk.selfGravity() == SelfGravity.OFF) {
      return external;
    }
    double shortest = DoubleStream.concat(Arrays.stream(strata.landmarks()), Arrays.stream(external.landmarks()))
        .min().orElseThrow();
    return external.with(GasGravity.solve((z, potential) -> strata.logDensity(z), shortest, external.kinks(),
        external.greatestHeight()));
  }

  /** Gas pressure at the lower end that a given field leaves, erg cm^-3. */
  private static double gasPressure(double total, OptionalDouble strength, CosmicRays cosmicRays) {
    double field = strength.orElseThrow(() -> new RefusedModelException("a gas stratification needs either"
        + " gas.dispersion or field.strength at the midplane; the other follows from the balance"));
    double left = total - field * field / (8.0 * Math.PI);
    double gas = cosmicRays instanceof CosmicRays.PressureRatio given ? left / (1.0 + given.ratio())
        : left - ((CosmicRays.BottomPressure) cosmicRays).pressure();
    if (!(gas > 0.0)) {
      throw new RefusedModelException(String.format(Locale.ROOT, "support runs out at the lower end: the weight of the"
          + " gas is %.4g erg/cm^3, a field of %.4g uG and the cosmic rays take more and leave no gas pressure; lower"
          + " field.strength or cosmic-rays.pressure", total, field * 1e6));
    }
    return gas;
  }
}
