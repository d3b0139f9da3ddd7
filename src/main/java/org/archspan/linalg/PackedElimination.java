package org.archspan.linalg;

/**
 * Partial LDL^T of small symmetric matrices stored as packed upper rows: entries (0,0..n-1), (1,1..n-1), and so on.
 */
public final class PackedElimination {
  private PackedElimination() {
  }

  /**
   * Eliminates the first {@code eliminated} unknowns in place and counts their negative pivots. What remains in the last
   * rows is the Schur complement; each eliminated row keeps its pivot and its unscaled row. O(n^2 eliminated) time, no
   * allocation. By Haynsworth's inertia additivity (1968) the negative eigenvalues of the whole are the counted pivots
   * plus those of the Schur complement.
   *
   * @param packed     matrices, one after the other
   * @param offset     where this one starts
   * @param n          order of the matrix
   * @param eliminated number of leading unknowns to eliminate, less than n
   * @return number of negative pivots
   */
  public static int eliminate(double[] packed, int offset, int n, int eliminated) {
    int negative = 0;
    int row = offset;
    int k = 0;
    for (; k + 1 < eliminated; k += 2) {
      int length = n - k;
      int next = row + length;
      double firstInverse = 1.0 / packed[row];
      subtract(packed, next, row + 1, length - 1, packed[row + 1] * firstInverse);
      double secondInverse = 1.0 / packed[next];
      negative += (firstInverse < 0.0 ? 1 : 0) + (secondInverse < 0.0 ? 1 : 0);
      int target = next + length - 1;
      for (int i = 2; i < length; i++) {
        int width = length - i;
        subtractTwo(packed, target, row + i, next + i - 1, width, packed[row + i] * firstInverse,
            packed[next + i - 1] * secondInverse);
        target += width;
      }
      row = next + length - 1;
    }
    if (k < eliminated) {
      int length = n - k;
      double inverse = 1.0 / packed[row];
      negative += inverse < 0.0 ? 1 : 0;
      int target = row + length;
      for (int i = 1; i < length; i++) {
        subtract(packed, target, row + i, length - i, packed[row + i] * inverse);
        target += length - i;
      }
    }
    return negative;
  }

  private static void subtract(double[] packed, int target, int source, int width, double factor) {
    for (int j = 0; j < width; j++) {
      packed[target + j] -= factor * packed[source + j];
    }
  }

  /** Two pivots in one pass over the remaining rows: half of the loads and stores. */
  private static void subtractTwo(double[] packed, int target, int first, int second, int width, double firstFactor,
      double secondFactor) {
    for (int j = 0; j < width; j++) {
      packed[target + j] -= firstFactor * packed[first + j] + secondFactor * packed[second + j];
    }
  }

  /**
   * Given the values of the kept unknowns, fills in those of the eliminated ones so that their equations hold.
   * O(n eliminated), no allocation.
   *
   * @param packed     after {@link #eliminate}
   * @param offset     where the matrix starts
   * @param n          order of the matrix
   * @param eliminated number of eliminated unknowns
   * @param x          values in elimination order, shape [n]; the first {@code eliminated} are written
   */
  public static void extend(double[] packed, int offset, int n, int eliminated, double[] x) {
    int row = offset + eliminated * n - eliminated * (eliminated - 1) / 2;
    for (int k = eliminated - 1; k >= 0; k--) {
      int length = n - k;
      row -= length;
      double sum = 0.0;
      for (int i = 1; i < length; i++) {
        sum += packed[row + i] * x[k + i];
      }
      x[k] = -sum / packed[row];
    }
  }
}
