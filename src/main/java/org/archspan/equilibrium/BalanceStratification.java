package org.archspan.equilibrium;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import org.archspan.mesh.Mesh;

/**
 * A prescribed density of isothermal gas in a given gravity; the field is what the balance leaves over:
 * {@code p_B = Integral_z^infinity rho g dz - (1 + beta) c^2 rho}.
 *
 * <p>The total pressure per mass is integrated downwards once, with positive terms only, and interpolated on panels.
 */
final class BalanceStratification implements Stratification {

  private final StratumSum strata;
  private final ExternalGravity gravity;
  private final PanelValues pressurePerMass;
  private final double dispersionSquared;
  private final double cosmicRayRatio;

  private BalanceStratification(StratumSum strata, ExternalGravity gravity, PanelValues pressurePerMass,
      double dispersionSquared, double cosmicRayRatio) {
    this.strata = strata;
    this.gravity = gravity;
    this.pressurePerMass = pressurePerMass;
    this.dispersionSquared = dispersionSquared;
    this.cosmicRayRatio = cosmicRayRatio;
  }

  /** Integrates the total pressure; the split into gas, field and cosmic rays follows by {@link #split}. */
  static BalanceStratification integrate(StratumSum strata, ExternalGravity gravity, double bottom) {
    HeightPanels panels = HeightPanels.of(strata::logDensity, bottom, landmarks(strata, gravity), gravity.kinks(),
        gravity.greatestHeight());
    // halves: interpolation over whole panels leaves the slope of the pressure, hence the balance, wrong by 3e-10
    double[] edges = new Mesh(panels.edges(), PanelValues.RULE.degree()).halved().edges();
    int n = PanelValues.NODES;
    double[] perMass = new double[(edges.length - 1) * n];
    double far = edges[edges.length - 1];
    double above = gravity.acceleration(far) / -strata.logDensityGradient(far);
    double end = far;
    double endDensity = strata.logDensity(far);
    for (int panel = edges.length - 2; panel >= 0; panel--) {
      for (int i = n - 1; i >= 0; i--) {
        double z = PanelValues.node(edges, panel, i);
        double here = strata.logDensity(z);
        above = above * Math.exp(endDensity - here) + HeightPanels.integrateShort(
            y -> Math.exp(strata.logDensity(y) - here) * gravity.acceleration(y), z, end);
        perMass[panel * n + i] = above;
        end = z;
        endDensity = here;
      }
    }
    return new BalanceStratification(strata, gravity, new PanelValues(edges, perMass), 0.0, 0.0);
  }

  /** The same total pressure with an isothermal gas of c^2 (cm^2 s^-2) and cosmic rays in the ratio beta. */
  BalanceStratification split(double newDispersionSquared, double newCosmicRayRatio) {
    return new BalanceStratification(strata, gravity, pressurePerMass, newDispersionSquared,
        newCosmicRayRatio);
  }

  /** Total pressure over density, cm^2 s^-2. */
  double totalPerMass(double height) {
    return height >= pressurePerMass.top() ? gravity.acceleration(height) / -strata.logDensityGradient(height)
        : pressurePerMass.at(height);
  }

  @Override
  public GasState at(double height) {
    double magnetic = totalPerMass(height) - (1.0 + cosmicRayRatio) * dispersionSquared;
    return new GasState(strata.logDensity(height), strata.logDensityGradient(height), gravity.acceleration(height),
        dispersionSquared, magnetic, cosmicRayRatio * dispersionSquared);
  }

  @Override
  public double logDensity(double height) {
    return strata.logDensity(height);
  }

  @Override
  public double[] landmarks() {
    return landmarks(strata, gravity);
  }

  private static double[] landmarks(StratumSum strata, ExternalGravity gravity) {
    return DoubleStream.concat(Arrays.stream(strata.landmarks()), Arrays.stream(gravity.landmarks()))
        .sorted().distinct().toArray();
  }

  @Override
  public double[] kinks() {
    return gravity.kinks();
  }

  @Override
  public double greatestHeight() {
    return gravity.greatestHeight();
  }
}
