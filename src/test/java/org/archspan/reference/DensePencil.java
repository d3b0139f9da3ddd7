package org.archspan.reference;

import dev.ludovic.netlib.lapack.JavaLAPACK;
import java.util.stream.IntStream;
import org.netlib.util.intW;

/** {@code A u = lambda B u}, both dense and column by column, solved by LAPACK's dggev. */
final class DensePencil {
  /** Infinite eigenvalues, of rows without lambda, have a denominator that vanishes beside the numerator. */
  private static final double INFINITE = 1e-9;
  private final int size;
  private final double[] left;
  private final double[] right;
  private final double[] real;
  private final double[] imaginary;
  private final double[] denominator;

  DensePencil(int size) {
    this.size = size;
    left = new double[size * size];
    right = new double[size * size];
    real = new double[size];
    imaginary = new double[size];
    denominator = new double[size];
  }

  void addLeft(int row, int column, double value) {
    left[row + size * column] += value;
  }

  void addRight(int row, int column, double value) {
    right[row + size * column] += value;
  }

  void clearRow(int row) {
    for (int column = 0; column < size; column++) {
      left[row + size * column] = 0.0;
      right[row + size * column] = 0.0;
    }
  }

  private void solve() {
    double[] work = new double[16 * size];
    intW info = new intW(0);
    JavaLAPACK.getInstance().dggev("N", "N", size, left, size, right, size, real, imaginary, denominator,
        new double[1], 1, new double[1], 1, work, work.length, info);
    if (info.val != 0) {
      throw new IllegalStateException("dggev did not converge: info " + info.val);
    }
  }

  /** Finite eigenvalues with a positive real part, as {real, imaginary}; overwrites the matrices. */
  double[][] growing() {
    solve();
    return IntStream.range(0, size)
        .filter(i -> Math.abs(denominator[i]) > INFINITE * Math.hypot(real[i], imaginary[i]))
        .mapToObj(i -> new double[] {real[i] / denominator[i], imaginary[i] / denominator[i]})
        .filter(s -> s[0] > 0.0).toArray(double[][]::new);
  }

  /**
   * Real eigenvalues above a value, descending; overwrites the matrices.
   *
   * @param rounding greatest imaginary numerator that counts as none
   */
  double[] realAbove(double least, double rounding) {
    solve();
    double[] ascending = IntStream.range(0, size)
        .filter(i -> Math.abs(denominator[i]) > INFINITE * Math.abs(real[i]) && Math.abs(imaginary[i]) <= rounding)
        .mapToDouble(i -> real[i] / denominator[i]).filter(v -> v > least).sorted().toArray();
    int last = ascending.length - 1;
    return IntStream.rangeClosed(0, last).mapToDouble(i -> ascending[last - i]).toArray();
  }
}
