package org.archspan.uncertainty;

import java.util.List;

/**
 * One draw and its answer, in the units of the output.
 *
 * @param draw       its index
 * @param values     of the uncertain inputs, each in its unit
 * @param outcome    unstable, stable or failed
 * @param wavelength of the mode that sets the spacing, in units of length of the output; NaN where nothing grows
 * @param growthTime of that mode, in units of time of the output; NaN where nothing grows
 * @param mass       gas that one wavelength holds, in units of mass of the output, for each unit of length of arm
 *                   width where no width is known; NaN where nothing grows
 * @param heldBy     disk, lid or halo; empty where nothing grows or it was not asked
 * @param gathers    whether the mode gathers the disk's own gas
 * @param reason     why there is no answer; empty where there is
 */
public record DrawRow(long draw, List<Double> values, Outcome outcome, double wavelength, double growthTime,
    double mass, String heldBy, boolean gathers, String reason) {
  /** Kinds of answer. */
  public enum Outcome {
    /** A wave grows. */
    UNSTABLE,
    /** None does. */
    STABLE,
    /** No answer. */
    FAILED
  }

  /** Whether the draw has a spacing that is a finite number. */
  public boolean hasSpacing() {
    return outcome == Outcome.UNSTABLE && Double.isFinite(wavelength);
  }
}
