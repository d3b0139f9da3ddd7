package org.archspan.gravity;

/**
 * Uniform gravity, {@code g = strength} at every height: the textbook atmosphere (Parker 1966, ApJ 145, 811).
 *
 * @param strength g, cm s^-2, positive
 */
public record UniformGravity(double strength) implements GravityLaw {
  /** Refuses inputs outside their range. */
  public UniformGravity {
    LawInput.requirePositive("strength", strength);
  }

  @Override
  public double acceleration(double height) {
    return strength;
  }

  @Override
  public double potential(double height) {
    return strength * height;
  }

  @Override
  public double[] landmarks() {
    return new double[0];
  }
}
