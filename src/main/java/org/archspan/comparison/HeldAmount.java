package org.archspan.comparison;

/** What is known of the amount of gas, and therefore stays the same while other inputs vary. */
public enum HeldAmount {
  /** The column of gas, as seen from above. */
  SURFACE_DENSITY,
  /** The density at the lower end. */
  MIDPLANE_DENSITY,
  /** Neither: the amount of gas is itself varied. */
  NEITHER,
  /** Both: the stratification is prescribed. */
  BOTH
}
