package org.archspan.disk;

import java.util.List;
import org.archspan.closure.GasClosure;
import org.archspan.gravity.GravityLaw;

/**
 * The physical model, in CGS-Gaussian units: everything that decides the equilibrium and its modes.
 *
 * @param gas        the gas
 * @param gasClosure how it answers compression
 * @param field      the magnetic field
 * @param cosmicRays the cosmic rays
 * @param gravity    external gravity, the sum of these laws; at least one
 * @param domain     the range of heights
 */
public record Disk(Gas gas, GasClosure gasClosure, MagneticField field, CosmicRays cosmicRays,
    List<GravityLaw> gravity, Domain domain) {
}
