package org.archspan.spacing;

/**
 * Growth rate over the plane of wavenumbers.
 *
 * @param along      along the field, cm^-1, ascending, shape [n]
 * @param across     across the field, cm^-1, ascending, shape [m]
 * @param growthRate of the fastest mode of either parity, s^-1, 0 where stable, shape [n][m]
 * @param limit      for infinitely short waves across the field, s^-1, shape [n]
 */
public record PlaneResult(double[] along, double[] across, double[][] growthRate, double[] limit) {
}
