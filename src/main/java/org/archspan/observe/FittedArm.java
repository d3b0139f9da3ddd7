package org.archspan.observe;

/**
 * A logarithmic spiral through most of the complexes.
 *
 * @param spiral           the arm
 * @param pitchError       standard error of the pitch angle, rad
 * @param width            scatter of its complexes across it over the radius, beyond their errors, dimensionless
 * @param strays           estimated fraction of complexes that belong to no arm, dimensionless
 * @param membership       probability that each complex belongs to the arm, dimensionless
 * @param logLikelihood    of the azimuths at the given radii, above that of azimuths at random, dimensionless
 */
public record FittedArm(LogarithmicSpiral spiral, double pitchError, double width, double strays, double[] membership,
    double logLikelihood) {
}
