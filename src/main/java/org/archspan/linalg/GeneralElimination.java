package org.archspan.linalg;

/**
 * Partial LU of small matrices without symmetry, row-major, one after the other in a flat array. No pivoting: meant for
 * matrices whose symmetric part is positive definite, for which every pivot is positive (Golub and Van Loan 1979, Linear
 * Algebra Appl. 28, 85).
 */
public final class GeneralElimination {
  private GeneralElimination() {
  }

  /**
   * Eliminates the first unknowns in place; what remains in the last rows and columns is the Schur complement, and the
   * multipliers stay below the pivots. O(n^2 eliminated) time, no allocation.
   *
   * @param matrix     matrices, dimensionless or in the unit of the caller
   * @param offset     where this one starts
   * @param n          order
   * @param eliminated number of leading unknowns to eliminate, at most n
   * @return whether every pivot was positive
   */
  public static boolean eliminate(double[] matrix, int offset, int n, int eliminated) {
    boolean positive = true;
    for (int k = 0; k < eliminated; k++) {
      int pivotRow = offset + k * n;
      double pivot = matrix[pivotRow + k];
      positive &= pivot > 0.0;
      for (int i = k + 1; i < n; i++) {
        int row = offset + i * n;
        double factor = matrix[row + k] / pivot;
        matrix[row + k] = factor;
        for (int j = k + 1; j < n; j++) {
          matrix[row + j] -= factor * matrix[pivotRow + j];
        }
      }
    }
    return positive;
  }

  /** Carries a right-hand side through the elimination, in place at {@code start}. O(n eliminated), no allocation. */
  public static void reduce(double[] matrix, int offset, int n, int eliminated, double[] right, int start) {
    for (int k = 0; k < eliminated; k++) {
      double value = right[start + k];
      for (int i = k + 1; i < n; i++) {
        right[start + i] -= matrix[offset + i * n + k] * value;
      }
    }
  }

  /** Given the kept unknowns behind them, replaces the reduced right-hand side by the eliminated unknowns. */
  public static void extend(double[] matrix, int offset, int n, int eliminated, double[] right, int start) {
    for (int k = eliminated - 1; k >= 0; k--) {
      int row = offset + k * n;
      double sum = right[start + k];
      for (int j = k + 1; j < n; j++) {
        sum -= matrix[row + j] * right[start + j];
      }
      right[start + k] = sum / matrix[row + k];
    }
  }
}
