package org.archspan.stability;

import java.util.Optional;

/**
 * Climbs the growth curve of one branch to a local maximum by its exact slope. Works in {@link Scales}.
 */
final class PeakSearch {
  private static final int MOST_STEPS = 60;
  private static final double SMALLEST_STEP = 1e-9;
  private static final double FARTHEST = 1e-4;

  private final ModeSolver solver;
  private final int order;
  private final double lowest;
  private final double highest;

  /**
   * A search over wavenumbers between two values.
   *
   * @param lowest  0 or more
   * @param highest finite
   */
  PeakSearch(ModeSolver solver, int order, double lowest, double highest) {
    this.solver = solver;
    this.order = order;
    this.lowest = lowest;
    this.highest = highest;
  }

  /**
   * The local maximum that a start leads to, never slower than the start: a step over a hill into the slope of another is
   * taken back. Its wavenumber is an end of the range where growth rises towards that end;
   * 0 when it rises towards infinite wavelength.
   */
  GrowthRoot climb(GrowthRoot start) {
    GrowthRoot here = start;
    boolean rising = here.slope() > 0.0;
    for (int step = 0; step < MOST_STEPS; step++) {
      double next = rising ? Math.min(1.5 * here.wavenumber(), 0.5 * (here.wavenumber() + highest))
          : Math.max(here.wavenumber() / 1.6, 0.5 * (here.wavenumber() + lowest));
      if (Math.abs(next - here.wavenumber()) < 1e-3 * FARTHEST * here.wavenumber() || next < FARTHEST * highest) {
        return atEnd(here, rising);
      }
      Optional<GrowthRoot> there = visible(here, next, rising);
      if (there.isEmpty()) {
        return here;
      }
      if (there.get().slope() > 0.0 != rising) {
        return rising ? between(here, there.get()) : between(there.get(), here);
      }
      here = there.get();
    }
    return here;
  }

  /** The branch at a wavenumber, or as near to it as the branch reaches, on the hill that rises from here. */
  private Optional<GrowthRoot> visible(GrowthRoot here, double wavenumber, boolean rising) {
    double target = wavenumber;
    for (int step = 0; step < 20; step++) {
      double change = target - here.wavenumber();
      Optional<GrowthRoot> there = solver.growth(target, order, here.growth() + change * here.slope());
      if (there.isPresent() && !(slower(there.get(), here) && there.get().slope() > 0.0 == rising)) {
        return there;
      }
      target = here.wavenumber() + 0.5 * change;
    }
    return Optional.empty();
  }

  /** Whether one growth rate lies below another by more than the errors of both. */
  private static boolean slower(GrowthRoot one, GrowthRoot other) {
    return one.growth() < other.growth() * (1.0 - SMALLEST_STEP - one.error() - other.error());
  }

  private GrowthRoot atEnd(GrowthRoot here, boolean rising) {
    double end = rising ? highest : lowest;
    return solver.growth(end, order, here.growth()).filter(root -> root.growth() >= here.growth()).orElse(here);
  }

  /** The root of the slope between a rising and a falling point; of several, one that is no slower than the faster end. */
  private GrowthRoot between(GrowthRoot rising, GrowthRoot falling) {
    GrowthRoot left = rising;
    GrowthRoot right = falling;
    for (int step = 0; step < MOST_STEPS; step++) {
      SlopeCubic cubic = new SlopeCubic(left, right);
      double margin = 0.5 * SMALLEST_STEP * right.wavenumber();
      double target = cubic.peak();
      if (step % 8 == 7 || left.slope() < 0.0 || right.slope() > 0.0) {
        target = 0.5 * (left.wavenumber() + right.wavenumber());
      }
      target = Math.min(Math.max(target, left.wavenumber() + margin), right.wavenumber() - margin);
      Optional<GrowthRoot> there = solver.growth(target, order, cubic.value(target));
      if (there.isEmpty()) {
        return cubic.flatterEnd();
      }
      GrowthRoot middle = there.get();
      double nearest = Math.min(target - left.wavenumber(), right.wavenumber() - target);
      boolean settled = Math.abs(middle.slope()) <= Math.abs(cubic.curvature(target)) * SMALLEST_STEP * target;
      if (settled || nearest <= 2.0 * margin || middle.slope() == 0.0) {
        return middle;
      }
      if (middle.slope() > 0.0 ? !slower(middle, left) : slower(middle, right)) {
        left = middle;
      } else {
        right = middle;
      }
    }
    return new SlopeCubic(left, right).flatterEnd();
  }
}
