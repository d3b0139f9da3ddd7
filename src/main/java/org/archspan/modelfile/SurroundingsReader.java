package org.archspan.modelfile;

import java.util.EnumSet;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.Domain;
import org.archspan.disk.Height;
import org.archspan.disk.Rotation;
import org.archspan.spacing.Arm;
import org.archspan.spacing.SearchOptions;
import org.archspan.units.OutputUnits;
import org.archspan.units.UnitException;

/** Makes the domain, the waves to search, the arm and the units of results. */
final class SurroundingsReader {
  private final Inputs inputs;

  SurroundingsReader(Inputs inputs) {
    this.inputs = inputs;
  }

  Domain domain() {
    Optional<Height> floor = inputs.height("domain.bottom");
    if (floor.filter(Height::inScaleHeights).isPresent()) {
      inputs.fault("domain.bottom", "found " + inputs.shown("domain.bottom"),
          "scale heights are counted from the density on the floor; give a length");
    }
    Optional<Height> top = inputs.height("domain.top");
    inOrder("domain.bottom", floor, "domain.top", top);
    return new Domain(floor, top,
        inputs.text("domain.top-boundary").map(word -> TopBoundary.valueOf(word.toUpperCase(Locale.ROOT))));
  }

  /** Notes a fault when two lengths that can be compared stand in the wrong order. */
  private void inOrder(String lowerKey, Optional<Height> lower, String upperKey, Optional<Height> upper) {
    if (lower.isPresent() && upper.isPresent() && lower.get().inScaleHeights() == upper.get().inScaleHeights()
        && !(lower.get().value() < upper.get().value())) {
      inputs.fault(upperKey, "found " + inputs.shown(upperKey), "it must exceed " + lowerKey + ", "
          + inputs.shown(lowerKey));
    }
  }

  Arm arm() {
    return new Arm(inputs.number("arm.width"), inputs.number("arm.crossing-time"));
  }

  SearchOptions options(Arm arm, double tolerance) {
    SearchOptions standard = SearchOptions.defaults();
    Set<Parity> parities = inputs.text("waves.parity").filter(word -> !word.equals("both"))
        .<Set<Parity>>map(word -> EnumSet.of(Parity.valueOf(word.toUpperCase(Locale.ROOT))))
        .orElse(standard.parities());
    inOrder("waves.shortest", inputs.height("waves.shortest"), "waves.longest", inputs.height("waves.longest"));
    return new SearchOptions(crossWavelength(arm), parities, inputs.height("waves.shortest"),
        inputs.height("waves.longest"), inputs.number("waves.direction"), gatheringHeight(standard),
        tolerance, (int) inputs.number("waves.branches").orElse(standard.branches()));
  }

  /** Above a floor there is no midplane whose gas a mode must gather, unless a height is asked for. */
  private Height gatheringHeight(SearchOptions standard) {
    Height unasked = inputs.height("domain.bottom").isPresent() ? Height.centimetres(Double.POSITIVE_INFINITY)
        : standard.gatheringHeight();
    return inputs.height("waves.gathering-height").orElse(unasked);
  }

  private Optional<Height> crossWavelength(Arm arm) {
    String key = "waves.cross-wavelength";
    if (!inputs.text(key).filter(word -> word.equals("arm-width")).isPresent()) {
      return inputs.height(key);
    }
    if (arm.width().isEmpty()) {
      inputs.missing("arm.width", "waves.cross-wavelength = \"arm-width\" needs it");
      return Optional.empty();
    }
    return Optional.of(Height.centimetres(2.0 * arm.width().getAsDouble()));
  }

  OutputUnits units() {
    OutputUnits standard = OutputUnits.galactic();
    String length = inputs.text("output.length").orElse(standard.length());
    String time = inputs.text("output.time").orElse(standard.time());
    try {
      return OutputUnits.of(length, time);
    } catch (UnitException fault) {
      inputs.fault(inputs.given("output.length") ? "output.length" : "output.time", fault.getMessage(),
          "units such as pc, kpc, Mm and Myr, s are allowed");
      return standard;
    }
  }

  Optional<Rotation> rotation() {
    if (!inputs.given("rotation")) {
      return Optional.empty();
    }
    return Optional.of(new Rotation(inputs.required("rotation.angular-speed", "rotation needs it"),
        inputs.number("rotation.epicyclic-frequency")));
  }
}
