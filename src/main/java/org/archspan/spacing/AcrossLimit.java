package org.archspan.spacing;

/**
 * The limit of infinitely short waves across the field (Parker 1967): the greatest growth over heights and wavelengths,
 * which no ideal, non-rotating mode exceeds.
 *
 * @param growthRate s^-1; 0 when stable
 * @param wavenumber along the field, cm^-1, at which it is reached; 0 when growth only rises towards infinite wavelength
 * @param height     where, cm
 */
public record AcrossLimit(double growthRate, double wavenumber, double height) {
}
