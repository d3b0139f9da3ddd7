package org.archspan.stability;

import org.apache.commons.math3.complex.Complex;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;

/**
 * The condensed form under rigid rotation, at a complex growth rate s. The Coriolis force adds {@code -2 Omega s Y} to the
 * row of X and {@code +2 Omega s X} to that of Y; with A the 2 x 2 matrix of X and Y, e = (kx, ky) and
 * p = (kx K, ky (K + v)) (K: stiffness, v: Alfven speed squared) their elimination leaves, per mass,
 * {@code a = K + v - p A^-1 p}, {@code g beta_1} and {@code g beta_2} for the mixed entries
 * ({@code beta_1 = p A^-1 e - 1}, {@code beta_2 = e A^-1 p - 1}, unequal for ky != 0) and
 * {@code s^2 + kx^2 v + g h - g^2 e A^-1 e}; the potential of a heavy gas joins g zeta with w psi.
 *
 * <p>All quantities in {@link Scales}. Owns its arrays: one instance for one thread.
 */
final class RotatingForm {
  /** Coefficients at the nodes, real and imaginary: a, beta_1, beta_2, e A^-1 e, and s^2 + kx^2 v + g h. */
  final double[][] real;
  final double[][] imaginary;
  private final Atmosphere atmosphere;
  private final GasClosure gas;
  private final CosmicRayClosure cosmicRays;
  private final Scales scales;
  private final double angularSpeed;
  private double gasReal;
  private double gasImaginary;
  private double cosmicRayReal;
  private double cosmicRayImaginary;

  /**
   * The form of a problem on a mesh.
   *
   * @param angularSpeed Omega in units of the crossing rate
   */
  RotatingForm(ModeProblem problem, Scales scales, Atmosphere atmosphere, double angularSpeed) {
    this.atmosphere = atmosphere;
    this.gas = problem.gas();
    this.cosmicRays = problem.cosmicRays();
    this.scales = scales;
    this.angularSpeed = angularSpeed;
    real = new double[5][atmosphere.nodes()];
    imaginary = new double[5][atmosphere.nodes()];
  }

  /** Fills the coefficients at all nodes. O(nodes), no allocation. */
  void fill(double growth, double frequency, double kx, double ky) {
    respond(growth, frequency, kx);
    double sr = growth * growth - frequency * frequency;
    double si = 2.0 * growth * frequency;
    double tr = 2.0 * angularSpeed * growth;
    double ti = 2.0 * angularSpeed * frequency;
    double kx2 = kx * kx;
    double ky2 = ky * ky;
    double kxy = kx * ky;
    for (int i = 0; i < atmosphere.nodes(); i++) {
      double v = atmosphere.alfvenSquared[i];
      double kr = gasReal * atmosphere.gasPerMass[i] + cosmicRayReal * atmosphere.cosmicRayPerMass[i];
      double ki = gasImaginary * atmosphere.gasPerMass[i] + cosmicRayImaginary * atmosphere.cosmicRayPerMass[i];
      double xr = sr + kx2 * kr;
      double xi = si + kx2 * ki;
      double yr = sr + kx2 * v + ky2 * (kr + v);
      double yi = si + ky2 * ki;
      double or = kxy * kr;
      double oi = kxy * ki;
      // determinant of A: x y - (o - t)(o + t)
      double dr = xr * yr - xi * yi - (or * or - oi * oi) + (tr * tr - ti * ti);
      double di = xr * yi + xi * yr - 2.0 * or * oi + 2.0 * tr * ti;
      double square = dr * dr + di * di;
      double ir = dr / square;
      double ii = -di / square;
      double pr = kx * kr;
      double pi = kx * ki;
      double qr = ky * (kr + v);
      double qi = ky * ki;
      // A^-1 p times det: (y p - (o - t) q, x q - (o + t) p)
      double ur = yr * pr - yi * pi - ((or - tr) * qr - (oi - ti) * qi);
      double ui = yr * pi + yi * pr - ((or - tr) * qi + (oi - ti) * qr);
      double wr = xr * qr - xi * qi - ((or + tr) * pr - (oi + ti) * pi);
      double wi = xr * qi + xi * qr - ((or + tr) * pi + (oi + ti) * pr);
      // A^-1 e times det: (y kx - (o - t) ky, x ky - (o + t) kx)
      double er = yr * kx - (or - tr) * ky;
      double ei = yi * kx - (oi - ti) * ky;
      double fr = xr * ky - (or + tr) * kx;
      double fi = xi * ky - (oi + ti) * kx;
      put(0, i, kr + v, ki, -1.0, pr * ur - pi * ui + qr * wr - qi * wi, pr * ui + pi * ur + qr * wi + qi * wr, ir, ii);
      put(1, i, -1.0, 0.0, 1.0, pr * er - pi * ei + qr * fr - qi * fi, pr * ei + pi * er + qr * fi + qi * fr, ir, ii);
      put(2, i, -1.0, 0.0, 1.0, kx * ur + ky * wr, kx * ui + ky * wi, ir, ii);
      put(3, i, 0.0, 0.0, 1.0, kx * er + ky * fr, kx * ei + ky * fi, ir, ii);
      real[4][i] = sr + kx2 * v + atmosphere.fall[i];
      imaginary[4][i] = si;
    }
  }

