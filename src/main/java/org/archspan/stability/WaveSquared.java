package org.archspan.stability;

/** Squared wavenumbers as {@link CondensedForm} uses them: of one wave, or of a bound on an interval of waves. */
final class WaveSquared {
  /** kx^2 where the field bends, and where the gas compresses. */
  double bending;
  double compressing;
  /** kx^2 at which the compression is expanded to first order; equal to {@link #compressing}: exact. */
  double tangent;
  /** ky^2. */
  double across;

  /** One wave. */
  void exact(double kx, double ky) {
    bending = kx * kx;
    compressing = bending;
    tangent = bending;
    across = ky * ky;
  }

  /** A form below those of all kx between two values. */
  void below(double lowest, double highest, double ky) {
    exact(highest, ky);
    bending = lowest * lowest;
  }

  /** The form that is tangent at one kx^2, taken at one end of an interval of kx. */
  void tangent(double touching, double end, double ky) {
    exact(end, ky);
    tangent = touching;
  }
}
