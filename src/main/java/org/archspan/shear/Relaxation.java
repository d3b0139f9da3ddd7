package org.archspan.shear;

/**
 * A pressure that answers compression at once and then relaxes: {@code Delta p = -modulus (D - w)}, {@code w' = rate (D - w)},
 * D the divergence of the displacement. At growth rate s that is the factor {@code s/(s + rate)} of a diffusing gas of
 * cosmic rays or of Newtonian cooling.
 *
 * @param modulus per mass at each node, in units of the column
 * @param rate    of the relaxation, in units of the column, positive
 */
record Relaxation(double[] modulus, double rate) {
}
