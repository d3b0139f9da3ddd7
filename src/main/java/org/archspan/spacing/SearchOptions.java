package org.archspan.spacing;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.archspan.boundary.Parity;
import org.archspan.disk.Height;

/**
 * What to search for.
 *
 * @param crossWavelength wavelength across the field; empty for waves along the field (ky = 0)
 * @param parities        midplane parities to solve; ignored above a floor; not empty
 * @param shortest        shortest wavelength along the field to search; empty: the marginal one
 * @param longest         longest wavelength to search; empty: found automatically
 * @param direction       angle of the wavevector from the field at the lower end where that field turns, rad; empty: searched
 * @param gatheringHeight greatest centroid height of a mode that counts as gathering the disk's own gas
 * @param tolerance       requested relative error of growth rates, dimensionless, 1e-12 to 1e-2
 * @param branches        greatest number of branches to report for each parity, at least 1
 */
public record SearchOptions(Optional<Height> crossWavelength, Set<Parity> parities, Optional<Height> shortest,
    Optional<Height> longest, OptionalDouble direction, Height gatheringHeight, double tolerance, int branches) {
  /** Without a direction. */
  public SearchOptions(Optional<Height> crossWavelength, Set<Parity> parities, Optional<Height> shortest,
      Optional<Height> longest, Height gatheringHeight, double tolerance, int branches) {
    this(crossWavelength, parities, shortest, longest, OptionalDouble.empty(), gatheringHeight, tolerance, branches);
  }

  /** Waves along the field, both parities, the whole unstable range, centroid within two scale heights, 1e-8. */
  public static SearchOptions defaults() {
    return new SearchOptions(Optional.empty(), Set.of(Parity.MIRROR, Parity.FLEXING), Optional.empty(),
        Optional.empty(), Height.scaleHeights(2.0), 1e-8, 6);
  }
}
