package org.archspan.rivals;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What other instabilities need beside the disk.
 *
 * @param stars      beside the gas; empty where none are known
 * @param lag        loss of rotation speed for each unit of height, s^-1, positive; empty where it is not known
 * @param interfaces between two layers; may be empty
 */
public record RivalInputs(Optional<StellarDisk> stars, OptionalDouble lag, List<LayerInterface> interfaces) {
}
