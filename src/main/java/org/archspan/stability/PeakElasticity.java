package org.archspan.stability;

/**
 * Logarithmic derivatives of a peak with respect to one input, dimensionless: per cent for each per cent.
 *
 * @param growthRate      d ln(s)/d ln(q), dimensionless
 * @param growthRateError estimated absolute error of it, dimensionless
 * @param wavelength      d ln(lambda)/d ln(q), dimensionless
 * @param wavelengthError estimated absolute error of it, dimensionless
 */
public record PeakElasticity(double growthRate, double growthRateError, double wavelength, double wavelengthError) {
}
