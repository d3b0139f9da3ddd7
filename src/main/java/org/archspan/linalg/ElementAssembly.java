package org.archspan.linalg;

/** Builds the packed matrix of one spectral element from the coefficients of its quadratic form. */
public final class ElementAssembly {
  private ElementAssembly() {
  }

  /**
   * Writes the packed matrix of {@code Sum_q a_q u'_q^2 + 2 b_q u_q u'_q + c_q u_q^2}, slopes taken on the reference
   * element. O(n^3) time with unit-stride inner loops, no allocation.
   *
   * @param a             weighted coefficients, read at {@code node .. node + n - 1}
   * @param b             as a
   * @param c             as a
   * @param node          first node of the element
   * @param n             number of nodes
   * @param slopeProducts products of slopes over packed pairs for each node, shape [n][pairs]
   * @param pairFirst     first node of each packed pair
   * @param pairSecond    second node of each packed pair
   * @param slope         D_ij of each pair
   * @param slopeReversed D_ji of each pair
   * @param packed        receives the matrix
   * @param offset        where it starts
   */
  public static void assemble(double[] a, double[] b, double[] c, int node, int n, double[] slopeProducts,
      int[] pairFirst, int[] pairSecond, double[] slope, double[] slopeReversed, double[] packed, int offset) {
    int pairs = pairFirst.length;
    for (int pair = 0; pair < pairs; pair++) {
      packed[offset + pair] = b[node + pairFirst[pair]] * slope[pair]
          + b[node + pairSecond[pair]] * slopeReversed[pair];
    }
    int diagonal = offset;
    for (int i = 0; i < n; i++) {
      packed[diagonal] += c[node + pairFirst[diagonal - offset]];
      diagonal += n - i;
    }
    int q = 0;
    for (; q + 2 < n; q += 3) {
      addThree(packed, offset, pairs, slopeProducts, q * pairs, a[node + q], a[node + q + 1], a[node + q + 2]);
    }
    for (; q < n; q++) {
      addOne(packed, offset, pairs, slopeProducts, q * pairs, a[node + q]);
    }
  }

  /** Three nodes in one pass over the matrix: a third of the loads and stores. */
  private static void addThree(double[] packed, int offset, int pairs, double[] products, int start, double first,
      double second, double third) {
    int next = start + pairs;
    int last = next + pairs;
    for (int pair = 0; pair < pairs; pair++) {
      packed[offset + pair] += first * products[start + pair] + second * products[next + pair]
          + third * products[last + pair];
    }
  }

  private static void addOne(double[] packed, int offset, int pairs, double[] products, int start, double weight) {
    for (int pair = 0; pair < pairs; pair++) {
      packed[offset + pair] += weight * products[start + pair];
    }
  }
}
