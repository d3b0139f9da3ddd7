package org.archspan.stability;

import java.util.List;
import org.archspan.boundary.Parity;

/**
 * Growth rate against wavenumber of one branch.
 *
 * @param parity          symmetry about the midplane
 * @param order           mode order, 0 for the fastest
 * @param crossWavenumber across the field, cm^-1
 * @param points          by ascending wavenumber
 */
public record GrowthCurve(Parity parity, int order, double crossWavenumber, List<GrowthPoint> points) {
  /** Keeps the points immutable. */
  public GrowthCurve {
    points = List.copyOf(points);
  }
}
