package org.archspan.reference;

import java.util.concurrent.atomic.AtomicInteger;
import org.archspan.boundary.Parity;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.hipparchus.ode.sampling.ODEStateInterpolator;
import org.hipparchus.ode.sampling.ODEStepHandler;

/**
 * Modes by shooting from the bottom, and by counting the zeros of Z on the way: the number of modes that grow
 * faster than s is the number of interior zeros, one more where the end at the top would release energy
 * (Sturm oscillation; the coefficient u below is positive and the energy form rises with s).
 *
 * <p>With {@code P = G D + 2 m D_perp - g Z}, {@code t = 2 m kx^2}, {@code Q = G (s^2 + t) + 2 m s^2}:
 * {@code D_perp = [(s^2 + G kx^2) P + g s^2 Z]/Q}, {@code D = [(s^2 + t) D_perp - kx^2 P]/s^2},
 * {@code Z' = D_perp + ky^2 P/(s^2 + t)}, {@code P' = -L P + (s^2 + t - g L) Z - g D}. Variables carry
 * sqrt(rho).
 */
public final class ShootingReference {
  private static final double STEP_TOLERANCE = 1e-13;

  private final Equilibrium equilibrium;
  private final GasClosure gas;
  private final CosmicRayClosure cosmicRays;
  private final Parity parity;
  private final double length;
  private final double speed;

  /** A problem to shoot at. */
  public ShootingReference(Equilibrium equilibrium, GasClosure gas, CosmicRayClosure cosmicRays,
      Parity parity) {
    this.equilibrium = equilibrium;
    this.gas = gas;
    this.cosmicRays = cosmicRays;
    this.parity = parity;
    length = equilibrium.scaleHeight();
    speed = equilibrium.dispersion();
  }

  /**
   * Growth rate of a mode by bisection on the count, s^-1; 0 when it does not grow.
   *
   * @param kx    along the field, cm^-1, positive
   * @param ky    across the field, cm^-1
   * @param order 0 for the fastest
   */
  public double growthRate(double kx, double ky, int order) {
    double high = bound();
    return Bisection.root(s -> fasterThan(s, kx, ky) > order ? 1.0 : -1.0, 1e-6 * high, high);
  }

  /** Number of modes that grow faster than s (s^-1, positive). */
  public int fasterThan(double s, double kx, double ky) {
    Wave wave = new Wave(s * length / speed, kx * length, ky * length);
    double[] start = parity == Parity.FLEXING ? new double[] {1.0, 0.0} : new double[] {0.0, 1.0};
    DormandPrince853Integrator integrator =
        new DormandPrince853Integrator(1e-12, 1.0, STEP_TOLERANCE, STEP_TOLERANCE);
    AtomicInteger zeros = new AtomicInteger();
    integrator.addStepHandler(counting(zeros));
    double top = equilibrium.top() / length;
    double[] end = integrator.integrate(wave, new ODEState(equilibrium.bottom() / length, start), top)
        .getPrimaryState();
    return zeros.get() + (wave.releasesEnergy(top, end) ? 1 : 0);
  }

  private static ODEStepHandler counting(AtomicInteger zeros) {
    return (ODEStateInterpolator step) -> {
      double before = step.getPreviousState().getPrimaryState()[0];
      double after = step.getCurrentState().getPrimaryState()[0];
      if (before * after < 0.0) {
        zeros.incrementAndGet();
      }
    };
  }

  /** {@code s^2 <= max(g^2/G_min + g L)}: completes the square in the energy form. */
  private double bound() {
    double greatest = 0.0;
    int samples = 1000;
    for (int i = 0; i <= samples; i++) {
      double height = equilibrium.bottom() + (equilibrium.top() - equilibrium.bottom()) * i / samples;
      GasState state = equilibrium.at(height);
      double g = state.gravity();
      double softest = gas.adiabaticIndex() * state.gasPerMass();
      greatest = Math.max(greatest, g * g / softest + g * state.logDensityGradient());
    }
    return 1.1 * Math.sqrt(greatest);
  }

  /** The two first-order equations at one growth rate, lengths and speeds in the units of the equilibrium. */
  private final class Wave implements OrdinaryDifferentialEquation {
    private final double s;
    private final double kx;
    private final double ky;

    Wave(double s, double kx, double ky) {
      this.s = s;
      this.kx = kx;
      this.ky = ky;
    }

    @Override
    public int getDimension() {
      return 2;
    }

    @Override
    public double[] computeDerivatives(double z, double[] y) {
      double[] c = coefficients(z);
      return new double[] {c[0] * y[0] + c[1] * y[1], c[2] * y[0] - c[0] * y[1]};
    }

    /** t, u, v of {@code Z' = t Z + u P, P' = v Z - t P}, dimensionless. */
    private double[] coefficients(double z) {
      GasState state = equilibrium.at(z * length);
      double unit = speed * speed;
      double g = state.gravity() * length / unit;
      double slope = state.logDensityGradient() * length;
      double magnetic2 = 2.0 * state.magneticPerMass() / unit;
      double stiffness = (gas.adiabaticIndex() * state.gasPerMass()
          + cosmicRayIndex() * state.cosmicRayPerMass()) / unit;
      double w = s * s;
      double stretched = w + magnetic2 * kx * kx;
      double q = stiffness * stretched + magnetic2 * w;
      return new double[] {0.5 * slope + g * w / q, (w + stiffness * kx * kx) / q + ky * ky / stretched,
          stretched - g * slope - g * g * stretched / q};
    }

    private double cosmicRayIndex() {
      double leak = cosmicRays.diffusivity() / (speed * length) * kx * kx;
      return cosmicRays.adiabaticIndex() * (Double.isInfinite(leak) ? 0.0 : s / (s + leak));
    }

    /** Whether what lies at the top, under the displacement that arrives there, has negative energy. */
    boolean releasesEnergy(double top, double[] end) {
      double[] c = coefficients(top);
      return switch (equilibrium.topBoundary()) {
        case LID -> false;
        case FREE -> end[0] * (end[1] + gravity(top) * end[0]) < 0.0;
        case OPEN -> {
          double decay = c[0] * c[0] + c[1] * c[2];
          if (decay < 0.0) {
            throw new IllegalArgumentException("s lies below the edge of the halo continuum");
          }
          yield end[0] * (end[1] + (c[0] + Math.sqrt(decay)) / c[1] * end[0]) < 0.0;
        }
      };
    }

    private double gravity(double top) {
      return equilibrium.at(top * length).gravity() * length / (speed * speed);
    }
  }
}
