package org.archspan.gravity;

/**
 * Gravity that saturates in two steps,
 * {@code g = strength [1 - f exp(-z/near) - (1 - f) exp(-z/far)]}.
 *
 * <p>Source: Martos and Cox (1998), ApJ 509, 703, a fit to Bienayme, Robin and Creze (1987), A&A 180, 94.
 *
 * @param strength g far above, cm s^-2, positive
 * @param nearFraction f, dimensionless, between 0 and 1
 * @param nearHeight cm, positive
 * @param farHeight cm, positive
 */
public record SaturatingGravity(double strength, double nearFraction, double nearHeight, double farHeight) implements GravityLaw {
  /** Refuses inputs outside their range. */
  public SaturatingGravity {
    LawInput.requirePositive("strength", strength);
    LawInput.requireFraction("near-fraction", nearFraction);
    LawInput.requirePositive("near-height", nearHeight);
    LawInput.requirePositive("far-height", farHeight);
  }

  @Override
  public double acceleration(double height) {
    return -strength * (nearFraction * Math.expm1(-height / nearHeight)
        + (1.0 - nearFraction) * Math.expm1(-height / farHeight));
  }

  @Override
  public double potential(double height) {
    return strength * (nearFraction * nearHeight * part(height / nearHeight)
        + (1.0 - nearFraction) * farHeight * part(height / farHeight));
  }

  /** {@code x - 1 + exp(-x)}, by its series where the terms cancel. */
  private static double part(double x) {
    if (x > 0.5) {
      return x + Math.expm1(-x);
    }
    double term = 0.5 * x * x;
    double sum = 0.0;
    for (int n = 3; Math.abs(term) > 1e-18 * sum && n < 40; n++) {
      sum += term;
      term *= -x / n;
    }
    return sum;
  }

  @Override
  public double[] landmarks() {
    return new double[] {Math.min(nearHeight, farHeight), Math.max(nearHeight, farHeight)};
  }
}
