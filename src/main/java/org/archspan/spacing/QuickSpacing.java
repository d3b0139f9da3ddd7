package org.archspan.spacing;

import java.util.Optional;

/**
 * The mode that sets the spacing, without proof of the branches beside it, CGS.
 *
 * @param wavelength     along the field, cm; infinite where growth rises towards infinite wavelength
 * @param crestSpacing   distance between crests along the field at the lower end, cm; the wavelength unless the
 *                       field turns
 * @param growthRate     s^-1, positive
 * @param centroidHeight height of the kinetic-energy centroid, cm; infinite for the halo continuum
 * @param gathers        whether the mode gathers the disk's own gas; otherwise it is the fastest anywhere
 * @param heldBy         what confines the mode; empty where that was not asked
 */
public record QuickSpacing(double wavelength, double crestSpacing, double growthRate, double centroidHeight,
    boolean gathers, Optional<HeldBy> heldBy) {
}
