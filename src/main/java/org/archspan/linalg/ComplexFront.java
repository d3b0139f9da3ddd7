package org.archspan.linalg;

/**
 * Frontal elimination of a chain of small complex matrices, each coupled to the next by its last unknowns: LU without pivoting
 * across fronts, with the logarithm of the determinant and its phase kept apart so that nothing overflows.
 *
 * <p>Matrices are row-major with real and imaginary parts in separate arrays. Owns its work arrays: one instance for one
 * thread.
 */
public final class ComplexFront {
  private final int size;
  private final int coupled;
  private final int fronts;
  private final double[] real;
  private final double[] imaginary;
  private double logMagnitude;
  private double phase;

  /**
   * Room for a chain.
   *
   * @param fronts  number of matrices
   * @param size    order of each
   * @param coupled unknowns that each shares with the next: its last, the first of the next
   */
  public ComplexFront(int fronts, int size, int coupled) {
    this.fronts = fronts;
    this.size = size;
    this.coupled = coupled;
    real = new double[fronts * size * size];
    imaginary = new double[fronts * size * size];
  }

  /** Real parts (dimensionless) to be filled before {@link #factor}: front e begins at {@code e * size * size}. */
  public double[] real() {
    return real;
  }

  /** Imaginary parts to be filled, dimensionless. */
  public double[] imaginary() {
    return imaginary;
  }

  /** Factors the chain in place. O(fronts size^3), no allocation. */
  public void factor() {
    logMagnitude = 0.0;
    phase = 0.0;
    for (int e = 0; e < fronts; e++) {
      int start = e * size * size;
      eliminate(start, e + 1 < fronts ? size - coupled : size);
      if (e + 1 < fronts) {
        carry(start, start + size * size);
      }
    }
  }

  private void eliminate(int start, int count) {
    for (int k = 0; k < count; k++) {
      int row = start + k * size;
      double pr = real[row + k];
      double pi = imaginary[row + k];
      double square = pr * pr + pi * pi;
      logMagnitude += 0.5 * Math.log(square);
      phase += Math.atan2(pi, pr);
      for (int i = k + 1; i < size; i++) {
        int target = start + i * size;
        double fr = (real[target + k] * pr + imaginary[target + k] * pi) / square;
        double fi = (imaginary[target + k] * pr - real[target + k] * pi) / square;
        real[target + k] = fr;
        imaginary[target + k] = fi;
        for (int j = k + 1; j < size; j++) {
          double ur = real[row + j];
          double ui = imaginary[row + j];
          real[target + j] -= fr * ur - fi * ui;
          imaginary[target + j] -= fr * ui + fi * ur;
        }
      }
    }
  }

  /** Adds the Schur complement of a front to the first unknowns of the next. */
  private void carry(int from, int to) {
    int first = size - coupled;
    for (int i = 0; i < coupled; i++) {
      for (int j = 0; j < coupled; j++) {
        real[to + i * size + j] += real[from + (first + i) * size + first + j];
        imaginary[to + i * size + j] += imaginary[from + (first + i) * size + first + j];
      }
    }
  }

  /** Natural logarithm of the magnitude of the determinant, dimensionless. */
  public double logMagnitude() {
    return logMagnitude;
  }

  /** Argument of the determinant: the sum of those of its pivots, rad, not reduced. */
  public double phase() {
    return phase;
  }

  /**
   * After {@link #factor}: solves for one right-hand side. The unknowns of the chain in order, shared ones once: front e
   * begins at {@code e (size - coupled)}. O(fronts size^2), no allocation.
   *
   * @param xr right-hand side, dimensionless, overwritten by the solution, shape [fronts (size - coupled) + coupled]
   * @param xi imaginary parts, dimensionless
   */
  public void solve(double[] xr, double[] xi) {
    int step = size - coupled;
    for (int e = 0; e < fronts; e++) {
      int count = e + 1 < fronts ? step : size;
      for (int k = 0; k < count; k++) {
        reduce(xr, xi, e * size * size, e * step, k);
      }
    }
    for (int e = fronts - 1; e >= 0; e--) {
      int count = e + 1 < fronts ? step : size;
      for (int k = count - 1; k >= 0; k--) {
        substitute(xr, xi, e * size * size + k * size, e * step, k);
      }
    }
  }

  private void reduce(double[] xr, double[] xi, int start, int first, int k) {
    double r = xr[first + k];
    double i = xi[first + k];
    for (int below = k + 1; below < size; below++) {
      double fr = real[start + below * size + k];
      double fi = imaginary[start + below * size + k];
      xr[first + below] -= fr * r - fi * i;
      xi[first + below] -= fr * i + fi * r;
    }
  }

  private void substitute(double[] xr, double[] xi, int row, int first, int k) {
    double r = xr[first + k];
    double i = xi[first + k];
    for (int j = k + 1; j < size; j++) {
      r -= real[row + j] * xr[first + j] - imaginary[row + j] * xi[first + j];
      i -= real[row + j] * xi[first + j] + imaginary[row + j] * xr[first + j];
    }
    double pr = real[row + k];
    double pi = imaginary[row + k];
    double square = pr * pr + pi * pi;
    xr[first + k] = (r * pr + i * pi) / square;
    xi[first + k] = (i * pr - r * pi) / square;
  }
}
