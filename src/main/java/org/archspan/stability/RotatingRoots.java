package org.archspan.stability;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;

/**
 * Zeros of det S(s) by Muller's method, zeros already found divided out. One instance for one thread.
 */
final class RotatingRoots {
  private static final double FIRST_STEP = 1e-3;
  private static final double SETTLED = 1e-13;
  private static final double GOOD = 1e-9;
  private static final int MOST_STEPS = 40;
  private static final double SAME = 1e-6;
  /** Of |s|: slower growth is rounding. */
  private static final double NEUTRAL = 1e-9;
  private final RotatingDeterminant determinant;
  private final double kx;
  private final double ky;
  private final List<Complex> found = new ArrayList<>();

  RotatingRoots(RotatingDeterminant determinant, double kx, double ky) {
    this.determinant = determinant;
    this.kx = kx;
    this.ky = ky;
  }

  /** Zeros found so far, those above the real axis with their conjugates counted as one. */
  List<Complex> found() {
    return found;
  }

  /** How many zeros these are, conjugates included. */
  int count() {
    return (int) found.stream().mapToLong(root -> root.getImaginary() == 0.0 ? 1 : 2).sum();
  }

  /** Refines a guess with nothing divided out; null when it leads nowhere, or to a neutral oscillation. */
  Complex refine(Complex guess) {
    Complex root = muller(guess, List.of());
    return root != null && root.getReal() > NEUTRAL * root.abs() ? root : null;
  }

  /** Finds the zeros on the real axis at which the determinant, real there, changes its sign between points of a scan. */
  void searchRealAxis(double edge, double radius, int steps) {
    boolean before = negative(edge);
    for (int i = 1; i <= steps; i++) {
      double left = edge + (radius - edge) * (i - 1) / steps;
      double right = edge + (radius - edge) * i / steps;
      boolean after = negative(right);
      if (before != after) {
        bisect(left, right, before, edge, radius);
      }
      before = after;
    }
  }

  private boolean negative(double growth) {
    determinant.evaluate(growth, 0.0, kx, ky);
    return Math.cos(determinant.phase()) < 0.0;
  }

  private void bisect(double left, double right, boolean negativeLeft, double edge, double radius) {
    double low = left;
    double high = right;
    for (int step = 0; step < 50 && high - low > 1e-13 * high; step++) {
      double middle = 0.5 * (low + high);
      if (negative(middle) == negativeLeft) {
        low = middle;
      } else {
        high = middle;
      }
    }
    add(new Complex(0.5 * (low + high), 0.0), edge, radius);
  }

  /**
   * Looks for a zero that is not yet found, in a region.
   *
   * @return whether there was one
   */
  boolean search(Complex guess, double edge, double radius) {
    return add(muller(guess, List.of()), edge, radius) || !found.isEmpty() && add(muller(guess, found), edge, radius);
  }

  private boolean add(Complex root, double edge, double radius) {
    if (root == null || !(root.getReal() > edge && root.abs() < radius)) {
      return false;
    }
    Complex upper = Math.abs(root.getImaginary()) < SAME * root.abs() ? new Complex(root.getReal(), 0.0)
        : new Complex(root.getReal(), Math.abs(root.getImaginary()));
    for (Complex known : found) {
      if (known.subtract(upper).abs() < SAME * upper.abs()) {
        return false;
      }
    }
    found.add(upper);
    return true;
  }

  /** Muller's method: the parabola through the last three points (Muller 1956, Math. Tables Aids Comput. 10, 208). */
  private Complex muller(Complex guess, List<Complex> divided) {
    Complex x0 = guess.multiply(1.0 - FIRST_STEP);
    Complex x1 = guess.add(new Complex(0.0, FIRST_STEP * guess.abs()));
    Complex x2 = guess;
    determinant.evaluate(x2.getReal(), x2.getImaginary(), kx, ky);
    double reference = determinant.logMagnitude();
    Complex f2 = value(reference, x2, divided);
    Complex f0 = evaluated(reference, x0, divided);
    Complex f1 = evaluated(reference, x1, divided);
    double last = Double.POSITIVE_INFINITY;
    for (int step = 0; step < MOST_STEPS; step++) {
      Complex change = step(x0, f0, x1, f1, x2, f2);
      double size = change.abs();
      if (!(size < 0.5 * x2.abs())) {
        change = change.multiply(0.5 * x2.abs() / size);
      }
      Complex x3 = x2.add(change);
      if (!(x3.getReal() > 0.0) || Double.isNaN(size)) {
        return null;
      }
      boolean stalled = size < GOOD * x3.abs() && size >= 0.5 * last;
      if (size < SETTLED * x3.abs() || stalled) {
        return x3;
      }
      last = size;
      x0 = x1;
      f0 = f1;
      x1 = x2;
      f1 = f2;
      x2 = x3;
      f2 = evaluated(reference, x3, divided);
      if (f2.abs() == 0.0) {
        return x3;
      }
    }
    return null;
  }

  private static Complex step(Complex x0, Complex f0, Complex x1, Complex f1, Complex x2, Complex f2) {
    Complex first = f2.subtract(f1).divide(x2.subtract(x1));
    Complex second = f1.subtract(f0).divide(x1.subtract(x0));
    Complex curvature = first.subtract(second).divide(x2.subtract(x0));
    Complex slope = first.add(curvature.multiply(x2.subtract(x1)));
    Complex root = slope.multiply(slope).subtract(curvature.multiply(f2).multiply(4.0)).sqrt();
    Complex plus = slope.add(root);
    Complex minus = slope.subtract(root);
    return f2.multiply(-2.0).divide(plus.abs() > minus.abs() ? plus : minus);
  }

  private Complex evaluated(double reference, Complex s, List<Complex> divided) {
    determinant.evaluate(s.getReal(), s.getImaginary(), kx, ky);
    return value(reference, s, divided);
  }

  /** The determinant just evaluated, over exp(reference) and over the zeros divided out. */
  private Complex value(double reference, Complex s, List<Complex> divided) {
    double size = Math.exp(determinant.logMagnitude() - reference);
    Complex value = new Complex(size * Math.cos(determinant.phase()), size * Math.sin(determinant.phase()));
    for (Complex root : divided) {
      value = value.divide(s.subtract(root));
      if (root.getImaginary() != 0.0) {
        value = value.divide(s.subtract(new Complex(root.getReal(), -root.getImaginary())));
      }
    }
    return value;
  }
}
