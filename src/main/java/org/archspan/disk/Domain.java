package org.archspan.disk;

import java.util.Optional;
import org.archspan.boundary.TopBoundary;

/**
 * The range of heights that is solved.
 *
 * @param floor       rigid floor; empty for a disk about its midplane (z = 0)
 * @param top         upper end; empty to let it follow from the tolerance
 * @param topBoundary what bounds the gas there
 */
public record Domain(Optional<Height> floor, Optional<Height> top, TopBoundary topBoundary) {
  /** A disk about its midplane. */
  public static Domain aboutMidplane(Optional<Height> top, TopBoundary topBoundary) {
    return new Domain(Optional.empty(), top, topBoundary);
  }

  /** Whether the lower end is the midplane of a disk. */
  public boolean aboutMidplane() {
    return floor.isEmpty();
  }
}
