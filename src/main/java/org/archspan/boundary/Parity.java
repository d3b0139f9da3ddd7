package org.archspan.boundary;

/** Symmetry of a mode about the lower end of the domain. */
public enum Parity {
  /** Mirror-symmetric about the midplane: Z = 0 there. */
  MIRROR,
  /** Flexes the midplane: Z is free there. */
  FLEXING,
  /** No midplane: a rigid floor, Z = 0 there. */
  FLOOR
}
