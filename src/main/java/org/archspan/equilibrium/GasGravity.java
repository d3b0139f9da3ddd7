package org.archspan.equilibrium;

import java.util.Arrays;
import java.util.function.ToDoubleBiFunction;
import org.archspan.disk.RefusedModelException;
import org.archspan.gravity.GravityLaw;
import org.archspan.units.Constants;

/**
 * The gas's own gravity about the midplane: {@code dg/dz = 4 pi G rho}, {@code dPhi/dz = g}, where the density may depend on
 * this very potential. Solved upwards panel by panel: on the nodes of a panel both are integrals of the density, iterated
 * until they stand still. Immutable.
 */
final class GasGravity implements GravityLaw {
  private static final double WIDEST_EFOLDINGS = 1.0;
  private static final double GROWTH = 1.5;
  /** Gas left above the last panel, relative to the column below it. */
  private static final double NOTHING_LEFT = 1e-18;
  private static final double SETTLED = 2e-16;
  private static final int MOST_ITERATIONS = 60;
  private static final int MOST_PANELS = 4000;
  private final PanelValues acceleration;
  private final PanelValues potential;
  private final double height;

  private GasGravity(PanelValues acceleration, PanelValues potential, double bottomDensity) {
    this.acceleration = acceleration;
    this.potential = potential;
    this.height = acceleration.last() / (fourPiG() * bottomDensity);
  }

  private static double fourPiG() {
    return 4.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT;
  }

  /**
   * Solves.
   *
   * @param logDensity     ln rho (g cm^-3) at a height (cm) where the gas's own potential is given (cm^2 s^-2)
   * @param shortest       shortest length over which the density or the external gravity changes near the midplane, cm
   * @param kinks          heights that must be edges of panels, cm, ascending
   * @param greatestHeight where the density ceases to be defined, cm; may be infinite
   * @throws RefusedModelException when the gas is spread over too many lengths
   */
  static GasGravity solve(ToDoubleBiFunction<Double, Double> logDensity, double shortest, double[] kinks,
      double greatestHeight) {
    Builder builder = new Builder(logDensity, 0.25 * shortest);
    while (!builder.finished && builder.top() < greatestHeight) {
      builder.add(kinks, greatestHeight);
    }
    return builder.build();
  }

  /** Grows the solution panel by panel. */
  private static final class Builder {
    private final ToDoubleBiFunction<Double, Double> logDensity;
    private final double bottomLogDensity;
    private double[] edges = new double[64];
    private double[] acceleration = new double[64 * PanelValues.NODES];
    private double[] potential = new double[64 * PanelValues.NODES];
    private int panels;
    private double width;
    private double atPotential;
    private double atAcceleration;
    private boolean finished;

    Builder(ToDoubleBiFunction<Double, Double> logDensity, double width) {
      this.logDensity = logDensity;
      this.width = width;
      bottomLogDensity = logDensity.applyAsDouble(0.0, 0.0);
    }

    double top() {
      return edges[panels];
    }

    void add(double[] kinks, double greatestHeight) {
      makeRoom();
      double from = top();
      double to = Math.min(from + width, greatestHeight);
      for (double kink : kinks) {
        if (kink > from && kink < to) {
          to = kink;
        }
      }
      double start = logDensity.applyAsDouble(from, atPotential);
      if (!iterate(from, to)) {
        width = 0.5 * (to - from);
        return;
      }
      int last = (panels + 1) * PanelValues.NODES - 1;
      double end = logDensity.applyAsDouble(to, potential[last]);
      double fall = Math.abs(start - end);
      if (fall > WIDEST_EFOLDINGS) {
        width = 0.5 * (to - from);
        return;
      }
      atPotential = potential[last];
      atAcceleration = acceleration[last];
      edges[++panels] = to;
      double left = fourPiG() * Math.exp(end) * (to - from) / Math.max(fall, 1e-3);
      finished = start > end && left < NOTHING_LEFT * atAcceleration;
      width = GROWTH * width;
    }

    private void makeRoom() {
      if (panels + 2 < edges.length) {
        return;
      }
      if (panels > MOST_PANELS) {
        throw new RefusedModelException("the gas's own gravity cannot be resolved: lengths of the model differ too much,"
            + " or nothing confines the gas; check dispersions and densities");
      }
      edges = Arrays.copyOf(edges, 2 * edges.length);
      acceleration = Arrays.copyOf(acceleration, 2 * acceleration.length);
      potential = Arrays.copyOf(potential, 2 * potential.length);
    }

    /** Fills the next panel; whether the iteration settled. */
    private boolean iterate(double from, double to) {
      double half = 0.5 * (to - from);
      int offset = panels * PanelValues.NODES;
      double[] source = new double[PanelValues.NODES];
      for (int i = 0; i < PanelValues.NODES; i++) {
        potential[offset + i] = atPotential + atAcceleration * half * (1.0 + PanelValues.RULE.nodes()[i]);
      }
      for (int step = 0; step < MOST_ITERATIONS; step++) {
        for (int i = 0; i < PanelValues.NODES; i++) {
          source[i] = fourPiG()
              * Math.exp(logDensity.applyAsDouble(from + half * (1.0 + PanelValues.RULE.nodes()[i]), potential[offset + i]));
        }
        RunningIntegral.integrate(source, 0, half, atAcceleration, acceleration, offset);
        double before = potential[offset + PanelValues.NODES - 1];
        RunningIntegral.integrate(acceleration, offset, half, atPotential, potential, offset);
        double after = potential[offset + PanelValues.NODES - 1];
        if (step > 2 && Math.abs(after - before) <= SETTLED * Math.abs(after)) {
          return true;
        }
      }
      return false;
    }

    GasGravity build() {
      double[] all = Arrays.copyOf(edges, panels + 1);
      return new GasGravity(new PanelValues(all, Arrays.copyOf(acceleration, panels * PanelValues.NODES)),
          new PanelValues(all, Arrays.copyOf(potential, panels * PanelValues.NODES)), Math.exp(bottomLogDensity));
    }
  }

  @Override
  public double acceleration(double z) {
    return z >= acceleration.top() ? acceleration.last() : acceleration.at(z);
  }

  @Override
  public double potential(double z) {
    return z >= potential.top() ? potential.last() + acceleration.last() * (z - potential.top()) : potential.at(z);
  }

  @Override
  public double[] landmarks() {
    return new double[] {height};
  }
}
