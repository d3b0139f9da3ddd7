package org.archspan.spacing;

import org.archspan.stability.EigenMode;

/** How alike the vertical displacements of two modes are, weighted with the density; for telling branches apart. */
final class ShapeOverlap {
  private static final int SAMPLES = 200;

  private ShapeOverlap() {
  }

  /** Between 0 (orthogonal) and 1 (the same shape), dimensionless; above the lower of the two tops one of them is 0. */
  static double of(EigenMode a, EigenMode b) {
    double bottom = a.height()[0];
    double top = Math.max(a.height()[a.height().length - 1], b.height()[b.height().length - 1]);
    double product = 0.0;
    double squareA = 0.0;
    double squareB = 0.0;
    for (int i = 0; i <= SAMPLES; i++) {
      double z = bottom + (top - bottom) * i / SAMPLES;
      double u = amplitude(a, z);
      double v = amplitude(b, z);
      product += u * v;
      squareA += u * u;
      squareB += v * v;
    }
    return Math.abs(product) / Math.sqrt(squareA * squareB);
  }

  /** Signed root of the kinetic energy density, linear between nodes, 0 above the top. */
  private static double amplitude(EigenMode mode, double z) {
    double[] height = mode.height();
    int high = 1;
    while (high < height.length && height[high] < z) {
      high++;
    }
    if (high == height.length) {
      return 0.0;
    }
    double step = height[high] - height[high - 1];
    double share = step > 0.0 ? (z - height[high - 1]) / step : 0.0;
    return (1.0 - share) * signedRoot(mode, high - 1) + share * signedRoot(mode, high);
  }

  private static double signedRoot(EigenMode mode, int i) {
    return Math.copySign(Math.sqrt(mode.kineticEnergy()[i]), mode.vertical()[i]);
  }
}
