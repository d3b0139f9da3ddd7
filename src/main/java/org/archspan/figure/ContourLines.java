package org.archspan.figure;

import java.awt.geom.Path2D;

/** Lines of equal value on a grid, by marching squares. */
final class ContourLines {
  private ContourLines() {
  }

  /**
   * The line of one level.
   *
   * @param x     ascending, shape [n]
   * @param y     ascending, shape [m]
   * @param value shape [n][m]
   */
  static Path2D of(double[] x, double[] y, double[][] value, double level) {
    Path2D path = new Path2D.Double();
    double[] ends = new double[8];
    for (int i = 0; i + 1 < x.length; i++) {
      for (int j = 0; j + 1 < y.length; j++) {
        int count = 0;
        count = cross(ends, count, x[i], y[j], value[i][j], x[i + 1], y[j], value[i + 1][j], level);
        count = cross(ends, count, x[i + 1], y[j], value[i + 1][j], x[i + 1], y[j + 1], value[i + 1][j + 1], level);
        count = cross(ends, count, x[i + 1], y[j + 1], value[i + 1][j + 1], x[i], y[j + 1], value[i][j + 1], level);
        count = cross(ends, count, x[i], y[j + 1], value[i][j + 1], x[i], y[j], value[i][j], level);
        for (int k = 0; k + 3 < 2 * count; k += 4) {
          path.moveTo(ends[k], ends[k + 1]);
          path.lineTo(ends[k + 2], ends[k + 3]);
        }
      }
    }
    return path;
  }

  private static int cross(double[] ends, int count, double x1, double y1, double v1, double x2, double y2, double v2,
      double level) {
    if (v1 < level == v2 < level) {
      return count;
    }
    double share = (level - v1) / (v2 - v1);
    ends[2 * count] = x1 + share * (x2 - x1);
    ends[2 * count + 1] = y1 + share * (y2 - y1);
    return count + 1;
  }
}
