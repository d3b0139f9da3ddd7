package org.archspan.reference;

import java.util.Arrays;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.archspan.units.Constants;

/**
 * The full problem in (X, Y, Z, psi) of a gas that feels its own perturbed gravity, nothing eliminated, by collocation on
 * Chebyshev points and LAPACK's dense generalised eigenvalues (dggev). Cosmic rays without response.
 *
 * <p>Variables carry sqrt(rho); phi = sqrt(4 pi G) psi, w = sqrt(4 pi G rho). With {@code d} the divergence,
 * {@code q = G d - g Z - w psi}, {@code P = q + 2 m (d - kx X)} and {@code L = d ln rho/dz}: {@code s^2 X = -kx q},
 * {@code s^2 Y = -ky P - 2 m kx^2 Y}, {@code s^2 Z = g d + g L Z + w L psi - 2 m kx^2 Z + P' + (L/2) P},
 * {@code 0 = psi'' - k^2 psi + w (d + L Z)}.
 */
final class GravitatingReference {
  private final int n;
  private final Parity parity;
  private final TopBoundary top;
  private final double length;
  private final double speed;
  private final double[][] derivative;
  private final double[] g;
  private final double[] slope;
  private final double[] tension;
  private final double[] stiffness;
  private final double[] jeans;
  private DensePencil pencil;
  private final double[] kx;
  private final double[] ky;
  private double waveSquared;
  private final double[] height;

  GravitatingReference(Equilibrium equilibrium, GasClosure gas, Parity parity, int points) {
    n = points;
    this.parity = parity;
    top = equilibrium.topBoundary();
    length = equilibrium.scaleHeight();
    speed = equilibrium.dispersion();
    derivative = Chebyshev.derivative(points, equilibrium.top() / length);
    height = Chebyshev.points(points, 0.0, equilibrium.top() / length);
    kx = new double[n];
    ky = new double[n];
    GasState[] states = Arrays.stream(height)
        .mapToObj(z -> equilibrium.at(z * length)).toArray(GasState[]::new);
    double unit = speed * speed;
    g = tabulate(states, s -> s.gravity() * length / unit);
    slope = tabulate(states, s -> s.logDensityGradient() * length);
    tension = tabulate(states, s -> 2.0 * s.magneticPerMass() / unit);
    stiffness = tabulate(states, s -> gas.adiabaticIndex() * s.gasPerMass() / unit);
    jeans = tabulate(states,
        s -> Math.sqrt(4.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * s.density()) * length / speed);
  }

  private static double[] tabulate(GasState[] states, ToDoubleFunction<GasState> quantity) {
    return Arrays.stream(states).mapToDouble(quantity).toArray();
  }

  /** All growing modes, fastest first, s^-1; wavenumbers in cm^-1. */
  double[] growthRates(double along, double across) {
    Arrays.fill(kx, along * length);
    Arrays.fill(ky, across * length);
    return growthRates();
  }

  /** The same in a field that turns by {@code rate} (rad cm^-1), for a wave in a direction (rad). */
  double[] growthRates(double wavenumber, double direction, double rate) {
    for (int i = 0; i < n; i++) {
      double angle = direction - rate * height[i] * length;
      kx[i] = wavenumber * length * Math.cos(angle);
      ky[i] = wavenumber * length * Math.sin(angle);
    }
    return growthRates();
  }

  private double[] growthRates() {
    waveSquared = kx[0] * kx[0] + ky[0] * ky[0];
    pencil = new DensePencil(4 * n);
    for (int i = 0; i < n; i++) {
      gasPressure(i, i, -kx[i]);
      totalPressure(n + i, i, -ky[i]);
      add(n + i, n + i, -tension[i] * kx[i] * kx[i]);
      vertical(i);
      potential(i);
      IntStream.of(i, n + i, 2 * n + i).forEach(row -> pencil.addRight(row, row, 1.0));
    }
    ends();
    // rounding of eigenvalues that are of order one; rows without s^2 make some of them nearly real only
    return Arrays.stream(pencil.realAbove(1e-7, 1e-8)).map(v -> Math.sqrt(v) * speed / length).toArray();
  }

  private void add(int row, int column, double value) {
    pencil.addLeft(row, column, value);
  }

  private void vertical(int i) {
    int row = 2 * n + i;
    divergence(row, i, g[i]);
    add(row, 2 * n + i, g[i] * slope[i] - tension[i] * kx[i] * kx[i]);
    add(row, 3 * n + i, jeans[i] * slope[i]);
    for (int j = 0; j < n; j++) {
      totalPressure(row, j, derivative[i][j] + (i == j ? 0.5 * slope[i] : 0.0));
    }
  }

  private void potential(int i) {
    int row = 3 * n + i;
    for (int j = 0; j < n; j++) {
      for (int m = 0; m < n; m++) {
        add(row, 3 * n + m, derivative[i][j] * derivative[j][m]);
      }
    }
    add(row, 3 * n + i, -waveSquared);
    divergence(row, i, jeans[i]);
    add(row, 2 * n + i, jeans[i] * slope[i]);
  }

  private void divergence(int row, int i, double factor) {
    add(row, i, factor * kx[i]);
    perpendicular(row, i, factor);
  }

  private void perpendicular(int row, int i, double factor) {
    add(row, n + i, factor * ky[i]);
    add(row, 2 * n + i, -0.5 * factor * slope[i]);
    for (int j = 0; j < n; j++) {
      add(row, 2 * n + j, factor * derivative[i][j]);
    }
  }

  private void gasPressure(int row, int i, double factor) {
    divergence(row, i, factor * stiffness[i]);
    add(row, 2 * n + i, -factor * g[i]);
    add(row, 3 * n + i, -factor * jeans[i]);
  }

  private void totalPressure(int row, int i, double factor) {
    gasPressure(row, i, factor);
    perpendicular(row, i, factor * tension[i]);
  }

  private void ends() {
    boolean mirror = parity == Parity.MIRROR;
    vertical(0, mirror);
    pencil.clearRow(3 * n);
    if (mirror) {
      slopeOfPotential(3 * n, 0);
    } else {
      add(3 * n, 3 * n, 1.0);
    }
    int last = n - 1;
    vertical(last, top == TopBoundary.LID);
    int row = 3 * n + last;
    pencil.clearRow(row);
    slopeOfPotential(row, last);
    add(row, row, Math.sqrt(waveSquared));
    add(row, 2 * n + last, top == TopBoundary.FREE ? jeans[last] : 0.0);
  }

  private void slopeOfPotential(int row, int i) {
    for (int j = 0; j < n; j++) {
      add(row, 3 * n + j, derivative[i][j]);
    }
  }

  /** Z = 0; or no Lagrangian change of the total pressure at a free surface, no change at all at a midplane that flexes. */
  private void vertical(int node, boolean rigid) {
    int row = 2 * n + node;
    pencil.clearRow(row);
    if (rigid) {
      add(row, row, 1.0);
    } else {
      totalPressure(row, node, 1.0);
    }
    if (!rigid && node > 0) {
      add(row, row, g[node]);
      add(row, 3 * n + node, jeans[node]);
    }
  }
}
