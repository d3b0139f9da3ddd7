package org.archspan.observe;

import java.util.OptionalDouble;

/**
 * What to search, and how hard.
 *
 * @param shortest wavelength searched, cm; without, 0.6 of the mean separation
 * @param longest  wavelength searched, cm; without, half the length of the arm
 * @param trials   random placings, at least 100
 * @param seed     of all random numbers
 * @param threads  at least 1; the results do not depend on it
 */
public record ObserveOptions(OptionalDouble shortest, OptionalDouble longest, int trials, long seed, int threads) {
}
