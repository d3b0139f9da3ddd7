package org.archspan.modelfile;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import org.archspan.closure.GasClosure;
import org.archspan.disk.Gas;
import org.archspan.disk.GasComponent;
import org.archspan.disk.GasStratum;
import org.archspan.disk.SelfGravity;
import org.archspan.units.Constants;

/** Makes the gas of a model. */
final class GasReader {
  private static final String COMPONENT = "gas.component";
  private static final String STRATUM = "gas.stratum";
  private final Inputs inputs;

  GasReader(Inputs inputs) {
    this.inputs = inputs;
  }

  GasClosure closure() {
    double index = inputs.number("gas.adiabatic-index").orElse(1.0);
    double coolingTime = inputs.number("gas.cooling-time").orElse(Double.POSITIVE_INFINITY);
    if (Double.isFinite(coolingTime) && index < 1.0) {
      inputs.fault("gas.cooling-time", "given with gas.adiabatic-index " + index,
          "a gas that cools needs an adiabatic index of at least 1");
      return new GasClosure(index);
    }
    return new GasClosure(index, coolingTime);
  }

  SelfGravity selfGravity() {
    return inputs.text("gas.self-gravity").map(word -> SelfGravity.valueOf(word.toUpperCase(Locale.ROOT)))
        .orElse(SelfGravity.OFF);
  }

  Gas gas() {
    int components = inputs.tables(COMPONENT);
    int strata = inputs.tables(STRATUM);
    if (components > 0 && strata > 0) {
      inputs.fault(STRATUM + ".1", "given beside " + COMPONENT, "give either components or strata");
    }
    if (strata > 0) {
      return stratified(strata);
    }
    if (components > 0) {
      refuseBeside(COMPONENT, "gas.dispersion", "gas.temperature", "gas.midplane-density", "gas.surface-density");
      return components(components);
    }
    return isothermal();
  }

  private void refuseBeside(String array, String... keys) {
    for (String key : keys) {
      if (inputs.given(key)) {
        inputs.fault(key, "given beside " + array, "remove one of them");
      }
    }
  }

  private Gas isothermal() {
    double dispersion = dispersion(true).orElse(Double.NaN);
    inputs.exactlyOneOf("gas.midplane-density", "gas.surface-density");
    return new Gas.Isothermal(dispersion, inputs.number("gas.midplane-density"),
        inputs.number("gas.surface-density"));
  }

  /** From the dispersion, or from temperature and mean molecular weight: c^2 = k T/(mu m_u). */
  private OptionalDouble dispersion(boolean needed) {
    if (needed) {
      inputs.exactlyOneOf("gas.dispersion", "gas.temperature");
    } else {
      inputs.oneOf("gas.dispersion", "gas.temperature");
    }
    if (!inputs.given("gas.temperature") && inputs.given("gas.mean-molecular-weight")) {
      inputs.fault("gas.mean-molecular-weight", "given without gas.temperature", "remove it, or give a temperature");
    }
    if (inputs.given("gas.dispersion") || !inputs.given("gas.temperature")) {
      return inputs.number("gas.dispersion");
    }
    double weight = inputs.required("gas.mean-molecular-weight",
        "a temperature becomes a speed only with gas.mean-molecular-weight");
    OptionalDouble temperature = inputs.number("gas.temperature");
    return temperature.isPresent() ? OptionalDouble.of(Math.sqrt(
        Constants.BOLTZMANN_CONSTANT * temperature.getAsDouble() / (weight * Constants.ATOMIC_MASS)))
        : OptionalDouble.empty();
  }

  private Gas components(int count) {
    List<GasComponent> components = new ArrayList<>();
    for (int i = 1; i <= count; i++) {
      String table = COMPONENT + "." + i;
      components.add(new GasComponent(inputs.text(table + ".name").orElse("component " + i),
          inputs.required(table + ".dispersion", "each component needs one"),
          inputs.required(table + ".midplane-density", "each component needs one")));
    }
    return new Gas.Components(List.copyOf(components));
  }

  private Gas stratified(int count) {
    refuseBeside(STRATUM, "gas.midplane-density", "gas.surface-density");
    List<GasStratum> strata = new ArrayList<>();
    for (int i = 1; i <= count; i++) {
      String table = STRATUM + "." + i;
      if (!inputs.given(table + ".shape")) {
        inputs.missing(table + ".shape", "each stratum needs one");
      }
      String shape = inputs.text(table + ".shape").orElse("gaussian").toUpperCase(Locale.ROOT);
      strata.add(new GasStratum(GasStratum.Shape.valueOf(shape),
          inputs.required(table + ".midplane-density", "each stratum needs one"),
          inputs.required(table + ".height", "each stratum needs one")));
    }
    return new Gas.Stratified(List.copyOf(strata), dispersion(false));
  }
}
