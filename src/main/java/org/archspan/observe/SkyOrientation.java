package org.archspan.observe;

/**
 * How a thin disk lies on the sky. The deprojection rotates to the line of nodes and divides the distance from it by
 * {@code cos i}. Which side of the disk is nearer does not matter, for it only mirrors the plane.
 *
 * @param inclination   angle between the disk and the plane of the sky, 0 to below pi/2, rad
 * @param positionAngle of the line of nodes, from north through east, rad
 * @param distance      of the galaxy, positive, cm
 */
public record SkyOrientation(double inclination, double positionAngle, double distance) {
  /** Refuses a disk seen on edge, whose complexes cannot be told apart along the line of sight. */
  public SkyOrientation {
    if (!(inclination >= 0.0 && inclination < 0.5 * Math.PI)) {
      throw new IllegalArgumentException("the inclination is " + Math.toDegrees(inclination)
          + " deg; allowed is 0 deg (face on) to below 90 deg (on edge, which nothing can deproject)");
    }
    if (!Double.isFinite(positionAngle)) {
      throw new IllegalArgumentException("the position angle is " + positionAngle + "; a finite angle is needed");
    }
    if (!(distance > 0.0 && distance < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException("the distance is " + distance + " cm; it must be positive and finite");
    }
  }

  /**
   * The position in the plane of the disk.
   *
   * @param east  offset from the centre to the east, rad
   * @param north offset from the centre to the north, rad
   * @param error standard error of both offsets, rad
   */
  public PlanePosition deproject(double east, double north, double error) {
    double along = east * Math.sin(positionAngle) + north * Math.cos(positionAngle);
    double across = east * Math.cos(positionAngle) - north * Math.sin(positionAngle);
    double stretch = 1.0 / Math.cos(inclination);
    return new PlanePosition(distance * along, distance * stretch * across, distance * error,
        distance * stretch * error);
  }
}
