package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.LinkedHashMap;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Gas;
import org.archspan.disk.GasLayer;
import org.archspan.disk.MagneticField;
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.archspan.gravity.GravityLaw;
import org.archspan.spacing.WaveRange;
import org.archspan.units.OutputUnits;

/** What a result rests on, in words. */
public final class Assumptions {
  private Assumptions() {
  }

  private static final WaveRange ANY = new WaveRange(0.0, Double.POSITIVE_INFINITY, 0.0, OptionalDouble.empty());

  /** Subject and statement, in the order in which a paper gives them. */
  public static Map<String, String> of(Disk disk, Equilibrium equilibrium, WaveRange range,
      OutputUnits units) {
    Map<String, String> lines = new LinkedHashMap<>();
    GasState bottom = equilibrium.at(equilibrium.bottom());
    lines.put("gas", gas(disk, equilibrium, units));
    lines.put("field", field(disk, equilibrium, units));
    lines.put("cosmic rays", cosmicRays(disk.cosmicRays(), bottom));
    lines.put("gravity", gravity(disk, equilibrium));
    disk.rotation().ifPresent(rotation -> lines.put("rotation", Numbers.galacticRate(rotation.angularSpeed())
        + ", taken as rigid"));
    lines.put("domain", domain(equilibrium, units));
    lines.put("waves", waves(range, units));
    return lines;
  }

  private static String waves(WaveRange range, OutputUnits units) {
    if (range.direction().isPresent()) {
      return "in the direction " + Numbers.plain(Math.toDegrees(range.direction().getAsDouble()))
          + " degrees from the field at the lower end; their crests run at right angles to it";
    }
    return range.crossWavenumber() == 0.0 ? "along the field, uniform across it (ky = 0)"
        : "wavelength across the field " + Numbers.length(2.0 * Math.PI / range.crossWavenumber(), units);
  }

  /** A text that opens with the title and what holds for every wave. */
  static TextBlock block(String title, Disk disk, Equilibrium equilibrium, OutputUnits units, int width) {
    TextBlock block = new TextBlock(width).heading(title).heading("Assumed");
    of(disk, equilibrium, ANY, units).forEach((subject, words) -> {
      if (!subject.equals("waves")) {
        block.labelled(subject, words);
      }
    });
    return block;
  }

  /** The same for a result that leaves rotation out. */
  static TextBlock stillBlock(String title, Disk disk, Equilibrium equilibrium, OutputUnits units, int width) {
    TextBlock block = block(title, disk.withoutRotation(), equilibrium, units, width);
    disk.rotation().ifPresent(rotation -> block.labelled("rotation", "given, but not in this result; archspan spacing"
        + " solves it"));
    return block;
  }

  private static String gas(Disk disk, Equilibrium equilibrium, OutputUnits units) {
    String kind = "isothermal, " + Numbers.plain(equilibrium.dispersion() / 1e5) + " km/s";
    if (disk.gas() instanceof Gas.Components several) {
      kind = several.components().size() + " isothermal components in one potential, together "
          + Numbers.plain(equilibrium.dispersion() / 1e5) + " km/s at the lower end";
    } else if (disk.gas() instanceof Gas.Layered layered) {
      kind = layers(layered, units);
    } else if (disk.gas() instanceof Gas.Stratified prescribed) {
      kind = "prescribed stratification (" + prescribed.strata().size() + " strata), " + kind
          + (prescribed.dispersion().isPresent() ? "" : " as the force balance demands");
    }
    String cooling = disk.gasClosure().cools()
        ? ", cooling in " + Numbers.time(disk.gasClosure().coolingTime(), units) : "";
    return kind + "; adiabatic index of the perturbations " + Numbers.given(disk.gasClosure().adiabaticIndex()) + cooling;
  }

  private static String layers(Gas.Layered layered, OutputUnits units) {
    StringBuilder words = new StringBuilder(layered.layers().size() == 1 ? "one layer of " : "layers of ");
    for (int i = 0; i < layered.layers().size(); i++) {
      GasLayer layer = layered.layers().get(i);
      words.append(i == 0 ? "" : ", ").append(Numbers.plain(Math.sqrt(layer.dispersionSquared()) / 1e5)).append(" km/s")
          .append(i == 0 ? "" : " from " + Numbers.length(layer.from(), units) + " (blend "
              + Numbers.length(layer.blend(), units) + ")");
    }
    return words.toString();
  }

