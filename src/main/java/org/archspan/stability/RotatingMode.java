package org.archspan.stability;

/**
 * A growing mode of a rotating disk, CGS.
 *
 * @param wavenumber     along the field, cm^-1
 * @param growthRate     Re s, s^-1, positive
 * @param frequency      Im s, s^-1, not negative; 0 for a mode that does not oscillate, otherwise its conjugate grows as well
 * @param growthError    estimated relative error of s, dimensionless
 */
public record RotatingMode(double wavenumber, double growthRate, double frequency, double growthError) {
}
