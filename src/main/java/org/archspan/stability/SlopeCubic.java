package org.archspan.stability;

/** The cubic through two growth rates and their slopes: where it peaks, and its values, serve as first guesses. */
final class SlopeCubic {
  private final GrowthRoot left;
  private final GrowthRoot right;
  private final double width;
  private final double quadratic;
  private final double cubic;

  SlopeCubic(GrowthRoot left, GrowthRoot right) {
    this.left = left;
    this.right = right;
    width = right.wavenumber() - left.wavenumber();
    double mean = (right.growth() - left.growth()) / width;
    quadratic = (3.0 * mean - 2.0 * left.slope() - right.slope()) / width;
    cubic = (left.slope() + right.slope() - 2.0 * mean) / (width * width);
  }

  /** Value at a wavenumber. */
  double value(double wavenumber) {
    double x = wavenumber - left.wavenumber();
    return left.growth() + x * (left.slope() + x * (quadratic + x * cubic));
  }

  /** Second derivative at a wavenumber. */
  double curvature(double wavenumber) {
    return 2.0 * quadratic + 6.0 * cubic * (wavenumber - left.wavenumber());
  }

  /** Where the cubic peaks between its ends, given that it rises at the left one and falls at the right one. */
  double peak() {
    double discriminant = quadratic * quadratic - 3.0 * cubic * left.slope();
    double x = left.slope() / (Math.sqrt(Math.max(0.0, discriminant)) - quadratic);
    if (!(x > 0.0 && x < width)) {
      x = width * left.slope() / (left.slope() - right.slope());
    }
    return left.wavenumber() + x;
  }

  /** The end where the slope is the smaller. */
  GrowthRoot flatterEnd() {
    return Math.abs(left.slope()) < Math.abs(right.slope()) ? left : right;
  }
}
