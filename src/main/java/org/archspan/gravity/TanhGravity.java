package org.archspan.gravity;

/**
 * Gravity that rises from the midplane and becomes uniform, {@code g = strength tanh(z/height)}.
 *
 * @param strength g far from the midplane, cm s^-2, positive
 * @param height over which it is reached, cm, positive
 */
public record TanhGravity(double strength, double height) implements GravityLaw {
  /** Refuses inputs outside their range. */
  public TanhGravity {
    LawInput.requirePositive("strength", strength);
    LawInput.requirePositive("height", height);
  }

  @Override
  public double acceleration(double z) {
    return strength * Math.tanh(z / height);
  }

  @Override
  public double potential(double z) {
    return strength * height * LogCosh.of(z / height);
  }

  @Override
  public double[] landmarks() {
    return new double[] {height};
  }
}
