package org.archspan.disk;

/** Where the gas's own gravity acts. */
public enum SelfGravity {
  /** Nowhere: a light gas in an external field. */
  OFF,
  /** In the base state only. */
  EQUILIBRIUM,
  /** In the base state and on the perturbations. */
  FULL
}
