package org.archspan.shear;

import org.archspan.boundary.Parity;

/**
 * What the best motion gains from one winding at the start.
 *
 * @param parity    symmetry about the midplane
 * @param winding   radial over azimuthal wavenumber at the start, dimensionless
 * @param eFoldings gained by the end, dimensionless; good to a percent or so
 */
public record StartGain(Parity parity, double winding, double eFoldings) {
}
