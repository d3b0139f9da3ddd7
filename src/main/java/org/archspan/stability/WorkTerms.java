package org.archspan.stability;

/**
 * What drives a mode and what resists it: the terms of the energy principle, each divided by the inertia, so that they add
 * up to the square of the growth rate. Positive terms drive. All in s^-2.
 *
 * @param gasCompression       gas that is compressed, s^-2: resists
 * @param cosmicRayCompression cosmic rays that are compressed, s^-2: resists
 * @param fieldCompression     field that is compressed across its direction, s^-2: resists
 * @param fieldTension         field that is bent, s^-2: resists
 * @param weight               gas that is compressed where it sinks and expands where it rises, s^-2: drives
 * @param stratification       gas that is lifted through the falling density, s^-2: resists
 * @param topSurface           work against a free surface at the top, 0 without one, s^-2: resists
 * @param selfGravity          the gas's own perturbed gravity, 0 where it is left out, s^-2: drives
 */
public record WorkTerms(double gasCompression, double cosmicRayCompression, double fieldCompression,
    double fieldTension, double weight, double stratification, double topSurface,
    double selfGravity) {
  /** The sum, s^-2: the square of the growth rate. */
  public double sum() {
    return gasCompression + cosmicRayCompression + fieldCompression + fieldTension + weight + stratification
        + topSurface + selfGravity;
  }
}
