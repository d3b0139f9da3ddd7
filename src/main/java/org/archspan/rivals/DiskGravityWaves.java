package org.archspan.rivals;

import java.util.List;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.archspan.units.Constants;

/**
 * Axisymmetric waves in the plane of a rotating disk of one or several fluids that feel each other's gravity. With
 * {@code T_i = 1/(1 + k h_i)} for thickness, the growth rate s at wavenumber k is the root of
 *
 * <pre>  sum_i 2 pi G Sigma_i k T_i / (kappa^2 + c_i^2 k^2 + s^2) = 1.</pre>
 *
 * <p>One thin fluid: {@code -s^2 = kappa^2 - 2 pi G Sigma k + c^2 k^2}. Two: the relation of Jog and Solomon. The
 * left-hand side falls with s^2, so the fastest root is found without doubt. Stars count as a fluid.
 *
 * <p>Sources: Toomre (1964), ApJ 139, 1217; Goldreich and Lynden-Bell (1965), MNRAS 130, 97; Jog and Solomon (1984),
 * ApJ 276, 114; Rafikov (2001), MNRAS 323, 445.
 */
public final class DiskGravityWaves {
  private static final int SCAN = 600;

  private final List<PlaneFluid> fluids;
  private final double kappa;

  /**
   * Waves of these fluids.
   *
   * @param fluids at least one
   * @param kappa  epicyclic frequency, s^-1, not negative
   */
  public DiskGravityWaves(List<PlaneFluid> fluids, double kappa) {
    if (fluids.isEmpty() || !(kappa >= 0.0)) {
      throw new IllegalArgumentException("a disk needs a fluid and an epicyclic frequency of 0 or more, found "
          + fluids.size() + " fluids and " + kappa);
    }
    this.fluids = List.copyOf(fluids);
    this.kappa = kappa;
  }

  private static double pull(PlaneFluid fluid, double k) {
    return 2.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * fluid.surfaceDensity() * k * fluid.thicknessFactor(k);
  }

  private double stiffness(PlaneFluid fluid, double k) {
    return kappa * kappa + fluid.speed() * fluid.speed() * k * k;
  }

  /** Gravity over stiffness of a wave that neither grows nor oscillates, dimensionless; above 1 it grows. */
  private double pullOverStiffness(double k) {
    return fluids.stream().mapToDouble(fluid -> pull(fluid, k) / stiffness(fluid, k)).sum();
  }

  /**
   * Square of the growth rate, s^-2; negative for a wave that oscillates. O(fluids), some tens of iterations.
   *
   * @param wavenumber k, cm^-1, positive
   */
  public double growthRateSquared(double wavenumber) {
    double softest = fluids.stream().mapToDouble(fluid -> stiffness(fluid, wavenumber)).min().orElseThrow();
    double gravity = fluids.stream().mapToDouble(fluid -> pull(fluid, wavenumber)).sum();
    if (fluids.size() == 1) {
      return gravity - softest;
    }
    // x = 1 + s^2 over the softest stiffness lies between what the softest fluid pulls alone and what all would if as soft
    double alone = fluids.stream().filter(fluid -> stiffness(fluid, wavenumber) == softest)
        .mapToDouble(fluid -> pull(fluid, wavenumber)).max().orElseThrow();
    double root = new BrentSolver(1e-15, 1e-300).solve(500, x -> fluids.stream().mapToDouble(fluid ->
        pull(fluid, wavenumber) / (stiffness(fluid, wavenumber) - softest + x * softest)).sum() - 1.0,
        0.999 * alone / softest, 1.001 * gravity / softest);
    return (root - 1.0) * softest;
  }

  /**
   * Stability parameter of all fluids together, dimensionless: the disk is stable where it is 1 or more. For one thin fluid
   * Toomre's {@code Q = kappa c/(pi G Sigma)}.
   */
  public double stabilityParameter() {
    return 1.0 / pullOverStiffness(greatest(this::pullOverStiffness));
  }

  /** Wavenumber of the fastest wave, cm^-1; of the one nearest to growing where none does. */
  public double fastestWavenumber() {
    return greatest(this::growthRateSquared);
  }

  /** Longest wave that grows, cm; NaN where none does. */
  public double longestUnstable() {
    return edge(lowest());
  }

  /** Shortest wave that grows, cm; NaN where none does. */
  public double shortestUnstable() {
    return edge(highest());
  }

  /** The wavelength between the most unstable wave and a stable one at which growth ends, cm. */
  private double edge(double stable) {
    double peak = greatest(this::pullOverStiffness);
    if (!(pullOverStiffness(peak) > 1.0)) {
      return Double.NaN;
    }
    if (pullOverStiffness(stable) >= 1.0) {
      return stable < peak ? Double.POSITIVE_INFINITY : 2.0 * Math.PI / stable;
    }
    double logarithm = new BrentSolver(1e-14, 1e-14).solve(500, x -> pullOverStiffness(Math.exp(x)) - 1.0,
        Math.log(Math.min(stable, peak)), Math.log(Math.max(stable, peak)));
    return 2.0 * Math.PI / Math.exp(logarithm);
  }

  /** No wave shorter than this wavenumber (cm^-1) can grow: even thin fluids without rotation would hold it. */
  private double highest() {
    return 1.001 * fluids.stream().mapToDouble(fluid -> 2.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT
        * fluid.surfaceDensity() / (fluid.speed() * fluid.speed())).sum();
  }

  /** No wave longer than this wavenumber (cm^-1) can grow: rotation alone would hold it. Without rotation: very long. */
  private double lowest() {
    double column = fluids.stream().mapToDouble(PlaneFluid::surfaceDensity).sum();
    double held = 0.999 * kappa * kappa / (2.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * column);
    double shortest = highest();
    return held > 0.0 ? Math.min(held, 1e-3 * shortest) : 1e-8 * shortest;
  }

  /** Where a function of the wavenumber is greatest: scanned by equal factors, then refined. */
  private double greatest(java.util.function.DoubleUnaryOperator function) {
    double low = Math.log(lowest());
    double high = Math.log(Math.max(highest(), 1e3 * lowest()));
    double step = (high - low) / SCAN;
    int best = 0;
    for (int i = 1; i <= SCAN; i++) {
      best = function.applyAsDouble(Math.exp(low + i * step)) > function.applyAsDouble(Math.exp(low + best * step))
          ? i : best;
    }
    double refined = new BrentOptimizer(1e-10, 1e-12).optimize(new MaxEval(500), GoalType.MAXIMIZE,
        new UnivariateObjectiveFunction(x -> function.applyAsDouble(Math.exp(x))),
        new SearchInterval(low + Math.max(0, best - 1) * step, low + Math.min(SCAN, best + 1) * step)).getPoint();
    return Math.exp(refined);
  }
}
