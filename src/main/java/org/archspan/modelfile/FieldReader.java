package org.archspan.modelfile;

import java.util.OptionalDouble;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Gas;
import org.archspan.disk.MagneticField;

/** Makes the magnetic field and the cosmic rays of a model. */
final class FieldReader {
  private final Inputs inputs;

  FieldReader(Inputs inputs) {
    this.inputs = inputs;
  }

  MagneticField field(Gas gas) {
    inputs.oneOf("field.pressure-ratio", "field.strength", "field.plasma-beta");
    if (inputs.text("field.shape").orElse("constant-ratio").equals("sheet")) {
      return sheet();
    }
    refuseOutsideSheet();
    boolean balance = inputs.text("field.shape").orElse("constant-ratio").equals("balance");
    if (gas instanceof Gas.Stratified stratified) {
      return balance(stratified, balance);
    }
    if (balance) {
      inputs.fault("field.shape", "\"balance\" without gas.stratum",
          "a field that the balance leaves over needs a prescribed stratification");
    }
    OptionalDouble strength = inputs.number("field.strength");
    if (inputs.given("field.plasma-beta")) {
      return new MagneticField.ConstantRatio(1.0 / inputs.number("field.plasma-beta").orElse(Double.NaN));
    }
    return strength.isPresent() ? new MagneticField.BottomStrength(strength.getAsDouble())
        : new MagneticField.ConstantRatio(inputs.number("field.pressure-ratio").orElse(0.0));
  }

  private MagneticField sheet() {
    inputs.exactlyOneOf("field.pressure-ratio", "field.strength", "field.plasma-beta");
    double bottom = inputs.required("field.bottom", "a flux sheet begins somewhere");
    double top = inputs.number("field.top").orElse(Double.POSITIVE_INFINITY);
    double edge = inputs.required("field.edge", "the half-width of the edges of a flux sheet");
    if (!(top - bottom >= 2.0 * edge) && inputs.valid("field.top") && inputs.valid("field.bottom")) {
      inputs.fault("field.top", "found " + inputs.shown("field.top"),
          "a flux sheet must be at least two edges (field.edge) thick");
    }
    OptionalDouble beta = inputs.number("field.plasma-beta");
    OptionalDouble ratio = beta.isPresent() ? OptionalDouble.of(1.0 / beta.getAsDouble())
        : inputs.number("field.pressure-ratio");
    return new MagneticField.Sheet(bottom, top, edge, ratio, inputs.number("field.strength"));
  }

  private void refuseOutsideSheet() {
    for (String key : new String[] {"field.bottom", "field.top", "field.edge"}) {
      if (inputs.given(key)) {
        inputs.fault(key, "given without field.shape = \"sheet\"", "set the shape, or remove it");
      }
    }
  }

  private MagneticField balance(Gas.Stratified gas, boolean shapeIsBalance) {
    if (!shapeIsBalance) {
      String allowed = "with gas.stratum the field follows from the balance: set field.shape = \"balance\"";
      if (inputs.given("field.shape")) {
        inputs.fault("field.shape", "found " + inputs.shown("field.shape"), allowed);
      } else {
        inputs.missing("field.shape", allowed);
      }
    }
    for (String key : new String[] {"field.pressure-ratio", "field.plasma-beta"}) {
      if (inputs.given(key)) {
        inputs.fault(key, "given beside gas.stratum", "the balance decides the ratio; remove it");
      }
    }
    if (gas.dispersion().isPresent() == inputs.given("field.strength")) {
      String allowed = "with gas.stratum give exactly one of gas.dispersion and field.strength; the other follows";
      if (inputs.given("field.strength")) {
        inputs.fault("field.strength", "given beside gas.dispersion", allowed);
      } else {
        inputs.missing("field.strength", allowed);
      }
    }
    return new MagneticField.Balance(inputs.number("field.strength"));
  }

  /** Rate at which the field turns with height, rad cm^-1. */
  double turn() {
    return inputs.number("field.turn").orElse(0.0);
  }

  CosmicRays cosmicRays() {
    inputs.oneOf("cosmic-rays.pressure-ratio", "cosmic-rays.pressure");
    CosmicRayClosure closure = new CosmicRayClosure(inputs.number("cosmic-rays.adiabatic-index").orElse(4.0 / 3.0),
        inputs.number("cosmic-rays.diffusivity").orElse(Double.POSITIVE_INFINITY));
    OptionalDouble pressure = inputs.number("cosmic-rays.pressure");
    return pressure.isPresent() ? new CosmicRays.BottomPressure(pressure.getAsDouble(), closure)
        : new CosmicRays.PressureRatio(inputs.number("cosmic-rays.pressure-ratio").orElse(0.0), closure);
  }
}
