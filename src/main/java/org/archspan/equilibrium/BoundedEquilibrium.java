package org.archspan.equilibrium;

import java.util.Arrays;
import org.archspan.boundary.TopBoundary;

/** A stratification over a domain. Immutable. */
record BoundedEquilibrium(Stratification stratification, double bottom, double top, boolean aboutMidplane,
    TopBoundary topBoundary, double surfaceDensity) implements Equilibrium {

  @Override
  public GasState at(double height) {
    return stratification.at(height);
  }

  @Override
  public double scaleHeight() {
    double sides = aboutMidplane ? 2.0 : 1.0;
    return surfaceDensity / (sides * Math.exp(stratification.logDensity(bottom)));
  }

  @Override
  public double dispersion() {
    return Math.sqrt(stratification.at(bottom).gasPerMass());
  }

  @Override
  public double[] landmarks() {
    return stratification.landmarks();
  }

  @Override
  public double[] kinks() {
    return Arrays.stream(stratification.kinks()).filter(z -> z > bottom && z < top).toArray();
  }

  @Override
  public Equilibrium withTop(double newTop) {
    return new BoundedEquilibrium(stratification, bottom, Math.min(newTop, stratification.greatestHeight()),
        aboutMidplane, topBoundary, surfaceDensity);
  }
}
