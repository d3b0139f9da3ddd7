package org.archspan.equilibrium;

import java.util.List;
import org.archspan.disk.MagneticField;

/**
 * Magnetic over gas pressure of a flux sheet:
 * {@code (ratio/4) [1 + tanh((z - bottom)/edge)] [1 - tanh((z - top)/edge)]}. A sheet without a top fills a half-space.
 *
 * @param ratio inside, dimensionless, not negative
 */
record SheetProfile(double ratio, MagneticField.Sheet sheet) implements HeightProfile {
  @Override
  public double value(double height) {
    return ratio * rise(height) * fall(height);
  }

  private double rise(double height) {
    return 0.5 * (1.0 + Math.tanh((height - sheet.bottom()) / sheet.edge()));
  }

  private double fall(double height) {
    return 0.5 * (1.0 - Math.tanh((height - sheet.top()) / sheet.edge()));
  }

  @Override
  public double slope(double height) {
    double atBottom = 1.0 / Math.cosh((height - sheet.bottom()) / sheet.edge());
    double atTop = 1.0 / Math.cosh((height - sheet.top()) / sheet.edge());
    return 0.5 * ratio / sheet.edge() * (atBottom * atBottom * fall(height) - rise(height) * atTop * atTop);
  }

  @Override
  public List<Bend> bends() {
    Bend lower = Bend.ofFactor(sheet.bottom(), sheet.edge(), 1.0 + ratio);
    return Double.isInfinite(sheet.top()) ? List.of(lower) : List.of(lower, Bend.ofFactor(sheet.top(), sheet.edge(), 1.0 + ratio));
  }
}
