package org.archspan.observe;

/**
 * The highest peak of the periodogram of arc positions.
 *
 * @param grid       searched frequencies, cm^-1
 * @param powers     at those, dimensionless
 * @param wavelength of the peak, with its error by bootstrap
 * @param power      at the peak, dimensionless; the number of complexes where they sit at exact multiples
 * @param steadiness fraction of the bootstrap samples whose highest peak is this one, dimensionless
 */
public record PeriodogramPeak(RayleighPeriodogram grid, double[] powers, MeasuredLength wavelength, double power,
    double steadiness) {
  /** Greatest power on the grid, which the random trials are compared with, dimensionless. */
  double gridPower() {
    return powers[RayleighPeriodogram.greatest(powers)];
  }
}
