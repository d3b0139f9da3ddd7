package org.archspan.observe;

import org.apache.commons.math3.stat.interval.ClopperPearsonInterval;
import org.apache.commons.math3.stat.interval.ConfidenceInterval;

/**
 * How often chance does as well as the observation.
 *
 * @param exceeding trials that reach the observed value
 * @param trials    number of trials
 */
public record ChanceProbability(int exceeding, int trials) {
  private static final double ONE_SIGMA = 0.6827;

  /** The p-value, {@code (exceeding + 1)/(trials + 1)}, the observation counted as one of the trials, dimensionless. */
  public double value() {
    return (exceeding + 1.0) / (trials + 1.0);
  }

  /** Lower end of the exact binomial interval of 68 per cent (Clopper and Pearson 1934), dimensionless. */
  public double lower() {
    return exceeding == 0 ? 0.0 : exceeding == trials ? 1.0 - ofNone() : interval().getLowerBound();
  }

  /** Its upper end, dimensionless. */
  public double upper() {
    return exceeding == trials ? 1.0 : exceeding == 0 ? ofNone() : interval().getUpperBound();
  }

  /** Upper end where no trial counts, in closed form, for the library refuses that case. */
  private double ofNone() {
    return -Math.expm1(Math.log(0.5 * (1.0 - ONE_SIGMA)) / trials);
  }

  private ConfidenceInterval interval() {
    return new ClopperPearsonInterval().createInterval(trials, exceeding, ONE_SIGMA);
  }
}
