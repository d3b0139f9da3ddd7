package org.archspan.equilibrium;

import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.archspan.disk.RefusedModelException;

/**
 * An atmosphere whose temperature and magnetic ratio are given functions of height. With the support
 * {@code S = 1 + alpha + beta} the total pressure follows {@code d ln(P)/dz = -g/(S c^2)}, and
 * {@code rho = P/(S c^2)}: the density may rise with height where the gas cools or the field ends. The integral is taken once,
 * on panels that are as narrow as the changes of the profiles. Immutable.
 */
final class ProfileStratification implements Stratification {
  private static final double FAR_EFOLDINGS = 45.0;
  /** A panel spans at most so many scale heights, and this share of its distance from a bend, or the width of that. */
  private static final double WIDEST_EFOLDINGS = 1.0;
  private static final double SHARE_OF_DISTANCE = 0.5;
  private static final int MOST_PANELS = 20_000;
  private final HeightProfile dispersionSquared;
  private final HeightProfile magneticRatio;
  private final double cosmicRayRatio;
  private final ExternalGravity gravity;
  private final double[] edges;
  private final PanelValues logPressure;

  /**
   * Integrates the balance upwards.
   *
   * @param bottomDensity at the lower end, g cm^-3
   * @param bottom        lower end, cm
   */
  ProfileStratification(HeightProfile dispersionSquared, HeightProfile magneticRatio, double cosmicRayRatio,
      ExternalGravity gravity, double bottomDensity, double bottom) {
    this.dispersionSquared = dispersionSquared;
    this.magneticRatio = magneticRatio;
    this.cosmicRayRatio = cosmicRayRatio;
    this.gravity = gravity;
    edges = edges(bottom);
    double[] integral = new double[(edges.length - 1) * PanelValues.NODES];
    double[] fall = new double[PanelValues.NODES];
    double start = Math.log(bottomDensity * perMass(bottom));
    for (int panel = 0; panel + 1 < edges.length; panel++) {
      for (int i = 0; i < fall.length; i++) {
        double z = PanelValues.node(edges, panel, i);
        fall[i] = -gravity.acceleration(z) / perMass(z);
      }
      int offset = panel * PanelValues.NODES;
      RunningIntegral.integrate(fall, 0, 0.5 * (edges[panel + 1] - edges[panel]), start, integral, offset);
      start = integral[offset + PanelValues.NODES - 1];
    }
    logPressure = new PanelValues(edges, integral);
  }

  private double[] edges(double bottom) {
    double[] found = new double[64];
    int count = 1;
    found[0] = bottom;
    double fallen = 0.0;
    List<HeightProfile.Bend> bends = bends();
    double last = bends.stream().mapToDouble(HeightProfile.Bend::height).max().orElse(bottom);
    while ((fallen < FAR_EFOLDINGS || found[count - 1] < last) && found[count - 1] < greatestHeight()) {
      double z = found[count - 1];
      double fold = perMass(z) / Math.max(gravity.acceleration(z), 1e-300);
      double next = Math.min(next(z, WIDEST_EFOLDINGS * fold, bends, bottom), greatestHeight());
      if (count > MOST_PANELS) {
        throw new RefusedModelException("lengths of the model differ too much: more than " + MOST_PANELS
            + " steps would be needed to resolve blends and edges; widen them, or lower the atmosphere");
      }
      fallen += (next - z) * gravity.acceleration(next) / perMass(next);
      found = count == found.length ? Arrays.copyOf(found, 2 * count) : found;
      found[count++] = next;
    }
    return Arrays.copyOf(found, count);
  }

  private double next(double z, double widest, List<HeightProfile.Bend> bends, double bottom) {
    double width = widest;
    for (HeightProfile.Bend bend : bends) {
      width = Math.min(width, Math.max(bend.width(), SHARE_OF_DISTANCE * (Math.abs(z - bend.height()) - bend.reach())));
    }
    for (double landmark : gravity.landmarks()) {
      width = Math.min(width, Math.max(0.5 * landmark, SHARE_OF_DISTANCE * (z - bottom)));
    }
    double next = z + width;
    for (double kink : gravity.kinks()) {
      if (kink > z && kink < next) {
        next = kink;
      }
    }
    return next;
  }

  private List<HeightProfile.Bend> bends() {
    return Stream.of(dispersionSquared, magneticRatio).flatMap(profile -> profile.bends().stream()).toList();
  }

  /** Total pressure over density, cm^2 s^-2. */
  private double perMass(double z) {
    return (1.0 + magneticRatio.value(z) + cosmicRayRatio) * dispersionSquared.value(z);
  }

  private double logPressure(double z) {
    double top = logPressure.top();
    return z >= top ? logPressure.last() - (gravity.potential(z) - gravity.potential(top)) / perMass(top)
        : logPressure.at(z);
  }

  @Override
  public GasState at(double z) {
    double square = dispersionSquared.value(z);
    double ratio = magneticRatio.value(z);
    double support = 1.0 + ratio + cosmicRayRatio;
    double g = gravity.acceleration(z);
    double slope = -g / (support * square) - dispersionSquared.slope(z) / square - magneticRatio.slope(z) / support;
    return new GasState(logDensity(z), slope, g, square, ratio * square, cosmicRayRatio * square);
  }

  @Override
  public double logDensity(double z) {
    return logPressure(z) - Math.log(perMass(z));
  }

  @Override
  public double columnAbove(double bottom) {
    double sum = 0.0;
    for (int panel = edges.length - 2; panel >= 0; panel--) {
      sum += HeightPanels.integrate(z -> Math.exp(logDensity(z)), edges[panel], edges[panel + 1]);
    }
    return sum;
  }

  @Override
  public double[] landmarks() {
    return gravity.landmarks();
  }

  /** Where a mesh must put edges so that no change slips through between its nodes. */
  @Override
  public double[] kinks() {
    DoubleStream around = bends().stream().flatMapToDouble(bend -> DoubleStream.of(
        bend.height() - bend.reach() - bend.width(), bend.height(), bend.height() + bend.reach() + bend.width()));
    return DoubleStream.concat(around, Arrays.stream(gravity.kinks())).sorted().distinct().toArray();
  }

  @Override
  public double greatestHeight() {
    return gravity.greatestHeight();
  }
}
