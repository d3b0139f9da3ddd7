package org.archspan.shear;

/**
 * Rotation and shear in the units of a column. With x along the azimuth, y points inward, and the wavenumber across the field
 * runs as {@code ky(t) = ky(0) + (dOmega/dlnR) kx t}.
 *
 * @param angularSpeed Omega
 * @param shear        dOmega/dlnR, negative in galaxies; 0 for rigid rotation
 */
record DiskFlow(double angularSpeed, double shear) {
  /** Coefficient of the tidal term, 2 Omega dOmega/dlnR. */
  double tide() {
    return 2.0 * angularSpeed * shear;
  }

  /** The same with the sense of rotation reversed in the Coriolis force alone. */
  DiskFlow adjoint() {
    return new DiskFlow(-angularSpeed, -shear);
  }
}
