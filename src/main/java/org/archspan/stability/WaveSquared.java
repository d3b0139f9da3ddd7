package org.archspan.stability;

/** Squared wavenumbers as {@link CondensedForm} uses them: of one wave, or of a bound on an interval of waves. */
final class WaveSquared {
  /** kx^2 where the field bends, and where the gas compresses; k^2 where the field turns. */
  double bending;
  double compressing;
  /** kx^2 at which the compression is expanded to first order; equal to {@link #compressing}: exact. */
  double tangent;
  /** 1/k^2 where gas moves across a field that turns. */
  double inverse;
  /** ky^2. */
  double across;

  /** One wave. */
  void exact(double kx, double ky) {
    bending = kx * kx;
    compressing = bending;
    tangent = bending;
    inverse = 1.0 / bending;
    across = ky * ky;
  }

  /** A form below those of all kx between two values. */
  void below(double lowest, double highest, double ky) {
    exact(highest, ky);
    bending = lowest * lowest;
  }

  /**
   * The form that is tangent at one kx^2, taken at one end of an interval of kx.
   *
   * @param touching kx^2 in the interval; 0 only where the interval begins there
   * @param end      the end of the interval
   * @param highest  its upper end
   */
  void tangent(double touching, double end, double highest, double ky) {
    exact(end, ky);
    tangent = touching;
    inverse = touching == 0.0 ? 1.0 / (highest * highest) : (2.0 - bending / touching) / touching;
  }
}
