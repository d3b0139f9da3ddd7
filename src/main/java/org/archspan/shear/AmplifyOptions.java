package org.archspan.shear;

import java.util.OptionalDouble;

/**
 * What is asked of a wave in a shearing disk.
 *
 * @param wavelength along the field, cm; empty: the one that sets the spacing without rotation
 * @param start      radial over azimuthal wavenumber at the first moment, dimensionless, negative for leading waves; empty:
 *                   the best
 * @param duration   of the growth, s, positive; empty: one turn of the disk
 * @param tolerance  relative error asked of the amplification, dimensionless
 */
public record AmplifyOptions(OptionalDouble wavelength, OptionalDouble start, OptionalDouble duration, double tolerance) {
}