  private static String sheet(MagneticField.Sheet sheet, Equilibrium equilibrium, OutputUnits units) {
    GasState middle = equilibrium.at(sheet.middle());
    return (Double.isInfinite(sheet.top()) ? "fills the space above " + Numbers.length(sheet.bottom(), units)
        : "a sheet from " + Numbers.length(sheet.bottom(), units) + " to " + Numbers.length(sheet.top(), units))
        + ", edges of " + Numbers.length(sheet.edge(), units) + "; " + Numbers.given(units.field(middle.fieldStrength()))
        + " " + units.field() + " and plasma beta " + Numbers.given(middle.plasmaBeta()) + " at "
        + Numbers.length(sheet.middle(), units);
  }

  private static String field(Disk disk, Equilibrium equilibrium, OutputUnits units) {
    GasState bottom = equilibrium.at(equilibrium.bottom());
    if (bottom.magneticPerMass() == 0.0 && !(disk.field() instanceof MagneticField.Balance)) {
      return "none";
    }
    if (disk.field() instanceof MagneticField.Sheet sheet) {
      return sheet(sheet, equilibrium, units);
    }
    String strength = Numbers.given(units.field(bottom.fieldStrength())) + " " + units.field() + " at the lower end";
    if (disk.fieldTurn() != 0.0) {
      strength += ", turning by " + Numbers.plain(Math.toDegrees(disk.fieldTurn()) * units.centimetresPerLength())
          + " degrees for each " + units.length() + " of height" + (equilibrium.aboutMidplane()
              ? " on both sides of the midplane, mirror images of each other" : "");
    }
    if (disk.field() instanceof MagneticField.Balance) {
      return strength + "; at each height what the force balance leaves over";
    }
    return strength + "; magnetic over gas pressure " + Numbers.given(bottom.magneticPerMass() / bottom.gasPerMass())
        + " at every height";
  }

  private static String cosmicRays(CosmicRays cosmicRays, GasState bottom) {
    if (bottom.cosmicRayPerMass() == 0.0) {
      return "none";
    }
    CosmicRayClosure closure = cosmicRays.closure();
    String ratio = "pressure " + Numbers.given(bottom.cosmicRayPerMass() / bottom.gasPerMass()) + " of the gas's; ";
    if (Double.isInfinite(closure.diffusivity())) {
      return ratio + "they diffuse along the field at once";
    }
    return ratio + "index " + Numbers.given(closure.adiabaticIndex()) + ", diffusivity along the field "
        + Numbers.given(closure.diffusivity()) + " cm^2/s";
  }

  private static String gravity(Disk disk, Equilibrium equilibrium) {
    List<String> names = new ArrayList<>();
    for (GravityLaw law : disk.gravity()) {
      String name = law.getClass().getSimpleName().replace("Gravity", "").replaceAll("([a-z])([A-Z])", "$1-$2");
      names.add(name.toLowerCase(java.util.Locale.ROOT));
    }
    String external = names.isEmpty() ? "no external one" : "external: " + String.join(" + ", names);
    double above = Math.min(equilibrium.bottom() + equilibrium.scaleHeight(), equilibrium.top());
    return external + ownGravity(disk.selfGravity()) + "; " + Numbers.plain(equilibrium.at(above).gravity())
        + " cm/s^2 one scale height up, " + Numbers.plain(equilibrium.at(equilibrium.top()).gravity())
        + " at the top" + (disk.selfGravity() == SelfGravity.OFF ? "; the gas's own gravity is left out" : "");
  }

  private static String ownGravity(SelfGravity selfGravity) {
    return switch (selfGravity) {
      case OFF -> "";
      case EQUILIBRIUM -> ", and the gas's own in the base state alone";
      case FULL -> ", and the gas's own, in the base state and on the perturbations";
    };
  }

  private static String domain(Equilibrium equilibrium, OutputUnits units) {
    String lower = equilibrium.aboutMidplane() ? "both sides of the midplane"
        : "above a rigid floor at " + Numbers.length(equilibrium.bottom(), units);
    String upper = switch (equilibrium.topBoundary()) {
      case LID -> "a rigid lid at ";
      case FREE -> "a free surface at ";
      case OPEN -> "an open top at ";
    };
    return lower + ", up to " + upper + Numbers.length(equilibrium.top(), units);
  }
}
