package org.archspan.spacing;

import java.util.OptionalDouble;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.ModeProblem;

/**
 * The waves that are searched.
 *
 * @param lowest          lowest wavenumber along the field, cm^-1, 0 for no limit; of the whole wave where the field turns
 * @param highest         highest, cm^-1, infinite for no limit
 * @param crossWavenumber across the field, cm^-1; 0 where the field turns
 * @param direction       angle of the wavevector from the field at the lower end, rad; present where the field turns
 */
public record WaveRange(double lowest, double highest, double crossWavenumber, OptionalDouble direction) {
  /**
   * The range that the options ask for; where the field turns and no direction is given, in the direction of the fastest
   * growth, and with waves no shorter than a scale height unless told otherwise.
   *
   * @throws RefusedModelException when the shortest wave is not shorter than the longest
   */
  public static WaveRange of(Disk disk, Equilibrium equilibrium, SearchOptions options) {
    double scaleHeight = equilibrium.scaleHeight();
    boolean turning = disk.fieldTurn() != 0.0;
    double lowest = options.longest().map(wave -> 2.0 * Math.PI / wave.resolve(scaleHeight)).orElse(0.0);
    double highest = options.shortest().map(wave -> 2.0 * Math.PI / wave.resolve(scaleHeight))
        .orElse(turning ? 2.0 * Math.PI / scaleHeight : Double.POSITIVE_INFINITY);
    double cross = options.crossWavelength().map(wave -> 2.0 * Math.PI / wave.resolve(scaleHeight)).orElse(0.0);
    if (!(lowest < highest)) {
      throw new RefusedModelException("waves.shortest must be shorter than waves.longest");
    }
    if (turning && cross > 0.0) {
      throw new RefusedModelException("waves.cross-wavelength has no meaning where the field turns (field.turn): what runs"
          + " across it at one height runs along it at another; remove it, or fix the direction with waves.direction");
    }
    WaveRange straight = new WaveRange(lowest, highest, cross, OptionalDouble.empty());
    if (!turning) {
      return straight;
    }
    return straight.directed(options.direction().orElseGet(
        () -> new DirectionSearch(disk, equilibrium, options, straight).fastest()));
  }

  /** The same waves in one direction, rad. */
  WaveRange directed(double newDirection) {
    return new WaveRange(lowest, highest, crossWavenumber, OptionalDouble.of(newDirection));
  }

  /** Distance between crests along the field at the lower end, for a wavelength; both in cm. */
  public double crestSpacing(double wavelength) {
    return direction.isPresent() ? wavelength / Math.abs(Math.cos(direction.getAsDouble())) : wavelength;
  }

  /** The eigenproblem of these waves. */
  ModeProblem problem(Disk disk, Equilibrium equilibrium, Parity parity, double tolerance) {
    return direction.isPresent()
        ? ModeProblem.turning(disk, equilibrium, parity, direction.getAsDouble(), tolerance)
        : ModeProblem.of(disk, equilibrium, parity, crossWavenumber, tolerance);
  }

  /** Whether some waves along the field are left out. */
  boolean limited() {
    return lowest > 0.0 || Double.isFinite(highest);
  }

  /** Whether a wavenumber (cm^-1) is an end of the range, to a millionth. */
  boolean endsAt(double wavenumber) {
    return Math.abs(wavenumber / lowest - 1.0) <= 1e-6 || Math.abs(wavenumber / highest - 1.0) <= 1e-6;
  }
}
