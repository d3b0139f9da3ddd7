package org.archspan.modelfile;

import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.archspan.disk.Height;
import org.archspan.gravity.GravityLaw;
import org.archspan.spacing.ModelInput;

/** The numbers of a model that enter the physics of its modes, each with the model that a change of it makes. */
final class ModelInputs {
  private static final Set<String> TABLES = Set.of("gas", "field", "cosmic-rays", "gravity", "domain");
  private static final String ACROSS = "waves.cross-wavelength";
  private final Inputs inputs;
  private final Path folder;
  private final List<GravityLaw> gravity;
  private final double tolerance;

  ModelInputs(Inputs inputs, Path folder, List<GravityLaw> gravity, double tolerance) {
    this.inputs = inputs;
    this.folder = folder;
    this.gravity = gravity;
    this.tolerance = tolerance;
  }

  /** Numbers that are finite and not 0, in the order of the file. */
  List<ModelInput> list() {
    return inputs.numericKeys().stream().filter(this::counts)
        .map(key -> new ModelInput(key, factor -> scaled(key, factor))).toList();
  }

  private boolean counts(String key) {
    double value = inputs.height(key).map(Height::value).orElseGet(() -> inputs.number(key).orElse(Double.NaN));
    boolean armAcross = key.equals("arm.width") && inputs.text(ACROSS).isPresent();
    // the mass of a nucleus has become part of the densities when they were read
    return (TABLES.contains(key.split("\\.", 2)[0]) || key.equals(ACROSS) || armAcross) && !HydrogenMass.decidedBy(key)
        && value != 0.0 && Double.isFinite(value);
  }

  private ModelInput.Scaled scaled(String key, double factor) {
    DrawnModel model = DrawnModel.of(inputs.scaled(key, factor), folder,
        key.startsWith("gravity.") ? List.of() : gravity, tolerance);
    return new ModelInput.Scaled(model.disk(), model.options());
  }
}
