package org.archspan.observe;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/**
 * Makes the complexes of an invented galaxy. Along a logarithmic spiral from the inner radius outward lie sites at
 * equal steps of arc length; each is displaced along the arm by a normal jitter, and across it by a normal scatter
 * that is a fraction of the radius; some sites stay empty; and some strays lie anywhere between the inner and the
 * outer radius. Lengths in kpc, angles in degrees.
 *
 * @param pitch   pitch angle, negative for the other winding
 * @param inner   radius of the first site
 * @param spacing of the sites along the arm; 0 places them at random
 * @param sites   number of sites
 * @param jitter  along the arm
 * @param width   across the arm over the radius
 * @param missing probability that a site is empty
 * @param strays  number of complexes off the arm
 */
record InventedArm(double pitch, double inner, double spacing, int sites, double jitter, double width, double missing,
    int strays) {
  /** The arm of the shipped table. */
  static InventedArm shipped() {
    return new InventedArm(17.0, 3.0, 1.6, 19, 0.16, 0.03, 0.15, 3);
  }

  /** Positions in the plane, kpc. */
  List<double[]> plane(long seed) {
    Random random = new Random(seed);
    double sine = Math.abs(Math.sin(Math.toRadians(pitch)));
    double length = sites * Math.max(spacing, 1.0);
    List<double[]> positions = new ArrayList<>();
    for (int i = 0; i < sites; i++) {
      double along = spacing > 0.0 ? i * spacing + jitter * random.nextGaussian() : length * random.nextDouble();
      double radius = inner + along * sine;
      double azimuth = Math.log(radius / inner) / Math.tan(Math.toRadians(pitch)) + 0.7;
      double across = width * random.nextGaussian();
      double normal = Math.toRadians(pitch);
      if (random.nextDouble() >= missing) {
        positions.add(polar(radius * Math.exp(across * Math.cos(normal)), azimuth - across * Math.sin(normal)));
      }
    }
    for (int i = 0; i < strays; i++) {
      positions.add(polar(inner + length * sine * random.nextDouble(), 2.0 * Math.PI * random.nextDouble()));
    }
    return positions;
  }

  private static double[] polar(double radius, double azimuth) {
    return new double[] {radius * Math.cos(azimuth), radius * Math.sin(azimuth)};
  }

  /** The same as positions without errors, one unit of length a kpc. */
  List<PlanePosition> positions(long seed) {
    return plane(seed).stream().map(each -> new PlanePosition(each[0], each[1], 0.0, 0.0)).toList();
  }
}
