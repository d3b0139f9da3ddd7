package org.archspan.spacing;

import java.util.Optional;
import org.archspan.boundary.Parity;
import org.archspan.stability.WorkTerms;

/**
 * The fastest mode of one unstable branch (parity and mode order), CGS.
 *
 * @param parity              symmetry about the midplane
 * @param order               mode order, 0 for the fastest mode of its parity at that wavelength
 * @param wavenumber          along the field, cm^-1, positive
 * @param crossWavenumber     across the field, cm^-1, 0 or more
 * @param growthRate          s^-1, positive
 * @param growthError         estimated relative error of the growth rate, dimensionless
 * @param wavelengthError     estimated relative error of the wavelength, dimensionless; NaN where the branch ends
 *                            in the continuum
 * @param unstableModes       number of modes of this parity that grow at this wavelength; -1 where a continuum makes
 *                            the number infinite, or where there are too many to count
 * @param centroidHeight      height of the kinetic-energy centroid, cm; infinite for the halo continuum
 * @param columnContrast      surface-density contrast when the midplane layer moves by one scale height, dimensionless; 0 for modes
 *                            that flex the midplane; NaN for the halo continuum
 * @param heldBy              what confines the mode
 * @param tallerGrowthChange  relative change of the growth rate when the domain is 1.5 times as tall, dimensionless;
 *                            NaN when not computed
 * @param tallerWavelengthChange the same for the wavelength, dimensionless
 * @param frequency           of oscillation while it grows, s^-1; 0 without rotation, and for most modes with it
 * @param work                what drives the mode and what resists it; empty for the continuum, and with rotation
 */
public record BranchPeak(Parity parity, int order, double wavenumber, double crossWavenumber, double growthRate,
    double growthError, double wavelengthError, int unstableModes, double centroidHeight, double columnContrast,
    HeldBy heldBy, double tallerGrowthChange, double tallerWavelengthChange, double frequency,
    Optional<WorkTerms> work) {
  /** A mode that does not oscillate, or a continuum. */
  public BranchPeak(Parity parity, int order, double wavenumber, double crossWavenumber, double growthRate,
      double growthError, double wavelengthError, int unstableModes, double centroidHeight, double columnContrast,
      HeldBy heldBy, double tallerGrowthChange, double tallerWavelengthChange, Optional<WorkTerms> work) {
    this(parity, order, wavenumber, crossWavenumber, growthRate, growthError, wavelengthError, unstableModes,
        centroidHeight, columnContrast, heldBy, tallerGrowthChange, tallerWavelengthChange, 0.0, work);
  }


  /** Whether this is the edge of the continuum above an open top rather than a mode. */
  public boolean continuum() {
    return Double.isInfinite(centroidHeight);
  }

  /** Wavelength along the field, cm. */
  public double wavelength() {
    return 2.0 * Math.PI / wavenumber;
  }

  /** Growth (e-folding) time, s. */
  public double growthTime() {
    return 1.0 / growthRate;
  }
}
