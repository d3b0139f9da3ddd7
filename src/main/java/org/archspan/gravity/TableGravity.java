package org.archspan.gravity;

import java.util.Arrays;

/**
 * Gravity from a table, joined by a cubic that is smooth and keeps the table monotone between its entries.
 *
 * <p>Source of the slopes: Fritsch and Carlson (1980), SIAM J. Numer. Anal. 17, 238, in the weighted harmonic mean of
 * Fritsch and Butland (1984), SIAM J. Sci. Stat. Comput. 5, 300. Immutable.
 */
public final class TableGravity implements GravityLaw {
  private final double[] heights;
  private final double[] accelerations;
  private final double[] slopes;
  private final double[] potentials;

  /**
   * A law through the entries of a table; a first height above 0 is preceded by (0, 0).
   *
   * @param heights       z, cm, ascending, not negative, at least two
   * @param accelerations g, cm s^-2, finite
   * @throws IllegalArgumentException with the entry that is wrong
   */
  public TableGravity(double[] heights, double[] accelerations) {
    requireTable(heights, accelerations);
    boolean starts = heights[0] == 0.0;
    this.heights = starts ? heights.clone() : prepend(heights);
    this.accelerations = starts ? accelerations.clone() : prepend(accelerations);
    this.slopes = slopes(this.heights, this.accelerations);
    this.potentials = new double[this.heights.length];
    for (int i = 1; i < potentials.length; i++) {
      potentials[i] = potentials[i - 1] + integral(i - 1, 1.0);
    }
  }

  private static void requireTable(double[] heights, double[] accelerations) {
    if (heights.length < 2 || heights.length != accelerations.length) {
      throw new IllegalArgumentException("a gravity table needs at least two heights, each with an acceleration; found "
          + heights.length + " heights and " + accelerations.length + " accelerations");
    }
    for (int i = 0; i < heights.length; i++) {
      boolean ascends = i == 0 ? heights[0] >= 0.0 : heights[i] > heights[i - 1];
      if (!ascends || !Double.isFinite(heights[i]) || !Double.isFinite(accelerations[i])) {
        throw new IllegalArgumentException("entry " + (i + 1) + " of a gravity table is (" + heights[i] + " cm, "
            + accelerations[i] + " cm/s^2); heights must ascend from 0 or above, and both must be finite");
      }
    }
  }

  private static double[] prepend(double[] values) {
    double[] longer = new double[values.length + 1];
    System.arraycopy(values, 0, longer, 1, values.length);
    return longer;
  }

  private static double[] slopes(double[] x, double[] y) {
    int n = x.length;
    double[] slopes = new double[n];
    for (int i = 1; i < n - 1; i++) {
      double left = (y[i] - y[i - 1]) / (x[i] - x[i - 1]);
      double right = (y[i + 1] - y[i]) / (x[i + 1] - x[i]);
      double w1 = 2.0 * (x[i + 1] - x[i]) + (x[i] - x[i - 1]);
      double w2 = (x[i + 1] - x[i]) + 2.0 * (x[i] - x[i - 1]);
      slopes[i] = left * right > 0.0 ? (w1 + w2) / (w1 / left + w2 / right) : 0.0;
    }
    slopes[0] = (y[1] - y[0]) / (x[1] - x[0]);
    slopes[n - 1] = (y[n - 1] - y[n - 2]) / (x[n - 1] - x[n - 2]);
    return slopes;
  }

  private int piece(double height) {
    int found = Arrays.binarySearch(heights, height);
    int at = found >= 0 ? found : -found - 2;
    return Math.max(0, Math.min(at, heights.length - 2));
  }

  @Override
  public double acceleration(double height) {
    int i = piece(height);
    double width = heights[i + 1] - heights[i];
    double t = (height - heights[i]) / width;
    double u = 1.0 - t;
    return u * u * ((1.0 + 2.0 * t) * accelerations[i] + t * width * slopes[i])
        + t * t * ((3.0 - 2.0 * t) * accelerations[i + 1] - u * width * slopes[i + 1]);
  }

  @Override
  public double potential(double height) {
    int i = piece(height);
    return potentials[i] + integral(i, (height - heights[i]) / (heights[i + 1] - heights[i]));
  }

  /** Integral of a piece from its left end to the fraction t of its width. */
  private double integral(int i, double t) {
    double width = heights[i + 1] - heights[i];
    double t2 = t * t;
    double t3 = t2 * t;
    double t4 = t3 * t;
    double left = accelerations[i] * (t - t3 + 0.5 * t4);
    double right = accelerations[i + 1] * (t3 - 0.5 * t4);
    double leftSlope = width * slopes[i] * (0.5 * t2 - 2.0 * t3 / 3.0 + 0.25 * t4);
    double rightSlope = width * slopes[i + 1] * (0.25 * t4 - t3 / 3.0);
    return width * (left + right + leftSlope + rightSlope);
  }

  @Override
  public double[] landmarks() {
    return new double[] {heights[1]};
  }

  @Override
  public double[] kinks() {
    return Arrays.copyOfRange(heights, 1, heights.length - 1);
  }

  @Override
  public double greatestHeight() {
    return heights[heights.length - 1];
  }
}
