package org.archspan.gravity;

/**
 * Gravity of a stellar disk and a spheroidal halo, {@code g = A z/sqrt(z^2 + h^2) + B z}.
 *
 * <p>Source: Kuijken and Gilmore (1989), MNRAS 239, 605, in the form of Ferriere (1998), ApJ 497, 759.
 *
 * @param diskStrength A, cm s^-2, positive
 * @param diskHeight h, cm, positive
 * @param haloGradient B, s^-2, not negative
 */
public record DiskAndHaloGravity(double diskStrength, double diskHeight, double haloGradient) implements GravityLaw {
  /** Refuses inputs outside their range. */
  public DiskAndHaloGravity {
    LawInput.requirePositive("disk-strength", diskStrength);
    LawInput.requirePositive("disk-height", diskHeight);
    LawInput.requireNotNegative("halo-gradient", haloGradient);
  }

  @Override
  public double acceleration(double height) {
    return diskStrength * height / Math.hypot(height, diskHeight) + haloGradient * height;
  }

  /** The disk's part as {@code A z^2/(sqrt(z^2 + h^2) + h)}, which does not cancel near the midplane. */
  @Override
  public double potential(double height) {
    return diskStrength * height * (height / (Math.hypot(height, diskHeight) + diskHeight))
        + 0.5 * haloGradient * height * height;
  }

  @Override
  public double[] landmarks() {
    return new double[] {diskHeight};
  }
}
