package org.archspan.reference;

import java.util.Arrays;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;

/**
 * The full problem in (X, Y, Z), nothing eliminated, by collocation on one set of Chebyshev points and
 * LAPACK's dense generalised eigenvalues (dggev). Slow, O((5 n)^3), and obvious: the twin of the condensed
 * solver.
 *
 * <p>Variables carry sqrt(rho). With {@code d = kx X + ky Y + Z' - (L/2) Z}, {@code L = d ln rho/dz},
 * {@code dp = d - kx X}, {@code q = G d - g Z} and {@code P = q + 2 m dp}, the equations of motion are
 * {@code s^2 X = -kx q}, {@code s^2 Y = -ky P - 2 m kx^2 Y},
 * {@code s^2 Z = g d + g L Z - 2 m kx^2 Z + P' + (L/2) P}; m = p_B/rho, G = resistance to compression over
 * rho.
 *
 * <p>Cosmic rays of finite diffusivity make the problem quadratic in s; it is then written in first order
 * with the velocities and {@code w = s/(s + kappa kx^2) d}, that is {@code s w = d(velocity) - kappa kx^2 w}.
 */
public final class DenseReference {
  /** Eigenvalues are of order one in these units and carry rounding of about 1e-12. */
  private static final double ROUNDING = 1e-9;
  private final int points;
  private final Parity parity;
  private final TopBoundary topBoundary;
  private final double length;
  private final double speed;
  private final double diffusivity;
  private final double[][] derivative;
  private final double[] g;
  private final double[] slope;
  private final double[] tension;
  private final double[] stiffness;
  private final double[] cosmic;

  /**
   * Tabulates the state on the points.
   *
   * @param points number of Chebyshev points, at least 4
   */
  public DenseReference(Equilibrium equilibrium, GasClosure gas, CosmicRayClosure cosmicRays, Parity parity,
      int points) {
    if (equilibrium.topBoundary() == TopBoundary.OPEN) {
      throw new IllegalArgumentException("an open top is no linear eigenvalue problem in s: use LID or FREE");
    }
    this.points = points;
    this.parity = parity;
    topBoundary = equilibrium.topBoundary();
    length = equilibrium.scaleHeight();
    speed = equilibrium.dispersion();
    diffusivity = cosmicRays.diffusivity() / (speed * length);
    double bottom = equilibrium.bottom() / length;
    double height = equilibrium.top() / length - bottom;
    derivative = Chebyshev.derivative(points, height);
    GasState[] states = Arrays.stream(Chebyshev.points(points, bottom, height))
        .mapToObj(z -> equilibrium.at(z * length)).toArray(GasState[]::new);
    double unit = speed * speed;
    g = tabulate(states, s -> s.gravity() * length / unit);
    slope = tabulate(states, s -> s.logDensityGradient() * length);
    tension = tabulate(states, s -> 2.0 * s.magneticPerMass() / unit);
    cosmic = tabulate(states, s -> cosmicRays.adiabaticIndex() * s.cosmicRayPerMass() / unit);
    double answer = cosmicRays.diffusivity() == 0.0 ? cosmicRays.adiabaticIndex() : 0.0;
    stiffness = tabulate(states,
        s -> (gas.adiabaticIndex() * s.gasPerMass() + answer * s.cosmicRayPerMass()) / unit);
  }

  private static double[] tabulate(GasState[] states, ToDoubleFunction<GasState> quantity) {
    return Arrays.stream(states).mapToDouble(quantity).toArray();
  }

  /**
   * All growing modes, fastest first, s^-1.
   *
   * @param kx along the field, cm^-1, positive
   * @param ky across the field, cm^-1
   */
  public double[] growthRates(double kx, double ky) {
    boolean leaking = diffusivity > 0.0 && !Double.isInfinite(diffusivity) && max(cosmic) > 0.0;
    double x = kx * length;
    double y = ky * length;
    double[] values = leaking ? firstOrder(x, y, true, 0.0).realAbove(ROUNDING, 0.0) : secondOrder(x, y).realAbove(ROUNDING, 0.0);
    return Arrays.stream(values).map(v -> (leaking ? v : Math.sqrt(v)) * speed / length).toArray();
  }

  /**
   * All growing modes under rigid rotation, as {Re s, Im s} in s^-1, those with negative frequency left out; fastest first.
   * First order in s with the velocities, the Coriolis force between them.
   *
   * @param angularSpeed Omega, s^-1
   * @param slowest      growth below this is left out, s^-1
   */
  public double[][] rotatingGrowth(double kx, double ky, double angularSpeed, double slowest) {
    boolean leaking = diffusivity > 0.0 && !Double.isInfinite(diffusivity) && max(cosmic) > 0.0;
    DensePencil pencil = firstOrder(kx * length, ky * length, leaking, 2.0 * angularSpeed * length / speed);
    double unit = speed / length;
    return Arrays.stream(pencil.growing()).filter(s -> s[0] * unit > slowest && s[1] > -1e-9)
        .map(s -> new double[] {s[0] * unit, s[1] * unit}).sorted((a, b) -> Double.compare(b[0], a[0]))
        .toArray(double[][]::new);
  }

