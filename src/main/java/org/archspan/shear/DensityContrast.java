package org.archspan.shear;

/** How far the density of a wave departs from that of the base state. */
final class DensityContrast {
  private final ShearingColumn column;
  private final double[] slopes;

  DensityContrast(ShearingColumn column) {
    this.column = column;
    slopes = new double[column.nodes()];
  }

  /** Half the sum over mass of the squared contrast at a fixed place, in units of the column. O(elements * degree^2). */
  double halfSquare(WaveState wave, double ky) {
    column.differentiate(wave.z, slopes);
    double sum = 0.0;
    for (int i = 0; i < slopes.length; i++) {
      double contrast = column.kx * wave.x[i] + ky * wave.y[i] + slopes[i]
          - 0.5 * column.inverseScaleHeight[i] * wave.z[i];
      sum += column.weight[i] * contrast * contrast;
    }
    return 0.5 * sum;
  }
}
