package org.archspan.stability;

/**
 * A field whose direction turns with height, seen by a wave of a given direction. At a height z the field makes the angle
 * {@code rate (z - bottom)} with the field at the lower end, the wavevector always the same one; about a midplane the two
 * sides are mirror images. Only the components of the wavevector along and across the local field enter the problem.
 *
 * @param rate      of turning, rad cm^-1; 0 for a straight field
 * @param direction angle of the wavevector from the field at the lower end, rad
 */
public record FieldTurn(double rate, double direction) {
  /** A field that does not turn, and a wave whose components are given one by one. */
  public static final FieldTurn NONE = new FieldTurn(0.0, 0.0);

  /** Whether the wave is given by its direction. */
  public boolean turns() {
    return rate != 0.0 || direction != 0.0;
  }

  /** Angle of the wavevector from the field at a height above the lower end (cm), rad. */
  double angle(double height) {
    return direction - rate * height;
  }
}
