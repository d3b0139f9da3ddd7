package org.archspan.disk;

import java.util.OptionalDouble;

/**
 * Rotation of the disk at the radius of the model, about the vertical axis. Modes see rigid rotation at the angular speed;
 * shear is what the epicyclic frequency adds.
 *
 * @param angularSpeed       Omega, s^-1, not negative
 * @param epicyclicFrequency s^-1, positive; absent: twice the angular speed, rigid rotation
 */
public record Rotation(double angularSpeed, OptionalDouble epicyclicFrequency) {
  /** Epicyclic frequency kappa, s^-1. */
  public double kappa() {
    return epicyclicFrequency.orElse(2.0 * angularSpeed);
  }
}
