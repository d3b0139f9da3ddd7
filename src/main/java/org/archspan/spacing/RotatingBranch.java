package org.archspan.spacing;

import java.util.Optional;
import org.archspan.stability.RotatingMode;
import org.archspan.stability.RotatingSolver;

/** One branch of modes under rotation: followed from no rotation, and climbed to its fastest wavelength. */
final class RotatingBranch {
  private static final int ROTATION_STEPS = 4;
  private static final int MOST_STEPS = 60;
  private static final double FIRST_STEP = 0.08;
  private static final double LAST_STEP = 2e-5;
  private final RotatingSolver solver;
  private final WaveRange range;

  RotatingBranch(RotatingSolver solver, WaveRange range) {
    this.solver = solver;
    this.range = range;
  }

  /** The mode that a mode without rotation becomes; empty when rotation stabilises it. */
  static Optional<RotatingMode> spunUp(RotatingSolver solver, double angularSpeed, RotatingMode still) {
    Optional<RotatingMode> mode = Optional.of(still);
    for (int step = 1; step <= ROTATION_STEPS && mode.isPresent(); step++) {
      RotatingSolver partly = step == ROTATION_STEPS ? solver
          : solver.withAngularSpeed(angularSpeed * step / ROTATION_STEPS);
      RotatingMode from = mode.get();
      mode = partly.follow(from.wavenumber(), from);
    }
    return mode;
  }

  /**
   * Climbs to the local maximum of growth: steps in ln(k) as long as growth rises, then halved around the top, where a parabola
   * through three points gives it.
   */
  RotatingMode climb(RotatingMode start) {
    RotatingMode best = start;
    double step = FIRST_STEP;
    for (int i = 0; i < MOST_STEPS && step > LAST_STEP; i++) {
      RotatingMode shorter = beside(best, step);
      RotatingMode longer = beside(best, -step);
      if (rises(shorter, best)) {
        best = shorter;
      } else if (rises(longer, best)) {
        best = longer;
      } else if (shorter == null || longer == null) {
        step *= 0.5;
      } else {
        RotatingMode vertex = vertex(longer, best, shorter, step);
        best = rises(vertex, best) ? vertex : best;
        step *= 0.1;
      }
    }
    return best;
  }

  private static boolean rises(RotatingMode candidate, RotatingMode best) {
    return candidate != null && candidate.growthRate() > best.growthRate();
  }

  private RotatingMode beside(RotatingMode mode, double logStep) {
    double k = mode.wavenumber() * Math.exp(logStep);
    return k > range.lowest() && k < range.highest() ? solver.follow(k, mode).orElse(null) : null;
  }

  private RotatingMode vertex(RotatingMode longer, RotatingMode middle, RotatingMode shorter, double step) {
    double slope = 0.5 * (shorter.growthRate() - longer.growthRate());
    double curvature = shorter.growthRate() + longer.growthRate() - 2.0 * middle.growthRate();
    return curvature < 0.0 ? beside(middle, -slope / curvature * step) : null;
  }
}
