package org.archspan.spacing;

/**
 * The proof that no faster mode was missed.
 *
 * @param bound            growth rate that nothing exceeds, s^-1, at any wavelength of the range
 * @param shortest         short end of the wavelength range for which this holds, cm; 0 when it covers all shorter waves
 * @param longest          long end, cm; infinite when the proof covers all longer waves
 * @param intervals        number of wavelength intervals whose count of modes above the bound came out zero
 * @param factorisations   number of matrix factorisations spent on the whole search
 */
public record Certificate(double bound, double shortest, double longest, int intervals, long factorisations) {
}
