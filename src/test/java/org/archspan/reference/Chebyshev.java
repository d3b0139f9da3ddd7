package org.archspan.reference;

/** Chebyshev extreme points and differentiation (Trefethen 2000, Spectral Methods in MATLAB, chapter 6). */
final class Chebyshev {
  private Chebyshev() {
  }

  /** Ascending points of {@code [bottom, bottom + height]}, unit of the arguments. */
  static double[] points(int count, double bottom, double height) {
    double[] z = new double[count];
    for (int i = 0; i < count; i++) {
      z[i] = bottom + height * Math.pow(Math.sin(0.5 * Math.PI * i / (count - 1)), 2);
    }
    return z;
  }

  /** Values on the points to derivatives on the points, shape [count][count], unit 1/height. */
  static double[][] derivative(int count, double height) {
    double[][] d = new double[count][count];
    double step = 0.5 * Math.PI / (count - 1);
    for (int i = 0; i < count; i++) {
      double diagonal = 0.0;
      for (int j = 0; j < count; j++) {
        if (i != j) {
          // difference of two cosines as a product of sines: no cancellation
          double gap = height * Math.sin((i + j) * step) * Math.sin((i - j) * step);
          d[i][j] = weight(i, count) / weight(j, count) * ((i + j) % 2 == 0 ? 1.0 : -1.0) / gap;
          diagonal -= d[i][j];
        }
      }
      d[i][i] = diagonal;
    }
    return d;
  }

  private static double weight(int i, int count) {
    return i == 0 || i == count - 1 ? 2.0 : 1.0;
  }
}
