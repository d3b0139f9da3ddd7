package org.archspan.equilibrium;

import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.archspan.disk.Disk;
import org.archspan.disk.Gas;
import org.archspan.disk.GasLayer;
import org.archspan.disk.MagneticField;
import org.archspan.disk.RefusedModelException;
import org.archspan.disk.SelfGravity;

/** Builds atmospheres of layers and fields confined to a sheet. */
final class LayeredBuild {
  /** A sheet with less gas than this leaves is called empty. */
  private static final double STRONGEST_RATIO = 1e4;
  private static final double WEAKEST_RATIO = 1e-12;
  private final Disk disk;
  private final ExternalGravity gravity;
  private final double bottom;
  private final LayerBlend layers;

  private LayeredBuild(Disk disk, ExternalGravity gravity, double bottom) {
    this.disk = disk;
    this.gravity = gravity;
    this.bottom = bottom;
    this.layers = layers(disk.gas());
  }

  /** Whether a disk needs it. */
  static boolean suits(Disk disk) {
    return disk.gas() instanceof Gas.Layered || disk.field() instanceof MagneticField.Sheet;
  }

  /**
   * The state.
   *
   * @throws RefusedModelException when there is none
   */
  static ProfileStratification build(Disk disk, ExternalGravity gravity, double bottom) {
    refuse(disk.selfGravity() != SelfGravity.OFF, "gas.self-gravity is solved for isothermal gas and prescribed strata"
        + " only; with layers or a flux sheet set it to \"off\"");
    refuse(disk.gasClosure().cools() && disk.gas() instanceof Gas.Layered, "gas.cooling-time needs an isothermal base"
        + " state; in an atmosphere of layers remove it");
    return new LayeredBuild(disk, gravity, bottom).build();
  }

  private static void refuse(boolean impossible, String message) {
    if (impossible) {
      throw new RefusedModelException(message);
    }
  }

  private static LayerBlend layers(Gas gas) {
    if (gas instanceof Gas.Layered layered) {
      return new LayerBlend(layered.layers());
    }
    if (gas instanceof Gas.Isothermal isothermal) {
      double square = isothermal.dispersion() * isothermal.dispersion();
      return new LayerBlend(List.of(new GasLayer(0.0, square, 1.0)));
    }
    throw new RefusedModelException("field.shape = \"sheet\" needs an isothermal gas or gas.layer, not components or"
        + " strata");
  }

  private ProfileStratification build() {
    double column = surfaceDensity();
    if (Double.isNaN(column)) {
      return withDensity(bottomDensity());
    }
    double sides = disk.domain().aboutMidplane() ? 2.0 : 1.0;
    double guess = column / (sides * withoutField(1.0).columnAbove(bottom));
    double density = MidplaneDensity.forSurfaceDensity(column, this::withDensity, bottom, disk.domain().aboutMidplane(),
        layers.value(bottom), guess);
    return withDensity(density);
  }

  private double bottomDensity() {
    return disk.gas() instanceof Gas.Layered layered ? layered.bottomDensity().orElse(Double.NaN)
        : ((Gas.Isothermal) disk.gas()).bottomDensity().orElse(Double.NaN);
  }

  private double surfaceDensity() {
    return disk.gas() instanceof Gas.Layered layered ? layered.surfaceDensity().orElse(Double.NaN)
        : ((Gas.Isothermal) disk.gas()).surfaceDensity().orElse(Double.NaN);
  }

  private ProfileStratification withDensity(double density) {
    double gasPressure = density * layers.value(bottom);
    double cosmicRays = EquilibriumBuilder.cosmicRayRatio(disk.cosmicRays(), gasPressure);
    if (disk.field() instanceof MagneticField.Sheet sheet) {
      double ratio = sheet.pressureRatio().orElseGet(() -> ratio(sheet, density, cosmicRays));
      return state(new SheetProfile(ratio, sheet), density, cosmicRays);
    }
    return state(new HeightProfile.Constant(EquilibriumBuilder.magneticRatio(disk.field(), gasPressure)), density,
        cosmicRays);
  }

  private ProfileStratification withoutField(double density) {
    return state(new HeightProfile.Constant(0.0), density, 0.0);
  }

  private ProfileStratification state(HeightProfile magneticRatio, double density, double cosmicRays) {
    return new ProfileStratification(layers, magneticRatio, cosmicRays, gravity, density, bottom);
  }

  /** The ratio that gives the sheet its strength; a stronger sheet holds less gas. */
  private double ratio(MagneticField.Sheet sheet, double density, double cosmicRays) {
    double strength = sheet.strength().orElseThrow();
    double wanted = strength * strength / (8.0 * Math.PI);
    double most = pressure(sheet, STRONGEST_RATIO, density, cosmicRays);
    refuse(!(wanted < most), String.format(Locale.ROOT, "a field of %.4g G leaves no gas pressure in the sheet: at %s"
        + " the weight above is only %.4g erg/cm^3, which a field of %.4g G would carry alone; lower field.strength or the"
        + " sheet", strength, EquilibriumBuilder.words(sheet.middle()), most, Math.sqrt(8.0 * Math.PI * most)));
    double logarithm = new BrentSolver(1e-14, 1e-14).solve(200,
        x -> Math.log(pressure(sheet, Math.exp(x), density, cosmicRays) / wanted), Math.log(WEAKEST_RATIO),
        Math.log(STRONGEST_RATIO));
    return Math.exp(logarithm);
  }

  private double pressure(MagneticField.Sheet sheet, double ratio, double density, double cosmicRays) {
    return state(new SheetProfile(ratio, sheet), density, cosmicRays).at(sheet.middle()).magneticPressure();
  }

  /** Refuses layers and sheets that do not lie in the domain. */
  static void requireInside(Disk disk, double bottom, double top) {
    if (disk.gas() instanceof Gas.Layered layered) {
      for (GasLayer layer : layered.layers().subList(1, layered.layers().size())) {
        refuse(!(layer.from() > bottom && layer.from() < top), "a layer begins at "
            + EquilibriumBuilder.words(layer.from()) + ", outside the domain from "
            + EquilibriumBuilder.words(bottom) + " to " + EquilibriumBuilder.words(top)
            + "; change gas.layer.from or domain.top");
      }
    }
    if (disk.field() instanceof MagneticField.Sheet sheet) {
      boolean inside = sheet.bottom() >= bottom && sheet.bottom() < top
          && (sheet.top() <= top || Double.isInfinite(sheet.top()));
      refuse(!inside, "the flux sheet from " + EquilibriumBuilder.words(sheet.bottom()) + " to "
          + EquilibriumBuilder.words(sheet.top()) + " does not lie in the domain from "
          + EquilibriumBuilder.words(bottom) + " to " + EquilibriumBuilder.words(top)
          + "; change field.bottom, field.top or domain.top");
    }
  }
}
