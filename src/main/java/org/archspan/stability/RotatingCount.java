package org.archspan.stability;

import java.util.List;

/**
 * All modes of one parity at one wavenumber that grow faster than an edge, with how they were counted.
 *
 * @param modes         fastest first; of a conjugate pair the one with positive frequency
 * @param number        of growing modes by the argument principle, conjugates included: equal to that of the modes
 * @param edge          slowest growth that is counted, s^-1: neutral oscillations crowd at zero growth
 * @param radius        no mode grows faster than this, s^-1: the fastest growth without rotation
 * @param contourPoints determinants on the contour
 */
public record RotatingCount(List<RotatingMode> modes, int number, double edge, double radius, int contourPoints) {
}
