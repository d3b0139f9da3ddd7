package org.archspan.shear;

/** Symmetric rows of midpoint steps that raise the order and keep what the midpoint rule keeps. */
enum Composition {
  /** The midpoint rule itself, order 2: the one that pressures which relax allow, for it never steps backwards in time. */
  MIDPOINT(2, 1.0),
  /** Nine steps of order 6: Kahan and Li (1997), Math. Comp. 66, 1089. */
  SIXTH_ORDER(6, 0.39216144400731413927925056, 0.33259913678935943859974864, -0.70624617255763935980996482,
      0.08221359629355080023149045, 0.79854399093482996339895035);

  private final int order;
  private final double[] shares;

  Composition(int order, double... half) {
    this.order = order;
    shares = new double[2 * half.length - 1];
    for (int i = 0; i < half.length; i++) {
      shares[i] = half[i];
      shares[shares.length - 1 - i] = half[i];
    }
  }

  /** Order of the global error in the step. */
  int order() {
    return order;
  }

  /** Lengths of its steps, dimensionless, in units of the whole. */
  double[] shares() {
    return shares;
  }
}
