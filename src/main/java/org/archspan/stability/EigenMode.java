package org.archspan.stability;

import org.archspan.boundary.Parity;

/**
 * One mode on equidistant heights. The displacement is {@code (-i X, -i Y, Z) exp(i kx x + i ky y + s t)}, normalised so
 * that the midplane layer moves by one scale height: the root-mean-square displacement, weighted by the square of the
 * density, is one scale height.
 *
 * @param parity          symmetry about the midplane
 * @param order           mode order, 0 for the fastest
 * @param wavenumber      kx along the field, cm^-1
 * @param crossWavenumber ky across the field, cm^-1
 * @param growthRate      s, s^-1
 * @param height          heights z, cm, from bottom to top, shape [n]
 * @param along           X, cm, shape [n]
 * @param across          Y, cm, shape [n]
 * @param vertical        Z, cm, shape [n]
 * @param divergence      D = kx X + ky Y + Z', dimensionless, shape [n]
 * @param densityContrast rho_1/rho = -(Z dln(rho)/dz + D), dimensionless, amplitude of the cosine along x, shape [n]
 * @param kineticEnergy   rho (X^2 + Y^2 + Z^2) over its maximum, dimensionless, shape [n]
 * @param centroidHeight  height of the kinetic-energy centroid, cm
 * @param columnContrast  amplitude of delta Sigma / Sigma, dimensionless
 * @param work            what drives the mode and what resists it
 */
public record EigenMode(Parity parity, int order, double wavenumber, double crossWavenumber, double growthRate,
    double[] height, double[] along, double[] across, double[] vertical, double[] divergence,
    double[] densityContrast, double[] kineticEnergy, double centroidHeight, double columnContrast,
    WorkTerms work) {
}
