package org.archspan.modelfile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.IsothermalSheetGravity;
import org.archspan.rivals.LayerInterface;
import org.archspan.rivals.RivalInputs;
import org.archspan.rivals.StellarDisk;
import org.archspan.units.Constants;

/** Makes what other instabilities need beside the disk. */
final class RivalReader {
  private final Inputs inputs;

  RivalReader(Inputs inputs) {
    this.inputs = inputs;
  }

  RivalInputs read(List<GravityLaw> gravity) {
    OptionalDouble lag = inputs.number("rotation.lag");
    List<LayerInterface> interfaces = new ArrayList<>();
    for (int i = 1; i <= inputs.tables("interface"); i++) {
      layers("interface." + i, i).ifPresent(interfaces::add);
    }
    return new RivalInputs(stars(gravity), lag, List.copyOf(interfaces));
  }

  /** From [stars]; what is not given there from the sheet whose gravity holds the gas. */
  private Optional<StellarDisk> stars(List<GravityLaw> gravity) {
    Optional<IsothermalSheetGravity> sheet = gravity.stream().filter(IsothermalSheetGravity.class::isInstance)
        .map(IsothermalSheetGravity.class::cast).findFirst();
    if (!inputs.given("stars") && sheet.isEmpty()) {
      return Optional.empty();
    }
    String why = "the stars need it, since no gravity law isothermal-sheet gives it";
    double column = sheet.isPresent() ? inputs.number("stars.surface-density").orElse(sheet.get().surfaceDensity())
        : inputs.required("stars.surface-density", why);
    double dispersion = sheet.isPresent() ? inputs.number("stars.dispersion").orElse(sheet.get().dispersion())
        : inputs.required("stars.dispersion", why);
    double height = inputs.number("stars.height").orElseGet(() -> sheet.map(IsothermalSheetGravity::height)
        .orElse(dispersion * dispersion / (Math.PI * Constants.GRAVITATIONAL_CONSTANT * column)));
    return Optional.of(new StellarDisk(column, dispersion, height));
  }

  private Optional<LayerInterface> layers(String table, int number) {
    double below = inputs.required(table + ".density-below", "an interface needs it");
    double above = inputs.required(table + ".density-above", "an interface needs it");
    double gravity = inputs.required(table + ".gravity", "an interface needs it; 0 where there is none");
    if (Double.isNaN(below + above + gravity) || !inputs.faults().isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(new LayerInterface(inputs.text(table + ".name").orElse("interface " + number), below, above,
        inputs.number(table + ".field-below").orElse(0.0), inputs.number(table + ".field-above").orElse(0.0),
        inputs.number(table + ".shear").orElse(0.0), gravity,
        inputs.number(table + ".depth-below").orElse(Double.POSITIVE_INFINITY),
        inputs.number(table + ".depth-above").orElse(Double.POSITIVE_INFINITY)));
  }
}
