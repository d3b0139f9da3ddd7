package org.archspan.stability;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;

/**
 * The limit of infinitely short waves across the field (Parker 1967, ApJ 149, 535): the perturbed total pressure vanishes,
 * no vertical derivative survives, and each height grows by itself. With a = Gamma P/rho and v the square of the Alfven
 * speed, the growth rate at a height solves
 * {@code (s^2 + kx^2 v)(1 - g^2/[(a + v) s^2 + a v kx^2]) = g dln(rho)/dz}.
 * Its maximum over height bounds every ideal, non-rotating mode with that kx from above.
 *
 * <p>Wavenumbers in cm^-1, growth rates in s^-1. Immutable.
 */
public final class ShortCrossWaves {
  private static final int HEIGHTS = 257;
  private static final int WAVENUMBERS = 24;
  private static final int REFINEMENTS = 6;

  private final Equilibrium equilibrium;
  private final GasClosure gas;
  private final CosmicRayClosure cosmicRays;

  /** The limit for an equilibrium and closures. */
  public ShortCrossWaves(Equilibrium equilibrium, GasClosure gas, CosmicRayClosure cosmicRays) {
    this.equilibrium = equilibrium;
    this.gas = gas;
    this.cosmicRays = cosmicRays;
  }

  /**
   * Where and how fast.
   *
   * @param growthRate s^-1, 0 when stable
   * @param wavenumber kx, cm^-1
   * @param height     cm
   */
  public record Fastest(double growthRate, double wavenumber, double height) {
  }

  /** Growth rate at a height (cm) and wavenumber (cm^-1), s^-1; 0 where stable. O(1). */
  public double growth(double height, double wavenumber) {
    return new LocalBalance(equilibrium.at(height)).growth(wavenumber);
  }

  /** The greatest growth rate over heights at one wavenumber. O(heights). */
  public Fastest fastestAt(double wavenumber) {
    double best = 0.0;
    int at = 0;
    for (int i = 0; i < HEIGHTS; i++) {
      double s = growth(height(i), wavenumber);
      if (s > best) {
        best = s;
        at = i;
      }
    }
    return best == 0.0 ? new Fastest(0.0, wavenumber, equilibrium.bottom()) : refinedHeight(at, wavenumber);
  }

  private double height(int i) {
    double share = (double) i / (HEIGHTS - 1);
    return equilibrium.bottom() + (equilibrium.top() - equilibrium.bottom()) * share;
  }

  private Fastest refinedHeight(int at, double wavenumber) {
    double low = height(Math.max(0, at - 1));
    double high = height(Math.min(HEIGHTS - 1, at + 1));
    double z = maximum(y -> growth(y, wavenumber), low, high);
    double s = growth(z, wavenumber);
    for (double edge : new double[] {low, high}) {
      if (growth(edge, wavenumber) > s) {
        z = edge;
        s = growth(edge, wavenumber);
      }
    }
    return new Fastest(s, wavenumber, z);
  }

  /** The greatest growth rate over heights and wavenumbers; wavenumber 0 where growth only rises with wavelength. */
  public Fastest fastest() {
    double shortest = shortest();
    if (shortest == 0.0) {
      return new Fastest(0.0, 0.0, equilibrium.bottom());
    }
    Fastest best = fastestAt(1e-6 * shortest);
    for (int i = 1; i <= WAVENUMBERS; i++) {
      Fastest here = fastestAt(shortest * i / WAVENUMBERS);
      best = here.growthRate() > best.growthRate() ? here : best;
    }
    return best.wavenumber() < 1e-3 * shortest ? new Fastest(best.growthRate(), 0.0, best.height())
        : refined(best, shortest);
  }

  /** Alternates between the best wavenumber at a height and the best height at a wavenumber. */
  private Fastest refined(Fastest start, double shortest) {
    Fastest best = start;
    double reach = shortest / WAVENUMBERS;
    for (int step = 0; step < REFINEMENTS; step++) {
      double z = best.height();
      double k = maximum(x -> growth(z, x), Math.max(0.0, best.wavenumber() - reach), best.wavenumber() + reach);
      Fastest next = fastestAt(k);
      best = next.growthRate() >= best.growthRate() ? next : best;
    }
    return best;
  }

  private static double maximum(org.apache.commons.math3.analysis.UnivariateFunction function, double low,
      double high) {
    return new BrentOptimizer(1e-9, 1e-9 * (high - low)).optimize(new MaxEval(500), GoalType.MAXIMIZE,
        new UnivariateObjectiveFunction(function), new SearchInterval(low, high)).getPoint();
  }

  /** Greatest wavenumber at which any height is unstable; finite stand-in where there is no field. */
  private double shortest() {
    double greatest = 0.0;
    for (int i = 0; i < HEIGHTS; i++) {
      greatest = Math.max(greatest, new LocalBalance(equilibrium.at(height(i))).marginalWavenumber());
    }
    return Double.isInfinite(greatest) ? 1e3 / equilibrium.scaleHeight() : greatest;
  }

  /** The algebraic problem at one height. */
  private final class LocalBalance {
    private final GasState state;
    private final double gravity;
    private final double alfvenSquared;
    private final double fall;

    LocalBalance(GasState state) {
      this.state = state;
      gravity = state.gravity();
      alfvenSquared = 2.0 * state.magneticPerMass();
      fall = -gravity * state.logDensityGradient();
    }

    private double drive() {
      return gravity * gravity / (gas.softestIndex() * state.gasPerMass()) - fall;
    }

    double marginalWavenumber() {
      return drive() > 1e-13 * fall ? Math.sqrt(drive() / alfvenSquared) : 0.0;
    }

    /** Bisection on a function of s that rises through its only positive root. */
    double growth(double wavenumber) {
      double square = wavenumber * wavenumber;
      double high = drive() - square * alfvenSquared;
      if (!(high > 1e-13 * fall)) {
        return 0.0;
      }
      double low = 0.0;
      for (int step = 0; step < 70 && high - low > 4.0 * Math.ulp(high); step++) {
        double middle = 0.5 * (low + high);
        if (excess(middle, square) < 0.0) {
          low = middle;
        } else {
          high = middle;
        }
      }
      return low == 0.0 ? 0.0 : Math.sqrt(0.5 * (low + high));
    }

    private double excess(double growthSquared, double wavenumberSquared) {
      double s = Math.sqrt(growthSquared);
      double leak = wavenumberSquared == 0.0 ? 0.0 : cosmicRays.diffusivity() * wavenumberSquared;
      double answer = Double.isInfinite(cosmicRays.diffusivity()) ? 0.0 : cosmicRays.adiabaticIndex() * s / (s + leak);
      double stiffness = gas.index(s) * state.gasPerMass() + answer * state.cosmicRayPerMass();
      double tension = growthSquared + wavenumberSquared * alfvenSquared;
      double denominator = (stiffness + alfvenSquared) * growthSquared
          + stiffness * alfvenSquared * wavenumberSquared;
      return tension * (1.0 - gravity * gravity / denominator) + fall;
    }
  }
}
