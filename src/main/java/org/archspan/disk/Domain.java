package org.archspan.disk;

import java.util.Optional;
import org.archspan.boundary.TopBoundary;

/**
 * The range of heights that is solved.
 *
 * @param floor       rigid floor; empty for a disk about its midplane (z = 0)
 * @param top         upper end; empty to let it follow from the tolerance
 * @param topBoundary what bounds the gas there; empty: open where the atmosphere above is uniform, otherwise a lid
 */
public record Domain(Optional<Height> floor, Optional<Height> top, Optional<TopBoundary> topBoundary) {
  /** A disk about its midplane. */
  public static Domain aboutMidplane(Optional<Height> top, TopBoundary topBoundary) {
    return new Domain(Optional.empty(), top, Optional.of(topBoundary));
  }

  /** Whether the lower end is the midplane of a disk. */
  public boolean aboutMidplane() {
    return floor.isEmpty();
  }
}