  /** Eigenvalue s^2, blocks X, Y, Z. */
  private DensePencil secondOrder(double kx, double ky) {
    DensePencil pencil = new DensePencil(3 * points);
    equations(pencil, kx, ky, 0, false);
    identity(pencil, 0, 0, 3 * points);
    boundaries(pencil, kx, ky, false, false);
    return pencil;
  }

  /** Eigenvalue s, blocks of X, Y, Z, then their velocities, then w. */
  private DensePencil firstOrder(double kx, double ky, boolean leaking, double coriolis) {
    int n = points;
    DensePencil pencil = new DensePencil(7 * n);
    identity(pencil, 0, 0, 7 * n);
    for (int i = 0; i < 3 * n; i++) {
      pencil.addLeft(i, 3 * n + i, 1.0);
    }
    equations(pencil, kx, ky, 3 * n, leaking);
    double leak = leaking ? diffusivity * kx * kx : 1.0;
    for (int i = 0; i < n; i++) {
      pencil.addLeft(3 * n + i, 4 * n + i, coriolis);
      pencil.addLeft(4 * n + i, 3 * n + i, -coriolis);
      divergence(pencil, 6 * n + i, i, 1.0, kx, ky, 3 * n);
      pencil.addLeft(6 * n + i, 6 * n + i, -leak);
    }
    boundaries(pencil, kx, ky, true, leaking);
    return pencil;
  }

  /** Rows {@code s^2 (X, Y, Z) = ...} from this row on. */
  private void equations(DensePencil pencil, double kx, double ky, int firstRow, boolean leaking) {
    int n = points;
    for (int i = 0; i < n; i++) {
      gasPressure(pencil, firstRow + i, i, -kx, kx, ky, leaking);
      totalPressure(pencil, firstRow + n + i, i, -ky, kx, ky, leaking);
      pencil.addLeft(firstRow + n + i, n + i, -tension[i] * kx * kx);
      int row = firstRow + 2 * n + i;
      divergence(pencil, row, i, g[i], kx, ky, 0);
      pencil.addLeft(row, 2 * n + i, g[i] * slope[i] - tension[i] * kx * kx);
      for (int j = 0; j < n; j++) {
        totalPressure(pencil, row, j, derivative[i][j] + (i == j ? 0.5 * slope[i] : 0.0), kx, ky, leaking);
      }
    }
  }

  /** Adds {@code factor d} at node i, from displacements or velocities that start at this column. */
  private void divergence(DensePencil pencil, int row, int i, double factor, double kx, double ky,
      int firstColumn) {
    pencil.addLeft(row, firstColumn + i, factor * kx);
    acrossDivergence(pencil, row, i, factor, ky, firstColumn);
  }

  private void acrossDivergence(DensePencil pencil, int row, int i, double factor, double ky, int firstColumn) {
    int vertical = firstColumn + 2 * points;
    pencil.addLeft(row, firstColumn + points + i, factor * ky);
    pencil.addLeft(row, vertical + i, -factor * 0.5 * slope[i]);
    for (int j = 0; j < points; j++) {
      pencil.addLeft(row, vertical + j, factor * derivative[i][j]);
    }
  }

  /** Adds {@code factor q} at node i. */
  private void gasPressure(DensePencil pencil, int row, int i, double factor, double kx, double ky,
      boolean leaking) {
    divergence(pencil, row, i, factor * stiffness[i], kx, ky, 0);
    pencil.addLeft(row, 2 * points + i, -factor * g[i]);
    if (leaking) {
      pencil.addLeft(row, 6 * points + i, factor * cosmic[i]);
    }
  }

  /** Adds {@code factor P} at node i. */
  private void totalPressure(DensePencil pencil, int row, int i, double factor, double kx, double ky,
      boolean leaking) {
    if (factor != 0.0) {
      gasPressure(pencil, row, i, factor, kx, ky, leaking);
      acrossDivergence(pencil, row, i, factor * tension[i], ky, 0);
    }
  }

  private void boundaries(DensePencil pencil, double kx, double ky, boolean firstOrder, boolean leaking) {
    end(pencil, 0, parity != Parity.FLEXING, kx, ky, firstOrder, leaking);
    end(pencil, points - 1, topBoundary == TopBoundary.LID, kx, ky, firstOrder, leaking);
  }

  /** At an end Z = 0, or the Lagrangian change of the total pressure, {@code P + g Z}, vanishes. */
  private void end(DensePencil pencil, int node, boolean rigid, double kx, double ky, boolean firstOrder, boolean leaking) {
    int z = 2 * points + node;
    int row = firstOrder ? z + 3 * points : z;
    pencil.clearRow(row);
    if (rigid) {
      pencil.addLeft(row, row, 1.0);
    } else {
      totalPressure(pencil, row, node, 1.0, kx, ky, leaking);
      pencil.addLeft(row, z, g[node]);
    }
    if (rigid && firstOrder) {
      pencil.clearRow(z);
      pencil.addLeft(z, z, 1.0);
    }
  }

  private static void identity(DensePencil pencil, int row, int column, int size) {
    IntStream.range(0, size).forEach(i -> pencil.addRight(row + i, column + i, 1.0));
  }

  private static double max(double[] values) {
    return Arrays.stream(values).max().orElse(0.0);
  }
}
