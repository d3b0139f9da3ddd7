package org.archspan.spacing;

import java.util.OptionalDouble;

/**
 * What one wavelength gathers along an arm.
 *
 * @param massPerWidth surface density times wavelength, g cm^-1
 * @param mass         times the width of the arm, g; absent when no arm is given
 * @param eFoldings    crossing time over growth time, dimensionless; absent when no crossing time is given
 */
public record CloudComplex(double massPerWidth, OptionalDouble mass, OptionalDouble eFoldings) {
}
