package org.archspan.figure;

/**
 * Growth rate as a smooth surface over the plane of wavenumbers. It is the square of the growth rate that passes smoothly
 * through the margin: continued below zero it draws the margin between the points of a grid, where the growth rate itself
 * has an edge.
 */
final class GrowthSurface {
  private final double[] across;
  private final double[] along;
  private final double[][] square;

  /**
   * A surface, in the units of the figure.
   *
   * @param across shape [m], ascending
   * @param along  shape [n], ascending
   * @param growth 0 where stable, shape [n][m]
   */
  GrowthSurface(double[] across, double[] along, double[][] growth) {
    this.across = across;
    this.along = along;
    square = new double[across.length][along.length];
    for (int j = 0; j < across.length; j++) {
      for (int i = 0; i < along.length; i++) {
        square[j][i] = growth[i][j] > 0.0 ? growth[i][j] * growth[i][j] : continued(square[j], i);
      }
    }
  }

  private static double continued(double[] column, int i) {
    double next = i >= 2 ? 2.0 * column[i - 1] - column[i - 2] : i == 1 ? column[0] : 0.0;
    return next < 0.0 ? next : -Double.MIN_NORMAL;
  }

  /** Square of the growth rate at each point, negative where stable, shape [m][n]. */
  double[][] square() {
    return square;
  }

  /** The same between the points. */
  double square(double x, double y) {
    int j = below(across, x);
    int i = below(along, y);
    double u = share(across, j, x);
    double v = share(along, i, y);
    return (1.0 - u) * ((1.0 - v) * square[j][i] + v * square[j][i + 1])
        + u * ((1.0 - v) * square[j + 1][i] + v * square[j + 1][i + 1]);
  }

  private static int below(double[] grid, double value) {
    int i = 0;
    while (i + 2 < grid.length && grid[i + 1] <= value) {
      i++;
    }
    return i;
  }

  private static double share(double[] grid, int i, double value) {
    return Math.max(0.0, Math.min(1.0, (value - grid[i]) / (grid[i + 1] - grid[i])));
  }
}
