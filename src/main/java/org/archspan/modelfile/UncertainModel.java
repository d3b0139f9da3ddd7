package org.archspan.modelfile;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.archspan.disk.RefusedModelException;
import org.archspan.gravity.GravityLaw;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.uncertainty.Uncertainty;
import org.archspan.units.UnitException;
import org.archspan.units.UnitParser;

/**
 * A model that was read once, with any values of its uncertain inputs; some ten microseconds each. Safe for several
 * threads.
 */
public final class UncertainModel {
  private final Inputs inputs;
  private final Path folder;
  private final List<GravityLaw> gravity;
  private final double tolerance;
  private final List<String> keys;
  private final boolean gravityVaries;

  UncertainModel(Inputs inputs, Path folder, List<GravityLaw> gravity, double tolerance) {
    this.inputs = inputs;
    this.folder = folder;
    this.gravity = gravity;
    this.tolerance = tolerance;
    keys = List.copyOf(inputs.uncertainties().keySet());
    gravityVaries = keys.stream().anyMatch(key -> key.startsWith("gravity."));
  }

  /**
   * The uncertain inputs in the order of the file, each in the unit in which `check --keys` lists it.
   *
   * @throws RefusedModelException when one of them cannot be drawn
   */
  public List<UncertainInput> inputs() {
    if (keys.contains("gas.mass-per-hydrogen")) {
      throw new RefusedModelException("gas.mass-per-hydrogen cannot be uncertain in an ensemble: it turns densities"
          + " of nuclei into densities of mass when the model is read; give the density its own uncertainty");
    }
    List<UncertainInput> list = new ArrayList<>();
    for (Map.Entry<String, Uncertainty> entry : inputs.uncertainties().entrySet()) {
      KeySpec spec = Schema.of(entry.getKey()).orElseThrow();
      // densities of nuclei have become mass densities
      String unit = spec.kind() == KeySpec.Kind.DENSITY ? "g/cm^3" : spec.unit();
      try {
        list.add(new UncertainInput(entry.getKey(), entry.getValue(), unit,
            unit.isEmpty() ? 1.0 : UnitParser.parse(unit).factor()));
      } catch (UnitException impossible) {
        throw new IllegalStateException("the unit of " + entry.getKey() + " in the list of keys is not one",
            impossible);
      }
    }
    return List.copyOf(list);
  }

  /**
   * The model with these values.
   *
   * @param values one for each of {@link #inputs()}, CGS
   * @throws RefusedModelException when they do not make a model
   */
  public DrawnModel with(double[] values) {
    return DrawnModel.of(inputs.with(keys, values), folder, gravityVaries ? List.of() : gravity, tolerance);
  }
}
