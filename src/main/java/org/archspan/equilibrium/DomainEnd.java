package org.archspan.equilibrium;

import java.util.Locale;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.Domain;
import org.archspan.disk.RefusedModelException;

/**
 * Where the domain ends and with what condition.
 *
 * @param top      cm
 * @param boundary open, lid or free
 */
record DomainEnd(double top, TopBoundary boundary) {
  /** A lid that is not asked to be elsewhere stands where the density has fallen by this many e-foldings. */
  private static final double LID_EFOLDINGS = 10.0;
  private static final double HIGHEST_EFOLDINGS = 60.0;
  private static final double LOWEST_EFOLDINGS = 3.0;
  /** Greatest change of the atmosphere over one local scale height above an open top. */
  private static final double NEARLY_UNIFORM = 0.05;

  static DomainEnd of(Domain domain, Stratification state, double bottom, double scaleHeight, double tolerance) {
    if (domain.top().isPresent()) {
      double top = checkedTop(domain.top().get().resolve(scaleHeight), state, bottom);
      return new DomainEnd(top, boundaryAt(domain, state, top));
    }
    double open = uniformHeight(state, bottom, 0.1 * tolerance);
    if (domain.topBoundary().orElse(TopBoundary.OPEN) == TopBoundary.OPEN) {
      if (Double.isFinite(open)) {
        return new DomainEnd(open, TopBoundary.OPEN);
      }
      if (domain.topBoundary().isPresent()) {
        throw new RefusedModelException("an open top needs a uniform atmosphere above it, and this one never becomes"
            + " uniform (gravity or field keep changing with height); use domain.top-boundary = \"lid\"");
      }
    }
    TopBoundary boundary = domain.topBoundary().orElse(TopBoundary.LID);
    double top = bottom + HeightPanels.heightOfFall(state::logDensity, bottom, LID_EFOLDINGS, state.greatestHeight());
    return new DomainEnd(top, boundary);
  }

  private static double checkedTop(double top, Stratification state, double bottom) {
    if (!(top > bottom)) {
      throw new RefusedModelException("domain.top (" + EquilibriumBuilder.words(top) + ") must lie above"
          + " domain.bottom (" + EquilibriumBuilder.words(bottom) + ")");
    }
    if (top > state.greatestHeight()) {
      throw new RefusedModelException("domain.top (" + EquilibriumBuilder.words(top) + ") lies above the last height"
          + " of a table (" + EquilibriumBuilder.words(state.greatestHeight()) + "); lower it or extend the table");
    }
    return top;
  }

  private static TopBoundary boundaryAt(Domain domain, Stratification state, double top) {
    double change = changeAbove(state, top);
    if (domain.topBoundary().isEmpty()) {
      return change <= NEARLY_UNIFORM ? TopBoundary.OPEN : TopBoundary.LID;
    }
    if (domain.topBoundary().get() == TopBoundary.OPEN && !(change <= NEARLY_UNIFORM)) {
      throw new RefusedModelException(String.format(Locale.ROOT, "an open top needs a uniform atmosphere above it: over"
          + " the scale height above %s this one changes by %.3g per cent, more than the %.0f per cent allowed; raise"
          + " domain.top or use domain.top-boundary = \"lid\"", EquilibriumBuilder.words(top), 100.0 * change,
          100.0 * NEARLY_UNIFORM));
    }
    return domain.topBoundary().get();
  }

  /** Lowest height above which the atmosphere is uniform to a relative tolerance, cm; infinite when there is none. */
  private static double uniformHeight(Stratification state, double bottom, double tolerance) {
    for (double fall = LOWEST_EFOLDINGS; fall <= HIGHEST_EFOLDINGS; fall += 1.0) {
      double z = bottom + HeightPanels.heightOfFall(state::logDensity, bottom, fall, state.greatestHeight());
      if (changeAbove(state, z) <= tolerance) {
        return z;
      }
    }
    return Double.POSITIVE_INFINITY;
  }

  /** Greatest relative change of gravity, gradient, gas and field over the local scale height above a level. */
  private static double changeAbove(Stratification state, double z) {
    GasState here = state.at(z);
    double next = z + here.densityScaleHeight();
    if (!(next <= state.greatestHeight())) {
      return Double.POSITIVE_INFINITY;
    }
    GasState above = state.at(next);
    double change = relative(here.gravity(), above.gravity());
    change = Math.max(change, relative(here.logDensityGradient(), above.logDensityGradient()));
    change = Math.max(change, relative(here.gasPerMass(), above.gasPerMass()));
    return Math.max(change, Math.abs(above.magneticPerMass() - here.magneticPerMass()) / here.gasPerMass());
  }

  private static double relative(double a, double b) {
    return Math.abs(a - b) / Math.max(Math.abs(a), Math.abs(b));
  }
}
