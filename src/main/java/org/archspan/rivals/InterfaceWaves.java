package org.archspan.rivals;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.archspan.units.Constants;

/**
 * Buoyant (Rayleigh-Taylor) and shear (Kelvin-Helmholtz) overturning of an interface, for waves along the field and the
 * shear. With {@code r_i = rho_i coth(k h_i)} and {@code b_i = B_i^2 coth(k h_i)/(4 pi)},
 *
 * <pre>  s^2 = [k g (rho_2 - rho_1) - k^2 (b_1 + b_2)]/(r_1 + r_2) + k^2 dV^2 r_1 r_2/(r_1 + r_2)^2,</pre>
 *
 * where 1 is below and 2 above. Waves across field and shear feel neither: the same with B = dV = 0.
 *
 * <p>Source: Chandrasekhar (1961), Hydrodynamic and Hydromagnetic Stability, chapters X and XI.
 */
public final class InterfaceWaves {
  private static final int SCAN = 800;

  private final LayerInterface layers;

  /** Waves of an interface. */
  public InterfaceWaves(LayerInterface layers) {
    this.layers = layers;
  }

  private static double coth(double x) {
    return 1.0 / Math.tanh(x);
  }

  /**
   * Square of the growth rate, s^-2; not positive for a wave that oscillates.
   *
   * @param wavenumber k, cm^-1, positive
   */
  public double growthRateSquared(double wavenumber) {
    double cothBelow = coth(wavenumber * layers.depthBelow());
    double cothAbove = coth(wavenumber * layers.depthAbove());
    double below = layers.densityBelow() * cothBelow;
    double above = layers.densityAbove() * cothAbove;
    double tension = (layers.fieldBelow() * layers.fieldBelow() * cothBelow
        + layers.fieldAbove() * layers.fieldAbove() * cothAbove) / (4.0 * Math.PI);
    double inertia = below + above;
    double shearing = wavenumber * layers.shear() * Math.sqrt(below * above) / inertia;
    return wavenumber * (layers.overturningWeight() - wavenumber * tension) / inertia + shearing * shearing;
  }

  /** Growth rate, s^-1; 0 for a wave that oscillates. */
  public double growthRate(double wavenumber) {
    return Math.sqrt(Math.max(0.0, growthRateSquared(wavenumber)));
  }

  /** Tension less what shear offers in deep layers, erg cm^-3: negative where short waves grow without limit. */
  private double shortWaveStiffness() {
    double tension = (layers.fieldBelow() * layers.fieldBelow() + layers.fieldAbove() * layers.fieldAbove())
        / (4.0 * Math.PI);
    return tension - layers.shear() * layers.shear() * layers.densityBelow() * layers.densityAbove()
        / (layers.densityBelow() + layers.densityAbove());
  }

  /** Whether growth rises without limit towards short waves: only the true thickness of the interface ends it. */
  public boolean unbounded() {
    return shortWaveStiffness() < 0.0 || shortWaveStiffness() == 0.0 && layers.overturningWeight() > 0.0;
  }

  /**
   * In deep layers the wave that neither grows nor falls, cm: shorter waves are held by tension, or longer ones by
   * gravity; NaN where there is none.
   */
  public double deepCutoff() {
    double wavelength = 2.0 * Math.PI * shortWaveStiffness() / layers.overturningWeight();
    return wavelength > 0.0 && Double.isFinite(wavelength) ? wavelength : Double.NaN;
  }

  /** In deep layers the fastest wave, cm: twice the cutoff; NaN where there is none. */
  public double deepFastest() {
    return unbounded() ? Double.NaN : 2.0 * deepCutoff();
  }

