package org.archspan.inference;

import org.archspan.uncertainty.DrawRow;

/**
 * A spacing that was measured.
 *
 * @param wavelength in units of length of the output, positive
 * @param error      one standard deviation, in units of length of the output, positive
 */
public record ObservedSpacing(double wavelength, double error) {
  /** How many standard deviations a row lies from it, dimensionless; infinite for a row without a spacing. */
  public double distance(DrawRow row) {
    return row.hasSpacing() ? Math.abs(row.wavelength() - wavelength) / error : Double.POSITIVE_INFINITY;
  }

  /** Whether a row reproduces it within one standard deviation. */
  public boolean reproducedBy(DrawRow row) {
    return distance(row) <= 1.0;
  }
}
