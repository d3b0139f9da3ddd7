package org.archspan.disk;

import org.archspan.closure.CosmicRayClosure;

/** Cosmic rays: pressure in a constant ratio to that of the gas, and a closure. */
public sealed interface CosmicRays {
  /** How their pressure answers compression. */
  CosmicRayClosure closure();

  /** beta = cosmic-ray over gas pressure, dimensionless, not negative. */
  record PressureRatio(double ratio, CosmicRayClosure closure) implements CosmicRays {
  }

  /** Cosmic-ray pressure at the midplane (or on the floor), erg cm^-3, not negative. */
  record BottomPressure(double pressure, CosmicRayClosure closure) implements CosmicRays {
  }

  /** No cosmic rays. */
  static CosmicRays none() {
    return new PressureRatio(0.0, CosmicRayClosure.instantDiffusion());
  }
}
