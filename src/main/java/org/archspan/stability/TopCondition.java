package org.archspan.stability;

import org.archspan.boundary.TopBoundary;

/**
 * What the gas above the top adds to the last diagonal entry of the form.
 *
 * <p>Open: above the top all coefficients are constant per unit mass, zeta decays as exp(-mu z) with
 * {@code mu = sqrt(c/a)}, and the atmosphere above adds {@code a mu - b}. Where c is negative the waves above
 * propagate: the growth rate lies in the continuum of that atmosphere and the number of modes is infinite.
 */
final class TopCondition {
  private final TopBoundary boundary;
  private double entry;
  private double decay;

  TopCondition(TopBoundary boundary) {
    this.boundary = boundary;
  }

  /** Whether the last node is held in place. */
  boolean fixed() {
    return boundary == TopBoundary.LID;
  }

  boolean open() {
    return boundary == TopBoundary.OPEN;
  }

  /**
   * Evaluates the condition from the form at the top node.
   *
   * @return whether the number of modes is finite
   */
  boolean evaluate(CondensedForm form, Atmosphere atmosphere, int top) {
    entry = 0.0;
    decay = 0.0;
    if (boundary == TopBoundary.FREE) {
      entry = atmosphere.gravity[top];
    } else if (boundary == TopBoundary.OPEN) {
      if (form.c[top] < 0.0) {
        return false;
      }
      decay = Math.sqrt(form.c[top] / form.a[top]);
      entry = form.a[top] * decay - form.b[top];
    }
    return true;
  }

  /** What is added to the last diagonal entry. */
  double entry() {
    return entry;
  }

  /** Decay rate mu of zeta above an open top, per scale length; 0 for the other conditions. */
  double decay() {
    return decay;
  }

  /** Coefficient of zeta^2 at a free surface, 0 for the other conditions. */
  double surface() {
    return boundary == TopBoundary.FREE ? entry : 0.0;
  }
}
