package org.archspan.modelfile;

import java.util.List;
import org.archspan.disk.Disk;
import org.archspan.disk.Gas;
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
