package org.archspan.observe;

import java.util.List;
import java.util.Optional;

/**
 * What a table of complexes says about the spacing along their arm.
 *
 * @param positions in the plane of the disk
 * @param arm       the fitted arm
 * @param rival     the next best arm of another pitch angle, if there is one
 * @param chain     its complexes in order
 * @param separation median distance of neighbours along the arm
 * @param nearest   median distance to the nearest neighbour
 * @param peak      the periodogram's highest peak
 * @param chance    what random placing along the same arm would give
 */
public record ObservedArm(List<PlanePosition> positions, FittedArm arm, Optional<FittedArm> rival, ArmChain chain,
    MeasuredLength separation, MeasuredLength nearest, PeriodogramPeak peak, RandomPlacing chance) {
  /** By how much the arm's log-likelihood exceeds that of the next best one, dimensionless; infinite without one. */
  public double lead() {
    return rival.map(other -> arm.logLikelihood() - other.logLikelihood()).orElse(Double.POSITIVE_INFINITY);
  }
}
