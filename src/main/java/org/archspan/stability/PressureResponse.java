package org.archspan.stability;

import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;

/**
 * The closures in {@link Scales}: how stiffly gas and cosmic rays answer compression at a growth rate and wavenumber.
 * Holds the last evaluated factors; one instance for one thread.
 */
final class PressureResponse {
  private final GasClosure gasClosure;
  private final double time;
  private final double cosmicRayIndex;
  private final double diffusivity;

  /** Factor of the gas pressure, and of the cosmic-ray pressure, in {@code Gamma P}. */
  double gas;
  double cosmicRay;
  /** Derivative of the gas factor with respect to s. */
  double gasByGrowth;
  /** Derivatives of the cosmic-ray factor with respect to s and kx. */
  double cosmicRayByGrowth;
  double cosmicRayByWavenumber;

  PressureResponse(GasClosure gas, CosmicRayClosure cosmicRays, Scales scales) {
    gasClosure = gas;
    time = scales.time();
    cosmicRayIndex = cosmicRays.adiabaticIndex();
    diffusivity = cosmicRays.diffusivity() / (scales.length() * scales.speed());
    this.gas = gas.adiabaticIndex();
  }

  /**
   * Evaluates the factors.
   *
   * @param growth     s, not negative
   * @param wavenumber kx, not negative
   */
  void evaluate(double growth, double wavenumber) {
    if (gasClosure.cools()) {
      gas = gasClosure.index(growth / time);
      double damping = time / gasClosure.coolingTime();
      gasByGrowth = (gasClosure.adiabaticIndex() - 1.0) * damping / ((growth + damping) * (growth + damping));
    }
    cosmicRayByGrowth = 0.0;
    cosmicRayByWavenumber = 0.0;
    if (Double.isInfinite(diffusivity)) {
      cosmicRay = 0.0;
      return;
    }
    double leak = diffusivity * wavenumber * wavenumber;
    if (leak == 0.0) {
      cosmicRay = cosmicRayIndex;
      return;
    }
    double total = growth + leak;
    cosmicRay = cosmicRayIndex * growth / total;
    cosmicRayByGrowth = cosmicRayIndex * leak / (total * total);
    cosmicRayByWavenumber = -2.0 * cosmicRay * diffusivity * wavenumber / total;
  }
}
