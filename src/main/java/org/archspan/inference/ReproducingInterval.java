package org.archspan.inference;

/**
 * Values of an input that reproduce an observed spacing within its error, all others at their middles.
 *
 * @param low       lower end, in units of the input
 * @param high      upper end, in units of the input
 * @param openBelow whether values below the range that was searched may reproduce it too
 * @param openAbove whether values above that range may
 */
public record ReproducingInterval(double low, double high, boolean openBelow, boolean openAbove) {
}
