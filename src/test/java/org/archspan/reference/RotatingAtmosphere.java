package org.archspan.reference;

import org.apache.commons.math3.complex.Complex;

/**
 * Exact modes of {@link UniformAtmosphere} under rigid rotation, cosmic rays without response or adiabatic. With X and Y
 * eliminated {@code -a Z'' + (a + b2 - b1) Z' + (b1 + c) Z = 0} has constant coefficients; between walls
 * {@code Z = exp(lambda z) sin(n pi z/L)} and s solves {@code [(a + b2 - b1)/a]^2/4 + (b1 + c)/a = -(n pi/L)^2}. Times
 * {@code (a det A)^2} (A: the 2 x 2 matrix of X and Y, singular on the imaginary axis alone) that is a real polynomial in s.
 */
record RotatingAtmosphere(double alpha, double beta, double stiffness, double angularSpeed) {
  /** Number of modes of one wave between walls in Re s > edge, |s| < radius: the polynomial turns that often around it. */
  int count(double kx, double ky, double kz, double edge, double radius) {
    int steps = 4000;
    double corner = Math.acos(edge / radius);
    double turn = 0.0;
    Complex last = condition(new Complex(edge, -radius * Math.sin(corner)), kx, ky, kz);
    for (int i = 1; i <= 2 * steps; i++) {
      double share = (double) (i - 1) / steps;
      Complex s = i <= steps ? new Complex(radius * Math.cos(corner * (2.0 * i / steps - 1.0)),
              radius * Math.sin(corner * (2.0 * i / steps - 1.0)))
          : new Complex(edge, radius * Math.sin(corner) * (1.0 - 2.0 * (share - 1.0 + 1.0 / steps)));
      Complex next = condition(s, kx, ky, kz);
      turn += next.divide(last).getArgument();
      last = next;
    }
    return (int) Math.rint(turn / (2.0 * Math.PI));
  }

  /** How far a root is from satisfying the condition of the nearest wave between walls: an error of (kz L/pi). */
  double mismatch(Complex s, double kx, double ky, double wallDistance) {
    Complex at = condition(s, kx, ky, 0.0);
    Complex unit = condition(s, kx, ky, 1.0).subtract(at);
    Complex order = at.divide(unit).negate().sqrt().multiply(wallDistance / Math.PI);
    return order.subtract(Math.rint(order.getReal())).abs();
  }

  private Complex condition(Complex s, double kx, double ky, double kz) {
    double g = 1.0 + alpha + beta;
    double v = 2.0 * alpha;
    Complex square = s.multiply(s);
    Complex coriolis = s.multiply(2.0 * angularSpeed);
    Complex xx = square.add(kx * kx * stiffness);
    Complex xy = coriolis.negate().add(kx * ky * stiffness);
    Complex yx = coriolis.add(kx * ky * stiffness);
    Complex yy = square.add(kx * kx * v + ky * ky * (stiffness + v));
    Complex det = xx.multiply(yy).subtract(xy.multiply(yx));
    double[] slope = {kx * stiffness, ky * (stiffness + v)};
    double[] value = {-g * kx, -g * ky};
    Complex a = det.multiply(stiffness + v).subtract(between(slope, slope, xx, xy, yx, yy));
    Complex b1 = det.multiply(-g).subtract(between(slope, value, xx, xy, yx, yy));
    Complex b2 = det.multiply(-g).subtract(between(value, slope, xx, xy, yx, yy));
    Complex c = square.add(kx * kx * v + g).multiply(det).subtract(between(value, value, xx, xy, yx, yy));
    Complex first = a.add(b2).subtract(b1);
    return first.multiply(first).multiply(0.25).add(b1.add(c).multiply(a)).add(a.multiply(a).multiply(kz * kz));
  }

  /** {@code u^T A^-1 w} times the determinant of A. */
  private static Complex between(double[] u, double[] w, Complex xx, Complex xy, Complex yx, Complex yy) {
    Complex first = yy.multiply(w[0]).subtract(xy.multiply(w[1]));
    Complex second = xx.multiply(w[1]).subtract(yx.multiply(w[0]));
    return first.multiply(u[0]).add(second.multiply(u[1]));
  }
}
