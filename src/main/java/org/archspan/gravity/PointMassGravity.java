package org.archspan.gravity;

import org.archspan.units.Constants;

/**
 * Vertical gravity on a ring around a point mass, {@code g = G M z/(R^2 + z^2)^(3/2)}.
 *
 * @param mass M, g, positive
 * @param radius R of the ring, cm, positive
 */
public record PointMassGravity(double mass, double radius) implements GravityLaw {
  /** Refuses inputs outside their range. */
  public PointMassGravity {
    LawInput.requirePositive("mass", mass);
    LawInput.requirePositive("radius", radius);
  }

  @Override
  public double acceleration(double height) {
    double distance = Math.hypot(height, radius);
    return Constants.GRAVITATIONAL_CONSTANT * mass / distance / distance * (height / distance);
  }

  /** {@code G M (1/R - 1/r)}, written as {@code G M z^2/[R r (R + r)]} against cancellation near the plane. */
  @Override
  public double potential(double height) {
    double distance = Math.hypot(height, radius);
    return Constants.GRAVITATIONAL_CONSTANT * mass / radius * (height / distance) * (height / (radius + distance));
  }

  @Override
  public double[] landmarks() {
    return new double[] {radius};
  }
}
