package org.archspan.spacing;

import java.util.OptionalDouble;

/**
 * The spiral arm in which a wavelength becomes a cloud complex.
 *
 * @param width        width of the arm, cm, positive; absent: masses are given per unit width
 * @param crossingTime time the gas spends in the arm, s, positive
 */
public record Arm(OptionalDouble width, OptionalDouble crossingTime) {
  /** No arm is known. */
  public static Arm unknown() {
    return new Arm(OptionalDouble.empty(), OptionalDouble.empty());
  }
}
