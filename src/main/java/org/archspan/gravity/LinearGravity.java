package org.archspan.gravity;

/**
 * Gravity that rises linearly, {@code g = gradient z}: the middle of a homogeneous disk.
 *
 * @param gradient dg/dz, s^-2, positive
 */
public record LinearGravity(double gradient) implements GravityLaw {
  /** Refuses inputs outside their range. */
  public LinearGravity {
    LawInput.requirePositive("gradient", gradient);
  }

  @Override
  public double acceleration(double height) {
    return gradient * height;
  }

  @Override
  public double potential(double height) {
    return 0.5 * gradient * height * height;
  }

  @Override
  public double[] landmarks() {
    return new double[0];
  }
}
