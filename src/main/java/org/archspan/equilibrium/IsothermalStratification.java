package org.archspan.equilibrium;

import java.util.Arrays;
import org.archspan.units.Constants;

/**
 * Isothermal components that share one potential, with constant ratios of magnetic and cosmic-ray to gas pressure:
 * {@code rho_i = rho_i0 exp(-Phi / [(1 + alpha + beta) c_i^2])}.
 */
final class IsothermalStratification implements Stratification {
  private final ExternalGravity gravity;
  private final double bottom;
  private final double[] logDensities;
  private final double[] dispersionSquared;
  private final double magneticRatio;
  private final double cosmicRayRatio;
  private final double support;

  /**
   * A stratification from the densities at the lower end.
   *
   * @param densities         of each component at the lower end, g cm^-3, positive
   * @param dispersionSquared of each component, cm^2 s^-2, positive
   * @param magneticRatio     alpha, dimensionless
   * @param cosmicRayRatio    beta, dimensionless
   */
  IsothermalStratification(ExternalGravity gravity, double bottom, double[] densities, double[] dispersionSquared,
      double magneticRatio, double cosmicRayRatio) {
    this.gravity = gravity;
    this.bottom = bottom;
    this.logDensities = new double[densities.length];
    for (int i = 0; i < densities.length; i++) {
      logDensities[i] = Math.log(densities[i]);
    }
    this.dispersionSquared = dispersionSquared.clone();
    this.magneticRatio = magneticRatio;
    this.cosmicRayRatio = cosmicRayRatio;
    this.support = 1.0 + magneticRatio + cosmicRayRatio;
  }

  @Override
  public GasState at(double height) {
    double depth = depth(height);
    double g = gravity.acceleration(height);
    double greatest = greatest(depth);
    double density = 0.0;
    double pressure = 0.0;
    double column = 0.0;
    for (int i = 0; i < logDensities.length; i++) {
      double part = Math.exp(logDensities[i] - depth / dispersionSquared[i] - greatest);
      density += part;
      pressure += part * dispersionSquared[i];
      column += part / dispersionSquared[i];
    }
    double gasPerMass = pressure / density;
    return new GasState(greatest + Math.log(density), -g * column / (support * density), g, gasPerMass,
        magneticRatio * gasPerMass, cosmicRayRatio * gasPerMass);
  }

  @Override
  public double logDensity(double height) {
    return logDensityWhere(depth(height));
  }

  /** The same stratification with the gas's own gravity added to the external one. */
  IsothermalStratification withOwnGravity() {
    double density = Math.exp(logDensityWhere(0.0));
    double shortest = Math.sqrt(support * Arrays.stream(dispersionSquared).min().orElseThrow()
        / (4.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * density));
    for (double landmark : gravity.landmarks()) {
      shortest = Math.min(shortest, landmark);
    }
    GasGravity own = GasGravity.solve((z, potential) -> logDensityWhere(depth(z) + potential / support), shortest,
        gravity.kinks(), gravity.greatestHeight());
    double[] densities = Arrays.stream(logDensities).map(Math::exp).toArray();
    return new IsothermalStratification(gravity.with(own), bottom, densities, dispersionSquared, magneticRatio,
        cosmicRayRatio);
  }

  private double logDensityWhere(double depth) {
    double greatest = greatest(depth);
    double density = 0.0;
    for (int i = 0; i < logDensities.length; i++) {
      density += Math.exp(logDensities[i] - depth / dispersionSquared[i] - greatest);
    }
    return greatest + Math.log(density);
  }

  private double depth(double height) {
    return (gravity.potential(height) - gravity.potential(bottom)) / support;
  }

  private double greatest(double depth) {
    double greatest = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < logDensities.length; i++) {
      greatest = Math.max(greatest, logDensities[i] - depth / dispersionSquared[i]);
    }
    return greatest;
  }

  @Override
  public double[] landmarks() {
    return gravity.landmarks();
  }

  @Override
  public double[] kinks() {
    return gravity.kinks();
  }

  @Override
  public double greatestHeight() {
    return gravity.greatestHeight();
  }
}
