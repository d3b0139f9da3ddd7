package org.archspan.modelfile;

import java.util.List;
import java.util.Map;
import org.archspan.disk.Disk;
import org.archspan.rivals.RivalInputs;
import org.archspan.spacing.Arm;
import org.archspan.spacing.ModelInput;
import org.archspan.spacing.SearchOptions;
import org.archspan.uncertainty.Uncertainty;
import org.archspan.units.OutputUnits;

/**
 * A model as read from a file.
 *
 * @param source        file it came from
 * @param title         as given; the file's name where there is none
 * @param disk          the physics
 * @param options       what to search
 * @param arm           the spiral arm
 * @param rivals        what other instabilities need beside the disk
 * @param units         units of results
 * @param inputs        every key with its value as given, in the order of the file
 * @param uncertainties of the inputs that have one, by key
 * @param uncertain     the same model with any values of those inputs
 * @param numbers       that enter the physics of the modes, each with the model that a change of it makes
 */
public record Model(String source, String title, Disk disk, SearchOptions options, Arm arm, RivalInputs rivals,
    OutputUnits units, Map<String, String> inputs, Map<String, Uncertainty> uncertainties, UncertainModel uncertain,
    List<ModelInput> numbers) {
}