  /**
   * Cutoff in layers far shallower than the wave and without shear, cm, from the first two terms of coth:
   * {@code k^2 = 3 [4 pi g drho - sum B_i^2/h_i]/sum B_i^2 h_i}; NaN where there is none.
   */
  public double shallowCutoff() {
    double squareBelow = layers.fieldBelow() * layers.fieldBelow();
    double squareAbove = layers.fieldAbove() * layers.fieldAbove();
    double squared = 3.0 * (4.0 * Math.PI * layers.overturningWeight() - squareBelow / layers.depthBelow()
        - squareAbove / layers.depthAbove()) / (squareBelow * layers.depthBelow() + squareAbove * layers.depthAbove());
    return layers.shear() == 0.0 && squared > 0.0 && Double.isFinite(squared)
        ? 2.0 * Math.PI / Math.sqrt(squared) : Double.NaN;
  }

  /** Rate at which long waves grow in layers far shallower than they, over k: cm s^-1; 0 where they do not. */
  public double shallowGrowthSpeed() {
    double below = layers.densityBelow() / layers.depthBelow();
    double above = layers.densityAbove() / layers.depthAbove();
    double tension = (layers.fieldBelow() * layers.fieldBelow() / layers.depthBelow()
        + layers.fieldAbove() * layers.fieldAbove() / layers.depthAbove()) / (4.0 * Math.PI);
    double squared = (layers.overturningWeight() - tension) / (below + above)
        + layers.shear() * layers.shear() * below * above / ((below + above) * (below + above));
    return Math.sqrt(Math.max(0.0, squared));
  }

  /** Wavelength that neither grows nor falls, depths included, cm; NaN where there is none. */
  public double cutoff() {
    double deep = 2.0 * Math.PI / deepCutoff();
    double scale = deep > 0.0 ? deep : 2.0 * Math.PI / Math.min(layers.depthBelow(), layers.depthAbove());
    if (!(scale > 0.0)) {
      return Double.NaN;
    }
    // walls change inertia and tension: the change of sign may move far to long waves, or exist only because of them
    double step = Math.exp(-1.0);
    boolean shortGrow = growthRateSquared(1e6 * scale) > 0.0;
    for (double k = 1e6 * scale; k > 1e-8 * scale; k *= step) {
      if (growthRateSquared(k * step) > 0.0 != shortGrow) {
        double root = new BrentSolver(1e-14, 1e-14).solve(500, x -> growthRateSquared(Math.exp(x)) / Math.exp(2.0 * x),
            Math.log(k * step), Math.log(k));
        return 2.0 * Math.PI / Math.exp(root);
      }
    }
    return Double.NaN;
  }

  /** Fastest wave, cm; NaN where all are stable or growth is {@link #unbounded()}. */
  public double fastest() {
    double cutoff = cutoff();
    if (unbounded() || Double.isNaN(cutoff)) {
      return Double.NaN;
    }
    double high = Math.log(2.0 * Math.PI / cutoff);
    double step = Math.log(1e6) / SCAN;
    int best = 0;
    for (int i = 1; i <= SCAN; i++) {
      best = growthRateSquared(Math.exp(high - i * step)) > growthRateSquared(Math.exp(high - best * step)) ? i : best;
    }
    double logarithm = new BrentOptimizer(1e-10, 1e-12).optimize(new MaxEval(500), GoalType.MAXIMIZE,
        new UnivariateObjectiveFunction(x -> growthRateSquared(Math.exp(x))),
        new SearchInterval(high - (best + 1) * step, high - Math.max(0, best - 1) * step)).getPoint();
    return 2.0 * Math.PI / Math.exp(logarithm);
  }

  /** Shortest and longest wavelength that show the curve, cm: about the fastest, the cutoff, or the lesser depth. */
  public double[] tellingRange() {
    double fastest = fastest();
    double cutoff = cutoff();
    double depth = Math.min(layers.depthBelow(), layers.depthAbove());
    double middle = fastest > 0.0 ? fastest : cutoff > 0.0 ? cutoff : Double.isFinite(depth) ? depth : Constants.PARSEC;
    return new double[] {0.1 * middle, 30.0 * middle};
  }
}
