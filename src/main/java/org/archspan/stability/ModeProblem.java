package org.archspan.stability;

import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.disk.Disk;
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;

/**
 * What is to be solved for one parity and one cross-field wavenumber.
 *
 * @param equilibrium     base state
 * @param gas             closure of the gas
 * @param cosmicRays      closure of the cosmic rays
 * @param parity          condition at the lower end
 * @param crossWavenumber ky, cm^-1, not negative
 * @param perturbedGravity whether the gas feels the gravity of its own perturbation
 * @param turn            of the field with height; the wavenumber is then that of the whole wave, not of its part along the field
 * @param tolerance       requested relative error of growth rates, dimensionless
 */
public record ModeProblem(Equilibrium equilibrium, GasClosure gas, CosmicRayClosure cosmicRays, Parity parity,
    double crossWavenumber, boolean perturbedGravity, FieldTurn turn, double tolerance) {
  /** Refuses a tolerance that double precision cannot reach, and a parity that the domain does not have. */
  public ModeProblem {
    if (!(tolerance >= 1e-12 && tolerance <= 1e-2)) {
      throw new IllegalArgumentException("tolerance must lie between 1e-12 and 1e-2, found " + tolerance);
    }
    if (equilibrium.aboutMidplane() == (parity == Parity.FLOOR)) {
      throw new IllegalArgumentException("parity " + parity + " does not fit a domain that starts "
          + (equilibrium.aboutMidplane() ? "at the midplane" : "on a floor"));
    }
    if (!(crossWavenumber >= 0.0) || Double.isInfinite(crossWavenumber)) {
      throw new IllegalArgumentException("cross-field wavenumber must be finite and not negative, found "
          + crossWavenumber);
    }
    if (turn.turns() && (crossWavenumber != 0.0 || equilibrium.topBoundary() == TopBoundary.OPEN)) {
      throw new IllegalArgumentException("where the field turns a wave is given by its direction, and the top cannot be open");
    }
  }

  /** A light gas. */
  public ModeProblem(Equilibrium equilibrium, GasClosure gas, CosmicRayClosure cosmicRays, Parity parity,
      double crossWavenumber, double tolerance) {
    this(equilibrium, gas, cosmicRays, parity, crossWavenumber, false, FieldTurn.NONE, tolerance);
  }

  /** The problem of a disk whose equilibrium is known. */
  public static ModeProblem of(Disk disk, Equilibrium equilibrium, Parity parity, double crossWavenumber,
      double tolerance) {
    return new ModeProblem(equilibrium, disk.gasClosure(), disk.cosmicRays().closure(), parity, crossWavenumber,
        disk.selfGravity() == SelfGravity.FULL, FieldTurn.NONE, tolerance);
  }

  /** The problem of a wave of a given direction in a disk whose field turns with height. */
  public static ModeProblem turning(Disk disk, Equilibrium equilibrium, Parity parity, double direction,
      double tolerance) {
    return new ModeProblem(equilibrium, disk.gasClosure(), disk.cosmicRays().closure(), parity, 0.0,
        disk.selfGravity() == SelfGravity.FULL, new FieldTurn(disk.fieldTurn(), direction), tolerance);
  }

  /** The same problem with the other symmetry. */
  public ModeProblem withParity(Parity other) {
    return new ModeProblem(equilibrium, gas, cosmicRays, other, crossWavenumber, perturbedGravity, turn, tolerance);
  }

  /** The same problem for growth so slow that the cosmic rays diffuse meanwhile. */
  ModeProblem withDiffusedCosmicRays() {
    return new ModeProblem(equilibrium, gas, new CosmicRayClosure(cosmicRays.adiabaticIndex(),
        Double.POSITIVE_INFINITY), parity, crossWavenumber, perturbedGravity, turn, tolerance);
  }

  /** The same problem with a gas that cools at once, if it cools, and cosmic rays that diffuse at once, if they diffuse. */
  ModeProblem withSoftestClosures() {
    GasClosure softest = gas.cools() ? new GasClosure(gas.softestIndex()) : gas;
    ModeProblem soft = new ModeProblem(equilibrium, softest, cosmicRays, parity, crossWavenumber, perturbedGravity, turn,
        tolerance);
    return cosmicRays.leaks() ? soft.withDiffusedCosmicRays() : soft;
  }

  boolean bottomFixed() {
    return parity != Parity.FLEXING;
  }

  TopBoundary topBoundary() {
    return equilibrium.topBoundary();
  }
}