  /** Sets a coefficient to a constant plus a sign times n/det. */
  private void put(int which, int i, double constantReal, double constantImaginary, double sign, double nr, double ni,
      double ir, double ii) {
    real[which][i] = constantReal + sign * (nr * ir - ni * ii);
    imaginary[which][i] = constantImaginary + sign * (nr * ii + ni * ir);
  }

  /** X and Y at a node, from sqrt(rho) Z' and the force along D. */
  Complex[] horizontal(int i, Complex s, double kx, double ky, Complex slope, Complex force) {
    respond(s.getReal(), s.getImaginary(), kx);
    double v = atmosphere.alfvenSquared[i];
    Complex stiffness = new Complex(gasReal * atmosphere.gasPerMass[i] + cosmicRayReal * atmosphere.cosmicRayPerMass[i],
        gasImaginary * atmosphere.gasPerMass[i] + cosmicRayImaginary * atmosphere.cosmicRayPerMass[i]);
    Complex square = s.multiply(s);
    Complex coriolis = s.multiply(2.0 * angularSpeed);
    Complex xx = square.add(stiffness.multiply(kx * kx));
    Complex yy = square.add(stiffness.multiply(ky * ky)).add(new Complex(v * (kx * kx + ky * ky), 0.0));
    Complex off = stiffness.multiply(kx * ky);
    Complex pressure = stiffness.multiply(slope).subtract(force);
    Complex alongForce = pressure.multiply(-kx);
    Complex acrossForce = pressure.add(slope.multiply(v)).multiply(-ky);
    Complex det = xx.multiply(yy).subtract(off.subtract(coriolis).multiply(off.add(coriolis)));
    Complex x = yy.multiply(alongForce).subtract(off.subtract(coriolis).multiply(acrossForce)).divide(det);
    Complex y = xx.multiply(acrossForce).subtract(off.add(coriolis).multiply(alongForce)).divide(det);
    return new Complex[] {x, y};
  }

  /** The closures at a complex growth rate. */
  private void respond(double growth, double frequency, double kx) {
    gasReal = gas.adiabaticIndex();
    gasImaginary = 0.0;
    if (gas.cools()) {
      double damping = scales.time() / gas.coolingTime();
      double square = square(growth + damping, frequency);
      gasReal = 1.0 + (gas.adiabaticIndex() - 1.0) * (growth * (growth + damping) + frequency * frequency) / square;
      gasImaginary = (gas.adiabaticIndex() - 1.0) * frequency * damping / square;
    }
    cosmicRayImaginary = 0.0;
    if (Double.isInfinite(cosmicRays.diffusivity())) {
      cosmicRayReal = 0.0;
      return;
    }
    double leak = cosmicRays.diffusivity() / (scales.length() * scales.speed()) * kx * kx;
    double square = square(growth + leak, frequency);
    cosmicRayReal = cosmicRays.adiabaticIndex() * (growth * (growth + leak) + frequency * frequency) / square;
    cosmicRayImaginary = cosmicRays.adiabaticIndex() * frequency * leak / square;
  }

  private static double square(double re, double im) {
    return re * re + im * im;
  }
}
