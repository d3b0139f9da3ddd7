package org.archspan.spacing;

import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;

/**
 * The waves that are searched.
 *
 * @param lowest          lowest wavenumber along the field, cm^-1, 0 for no limit
 * @param highest         highest, cm^-1, infinite for no limit
 * @param crossWavenumber across the field, cm^-1
 */
public record WaveRange(double lowest, double highest, double crossWavenumber) {
  /**
   * The range that the options ask for.
   *
   * @throws RefusedModelException when the shortest wave is not shorter than the longest
   */
  public static WaveRange of(SearchOptions options, Equilibrium equilibrium) {
    double scaleHeight = equilibrium.scaleHeight();
    double lowest = options.longest().map(wave -> 2.0 * Math.PI / wave.resolve(scaleHeight)).orElse(0.0);
    double highest = options.shortest().map(wave -> 2.0 * Math.PI / wave.resolve(scaleHeight))
        .orElse(Double.POSITIVE_INFINITY);
    double cross = options.crossWavelength().map(wave -> 2.0 * Math.PI / wave.resolve(scaleHeight)).orElse(0.0);
    if (!(lowest < highest)) {
      throw new RefusedModelException("waves.shortest must be shorter than waves.longest");
    }
    return new WaveRange(lowest, highest, cross);
  }

  /** Whether some waves along the field are left out. */
  boolean limited() {
    return lowest > 0.0 || Double.isFinite(highest);
  }

  /** Whether a wavenumber (cm^-1) is an end of the range, to a millionth. */
  boolean endsAt(double wavenumber) {
    return Math.abs(wavenumber / lowest - 1.0) <= 1e-6 || Math.abs(wavenumber / highest - 1.0) <= 1e-6;
  }
}
