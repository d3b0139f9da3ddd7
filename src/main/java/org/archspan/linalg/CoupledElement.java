package org.archspan.linalg;

/**
 * Builds the packed matrix of one spectral element for two coupled unknowns u and v:
 * {@code Sum_q a u'^2 + 2 b u u' + c u^2 + 2 d v u' + 2 e v u + f v^2 + w v'^2}, slopes taken on the reference element.
 *
 * <p>Order of the unknowns: inner u, inner v, then u and v at the left end, u and v at the right end. Owns a work array: one
 * instance for one thread.
 */
public final class CoupledElement {
  private final int n;
  private final double[] derivative;
  private final int[] pairFirst;
  private final int[] pairSecond;
  private final double[] gram;
  private final int[] firstBlock;
  private final int[] secondBlock;
  private final int[] mixedBlock;
  private final double[] single;

  /**
   * For elements of one degree.
   *
   * @param n          number of nodes
   * @param derivative slopes at node q of the polynomial of node i, row-major [n][n]
   * @param slopeGram  integrals of products of slopes, row-major [n][n]
   * @param pairFirst  first node of each packed pair in elimination order: inner nodes, left end, right end
   * @param pairSecond second node of each
   */
  public CoupledElement(int n, double[] derivative, double[] slopeGram, int[] pairFirst, int[] pairSecond) {
    this.n = n;
    this.derivative = derivative;
    this.pairFirst = pairFirst;
    this.pairSecond = pairSecond;
    int pairs = pairFirst.length;
    gram = new double[pairs];
    firstBlock = new int[pairs];
    secondBlock = new int[pairs];
    mixedBlock = new int[n * n];
    single = new double[pairs];
    for (int pair = 0; pair < pairs; pair++) {
      int i = pairFirst[pair];
      int j = pairSecond[pair];
      firstBlock[pair] = packedIndex(position(i, 0), position(j, 0));
      secondBlock[pair] = packedIndex(position(i, 1), position(j, 1));
      gram[pair] = slopeGram[i * n + j];
    }
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        mixedBlock[j * n + i] = packedIndex(position(i, 0), position(j, 1));
      }
    }
  }

  /** Place of an unknown (0: u, 1: v) of a node in the order of elimination. */
  private int position(int node, int unknown) {
    int inner = n - 2;
    if (node == 0) {
      return 2 * inner + unknown;
    }
    return node == n - 1 ? 2 * inner + 2 + unknown : unknown * inner + node - 1;
  }

  private int packedIndex(int i, int j) {
    int row = Math.min(i, j);
    int column = Math.max(i, j);
    return row * 2 * n - row * (row - 1) / 2 + column - row;
  }

  /** Length of the packed matrix. */
  public int packedLength() {
    return n * (2 * n + 1);
  }

  /**
   * Writes the matrix. O(n^3) time with unit-stride inner loops, no allocation. Coefficients are weighted and read from
   * {@code node} on.
   *
   * @param secondSlope   the coefficient w of v'^2, constant in the element, before the quadrature weight
   * @param slopeProducts products of slopes over packed pairs for each node, shape [n][pairs]
   * @param slope         D_ij of each pair
   * @param slopeReversed D_ji of each pair
   * @param packed        receives the matrix
   * @param offset        where it starts
   */
  public void assemble(double[] a, double[] b, double[] c, double[] d, double[] e, double[] f, double secondSlope,
      int node, double[] slopeProducts, double[] slope, double[] slopeReversed, double[] packed, int offset) {
    ElementAssembly.assemble(a, b, c, node, n, slopeProducts, pairFirst, pairSecond, slope, slopeReversed, single, 0);
    for (int pair = 0; pair < single.length; pair++) {
      packed[offset + firstBlock[pair]] = single[pair];
      packed[offset + secondBlock[pair]] = secondSlope * gram[pair];
    }
    for (int j = 0; j < n; j++) {
      double factor = d[node + j];
      int row = j * n;
      for (int i = 0; i < n; i++) {
        packed[offset + mixedBlock[row + i]] = factor * derivative[row + i];
      }
      packed[offset + mixedBlock[row + j]] += e[node + j];
    }
    int diagonal = 0;
    for (int i = 0; i < n; i++) {
      packed[offset + secondBlock[diagonal]] += f[node + pairFirst[diagonal]];
      diagonal += n - i;
    }
  }
}
