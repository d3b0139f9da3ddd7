package org.archspan.reference;

import org.archspan.boundary.TopBoundary;
import org.archspan.equilibrium.Equilibrium;

/**
 * Exact modes of an isothermal atmosphere in uniform gravity between rigid walls, in units c = H = 1, so that
 * gravity is {@code 1 + alpha + beta}. Every mode is {@code Z = exp(z/2) sin(kz z)}, {@code kz = n pi/L}.
 *
 * <p>With {@code Z' -> (1/2 + i kz) Z} and {@code delta Pi' -> (-1/2 + i kz) delta Pi} the equations of
 * motion become a Hermitian 3 x 3 matrix H with {@code det(H + s^2) = 0}: a real cubic in s^2 whose roots are
 * all real, of which at most one is positive. Sources: Parker (1966), ApJ 145, 811; Parker (1967), ApJ 149,
 * 535.
 *
 * @param alpha          magnetic over gas pressure, dimensionless, positive
 * @param beta           cosmic-ray over gas pressure, dimensionless, not negative
 * @param gasIndex       gamma, dimensionless, positive
 * @param cosmicRayIndex gamma_c, dimensionless, not negative
 * @param diffusivity    kappa along the field in units c H, dimensionless, not negative, may be infinite
 */
public record UniformAtmosphere(double alpha, double beta, double gasIndex, double cosmicRayIndex,
    double diffusivity) {

  /** Gravity, dimensionless. */
  public double gravity() {
    return 1.0 + alpha + beta;
  }

  /** Growth rate, dimensionless, 0 when stable, of the n-th mode, n = 1, 2, ..., between walls. */
  public double growthRate(double kx, double ky, double wallDistance, int n) {
    return growthRate(kx, ky, n * Math.PI / wallDistance);
  }

  /**
   * Growth rate, dimensionless, 0 when stable. Where cosmic rays diffuse at a finite rate, stiffness rises
   * with s and growth falls with stiffness, so that {@code s(G(x)) - x} falls with x and has a single root.
   */
  public double growthRate(double kx, double ky, double kz) {
    double low = 0.0;
    double high = withStiffness(stiffness(0.0, kx), kx, ky, kz);
    double other = withStiffness(stiffness(high, kx), kx, ky, kz);
    if (other == high) {
      return high;
    }
    return Bisection.root(s -> withStiffness(stiffness(s, kx), kx, ky, kz) - s, low, high);
  }

  /** Number of growing modes between walls a distance apart. */
  public int unstableModes(double kx, double ky, double wallDistance) {
    int count = 0;
    while (lastCoefficient(stiffness(0.0, kx), kx, ky, (count + 1) * Math.PI / wallDistance) < 0.0) {
      count++;
    }
    return count;
  }

  /** Greatest kx that grows at this ky and kz, dimensionless; 0 when none does. */
  public double marginalWavenumber(double ky, double kz) {
    double g = gravity();
    double stiffness = diffusivity == 0.0 ? gasIndex + cosmicRayIndex * beta : gasIndex;
    double excess = g * g - stiffness * g;
    // k^2 (2 alpha G kx^2 - excess) + 2 alpha G (kz^2 + 1/4) kx^2 = 0, a quadratic in kx^2
    double tension = 2.0 * alpha * stiffness;
    double middle = tension * (ky * ky + kz * kz + 0.25) - excess;
    return Math.sqrt(Math.max(0.0, largerRoot(tension, middle, -ky * ky * excess)));
  }

  /**
   * Limit of short waves across the field, where the total pressure does not change: growth rate,
   * dimensionless, 0 when stable.
   */
  public double acrossLimit(double kx) {
    double high = acrossLimit(kx, stiffness(0.0, kx));
    if (acrossLimit(kx, stiffness(high, kx)) == high) {
      return high;
    }
    return Bisection.root(s -> acrossLimit(kx, stiffness(s, kx)) - s, 0.0, high);
  }

  /** The state, with unit density on the floor at z = 0 and a lid at this height. */
  public Equilibrium equilibrium(double top) {
    return equilibrium(top, TopBoundary.LID);
  }

  /** The same under another boundary. */
  public Equilibrium equilibrium(double top, TopBoundary boundary) {
    double g = gravity();
    return new SimpleEquilibrium(z -> g, z -> g * z, alpha, beta, 1.0, top, false, boundary);
  }

  /** {@code G = gamma + gamma_c_eff beta} at growth rate s. */
  private double stiffness(double s, double kx) {
    if (Double.isInfinite(diffusivity) || beta == 0.0) {
      return gasIndex;
    }
    double leak = diffusivity * kx * kx;
    double share = leak == 0.0 ? 1.0 : s / (s + leak);
    return gasIndex + cosmicRayIndex * beta * share;
  }

  private double acrossLimit(double kx, double stiffness) {
    double g = gravity();
    double tension = 2.0 * alpha * kx * kx;
    double middle = stiffness * tension + (tension + g) * (stiffness + 2.0 * alpha) - g * g;
    double last = tension * ((tension + g) * stiffness - g * g);
    return Math.sqrt(Math.max(0.0, largerRoot(stiffness + 2.0 * alpha, middle, last)));
  }

  /** Positive root of the polynomial of section "exact" at a fixed stiffness, as s. */
  private double withStiffness(double stiffness, double kx, double ky, double kz) {
    double last = lastCoefficient(stiffness, kx, ky, kz);
    if (last >= 0.0) {
      return 0.0;
    }
    double q = kx * kx + kz * kz + 0.25;
    if (ky == 0.0) {
      return Math.sqrt(largerRoot(1.0, (stiffness + 2.0 * alpha) * q, last / (2.0 * alpha * kx * kx)));
    }
    return Math.sqrt(cubicRoot(stiffness, kx, ky, kz, last));
  }

  /** det H, whose sign decides stability; the cancelling terms are taken out by hand. */
  private double lastCoefficient(double stiffness, double kx, double ky, double kz) {
    double g = gravity();
    double tension = 2.0 * alpha * stiffness * kx * kx;
    double k2 = kx * kx + ky * ky;
    return 2.0 * alpha * kx * kx * (k2 * (tension + stiffness * g - g * g) + tension * (kz * kz + 0.25));
  }

  /** Newton from above on {@code w^3 + t w^2 + e w + d}, convex and rising right of its largest root. */
  private double cubicRoot(double stiffness, double kx, double ky, double kz, double last) {
    double g = gravity();
    double both = stiffness + 2.0 * alpha;
    double height2 = kz * kz + 0.25;
    double tension = 2.0 * alpha * kx * kx;
    double xx = stiffness * kx * kx;
    double yy = tension + both * ky * ky;
    double zz = tension + both * height2;
    double minors = xx * tension + kx * kx * ky * ky * 2.0 * alpha * stiffness
        + kx * kx * (stiffness * (tension + 2.0 * alpha * height2) + stiffness * g - g * g)
        + tension * zz + ky * ky * (both * tension + both * g - g * g);
    double trace = xx + yy + zz;
    double w = 1.0 + Math.abs(trace) + Math.abs(minors) + Math.abs(last);
    while (true) {
      double value = ((w + trace) * w + minors) * w + last;
      double next = w - value / ((3.0 * w + 2.0 * trace) * w + minors);
      if (!(next < w)) {
        return w;
      }
      w = next;
    }
  }

  /** Larger real root of {@code a x^2 + b x + c}, without cancellation; a positive. */
  private static double largerRoot(double a, double b, double c) {
    double root = Math.sqrt(Math.max(0.0, b * b - 4.0 * a * c));
    return b > 0.0 ? -2.0 * c / (b + root) : (root - b) / (2.0 * a);
  }
}
