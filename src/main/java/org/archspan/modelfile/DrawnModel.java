package org.archspan.modelfile;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.archspan.disk.Disk;
import org.archspan.disk.Gas;
import org.archspan.disk.RefusedModelException;
import org.archspan.gravity.GravityLaw;
import org.archspan.spacing.Arm;
import org.archspan.spacing.SearchOptions;

/**
 * What the values of a model make.
 *
 * @param disk    the physics
 * @param options what to search
 * @param arm     the spiral arm
 */
public record DrawnModel(Disk disk, SearchOptions options, Arm arm) {
  /**
   * From inputs without faults so far.
   *
   * @param gravity the laws where they are known already; empty to make them
   * @throws RefusedModelException when they do not make a model
   */
  static DrawnModel of(Inputs inputs, Path folder, List<GravityLaw> gravity, double tolerance) {
    try {
      DrawnModel model =
          of(inputs, gravity.isEmpty() ? new GravityReader(inputs, folder).laws() : gravity, tolerance);
      if (inputs.faults().isEmpty()) {
        return model;
      }
    } catch (UnreadableFileException gone) {
      throw new RefusedModelException(gone.getMessage());
    }
    throw new RefusedModelException(
        inputs.faults().stream().map(Diagnostic::toString).collect(Collectors.joining("; ")));
  }

  static DrawnModel of(Inputs inputs, List<GravityLaw> gravity, double tolerance) {
    GasReader gasReader = new GasReader(inputs);
    Gas gas = gasReader.gas();
    FieldReader fieldReader = new FieldReader(inputs);
    SurroundingsReader surroundings = new SurroundingsReader(inputs);
    Arm arm = surroundings.arm();
    Disk disk = new Disk(gas, gasReader.closure(), gasReader.selfGravity(), fieldReader.field(gas),
        fieldReader.turn(), fieldReader.cosmicRays(), gravity, surroundings.rotation(), surroundings.domain());
    return new DrawnModel(disk, surroundings.options(arm, tolerance), arm);
  }
}
