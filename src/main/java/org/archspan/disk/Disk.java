package org.archspan.disk;

import java.util.List;
import java.util.Optional;
import org.archspan.closure.GasClosure;
import org.archspan.gravity.GravityLaw;

/**
 * The physical model, in CGS-Gaussian units: everything that decides the equilibrium and its modes.
 *
 * @param gas         the gas
 * @param gasClosure  how it answers compression
 * @param selfGravity where its own gravity acts
 * @param field       the magnetic field
 * @param fieldTurn   rate at which its direction turns with height above the lower end, rad cm^-1; 0 for a straight field
 * @param cosmicRays  the cosmic rays
 * @param gravity     external gravity, the sum of these laws; empty only for a gas held by its own
 * @param rotation    about the vertical axis; empty: none
 * @param domain      the range of heights
 */
public record Disk(Gas gas, GasClosure gasClosure, SelfGravity selfGravity, MagneticField field, double fieldTurn,
    CosmicRays cosmicRays, List<GravityLaw> gravity, Optional<Rotation> rotation, Domain domain) {
  /** A disk with a straight field. */
  public Disk(Gas gas, GasClosure gasClosure, SelfGravity selfGravity, MagneticField field, CosmicRays cosmicRays,
      List<GravityLaw> gravity, Optional<Rotation> rotation, Domain domain) {
    this(gas, gasClosure, selfGravity, field, 0.0, cosmicRays, gravity, rotation, domain);
  }

  /** A disk of light gas that does not rotate. */
  public Disk(Gas gas, GasClosure gasClosure, MagneticField field, CosmicRays cosmicRays, List<GravityLaw> gravity,
      Domain domain) {
    this(gas, gasClosure, SelfGravity.OFF, field, cosmicRays, gravity, Optional.empty(), domain);
  }

  /** The same disk without rotation. */
  public Disk withoutRotation() {
    return new Disk(gas, gasClosure, selfGravity, field, fieldTurn, cosmicRays, gravity, Optional.empty(), domain);
  }

  /** The same disk of another gas. */
  public Disk withGas(Gas other) {
    return new Disk(other, gasClosure, selfGravity, field, fieldTurn, cosmicRays, gravity, rotation, domain);
  }
}
