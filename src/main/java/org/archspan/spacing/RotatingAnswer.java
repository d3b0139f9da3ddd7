package org.archspan.spacing;

/**
 * What belongs to an answer with rotation.
 *
 * @param angularSpeed       Omega, s^-1
 * @param checkedWavelengths number of wavelengths at which the argument principle finds nothing faster than the answer
 * @param slowestCounted     at the answer's wavelength slower growth is not counted, s^-1
 * @param contourPoints      determinants on the contour there
 * @param without            the answer without rotation
 */
public record RotatingAnswer(double angularSpeed, int checkedWavelengths, double slowestCounted, int contourPoints,
    SpacingResult without) {
}
