package org.archspan.stability;

/**
 * The fastest mode of one branch, CGS.
 *
 * @param order           0 for the fastest mode at each wavelength
 * @param wavenumber      along the field, cm^-1; 0 where growth rises towards infinite wavelength
 * @param growthRate      s^-1
 * @param growthError     estimated relative error of the growth rate, dimensionless
 * @param wavelengthError estimated relative error of the wavelength, dimensionless; NaN where the branch ends in
 *                        the continuum
 * @param unstableModes   number of modes of this parity that grow at this wavelength; -1 for infinitely many, or too many to count
 * @param mode            its shape, centroid and column contrast
 * @param bound           growth rate that the branch exceeds at no wavelength of the range, s^-1
 * @param intervals       wavenumber intervals that this proof took
 */
public record Peak(int order, double wavenumber, double growthRate, double growthError, double wavelengthError,
    int unstableModes, EigenMode mode, double bound, int intervals) {
}
