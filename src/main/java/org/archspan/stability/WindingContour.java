package org.archspan.stability;

import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.complex.Complex;

/**
 * Counts the zeros of det S(s) in {@code Re s > edge, |s| < radius} by the argument principle. The coefficients are real, so
 * zeros come in conjugate pairs and the upper half of the contour suffices: from the radius on the real axis along the arc,
 * then down the line Re s = edge back to the real axis; the phase turns by pi for each zero.
 *
 * <p>Neutral oscillations and the poles that the elimination leaves crowd on the imaginary axis. No step is longer than half the
 * distance to it, nor than the measured rate at which the logarithm of the determinant changes allows: the phase cannot turn
 * unseen.
 */
final class WindingContour {
  private static final double ARC_STEP = 0.15;
  private static final double LINE_STEP = 0.5;
  /** A step aims at this change of the logarithm, rad, and is taken back where it was more than the second. */
  private static final double AIM = 0.6;
  private static final double MOST = 1.3;
  private static final double DIFFERENCE = 1e-6;
  private static final double AGREEMENT = 0.05;
  private static final int MOST_POINTS = 20_000;
  private final RotatingDeterminant determinant;
  private final double kx;
  private final double ky;
  private double edge;
  private int points;
  private double phase;
  private double rate;

  WindingContour(RotatingDeterminant determinant, double kx, double ky) {
    this.determinant = determinant;
    this.kx = kx;
    this.ky = ky;
  }

  /** Determinants that the last count took. */
  int points() {
    return points;
  }

  /**
   * The number of zeros.
   *
   * @param newEdge   positive
   * @param radius    greater than the edge
   * @throws UnsolvedException when the phase never settles, as when a zero lies on the contour
   */
  int zeros(double newEdge, double radius) {
    edge = newEdge;
    points = 0;
    double corner = Math.acos(edge / radius) * radius;
    double height = radius * Math.sin(corner / radius);
    look(new Complex(radius, 0.0));
    double turn = turn(at -> new Complex(radius * Math.cos(at / radius), radius * Math.sin(at / radius)), corner,
        s -> ARC_STEP * radius);
    turn += turn(at -> new Complex(edge, Math.max(0.0, height - at)), height, s -> LINE_STEP * edge);
    double zeros = turn / Math.PI;
    if (!(Math.abs(zeros - Math.rint(zeros)) < AGREEMENT)) {
      throw new UnsolvedException("the number of growing modes came out as " + zeros + " by the argument principle");
    }
    return (int) Math.rint(zeros);
  }

  /** The number of zeros in a rectangle to the right of the edge given, by the same marching around its four sides. */
  int zerosInside(double left, double right, double low, double high) {
    points = 0;
    edge = left;
    Complex[] corners = {new Complex(left, low), new Complex(right, low), new Complex(right, high),
        new Complex(left, high), new Complex(left, low)};
    double turn = 0.0;
    look(corners[0]);
    for (int side = 0; side < 4; side++) {
      turn += turnAlong(corners[side], corners[side + 1]);
    }
    return (int) Math.rint(turn / (2.0 * Math.PI));
  }

  private double turnAlong(Complex from, Complex to) {
    double length = to.subtract(from).abs();
    return turn(at -> from.add(to.subtract(from).multiply(at / length)), length, s -> LINE_STEP * s.getReal());
  }

  /**
   * Turn of the phase along a path from where was looked last.
   *
   * @param path    place at a length along it
   * @param length  of the path
   * @param longest step allowed at a place
   */
  private double turn(DoubleFunction<Complex> path, double length, ToDoubleFunction<Complex> longest) {
    double turn = 0.0;
    double at = 0.0;
    while (at < length * (1.0 - 1e-12)) {
      double step = Math.min(Math.min(longest.applyAsDouble(path.apply(at)), AIM / rate), length - at);
      double here = phase;
      double rateHere = rate;
      look(path.apply(at + step));
      while (step * Math.max(rate, rateHere) > MOST) {
        step *= 0.5;
        look(path.apply(at + step));
      }
      turn += Math.IEEEremainder(phase - here, 2.0 * Math.PI);
      at += step;
      if (points > MOST_POINTS) {
        throw new UnsolvedException("the phase of the determinant does not settle on a contour around growing modes");
      }
    }
    return turn;
  }

  /** Phase and rate of change of the logarithm at a place on the contour. */
  private void look(Complex s) {
    double h = DIFFERENCE * edge;
    points += 2;
    determinant.evaluate(s.getReal() + h, s.getImaginary(), kx, ky);
    double magnitude = determinant.logMagnitude();
    double shifted = determinant.phase();
    determinant.evaluate(s.getReal(), s.getImaginary(), kx, ky);
    phase = determinant.phase();
    rate = Math.hypot(magnitude - determinant.logMagnitude(), Math.IEEEremainder(shifted - phase, 2.0 * Math.PI)) / h;
  }
}
