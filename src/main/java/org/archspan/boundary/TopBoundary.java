package org.archspan.boundary;

/** What bounds the gas above. */
public enum TopBoundary {
  /** The atmosphere goes on above the top with the local values of its coefficients there. */
  OPEN,
  /** A rigid lid: no vertical displacement. */
  LID,
  /** A free surface of constant total pressure: the density drops to zero. */
  FREE
}
