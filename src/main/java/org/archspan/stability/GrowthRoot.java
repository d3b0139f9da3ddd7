package org.archspan.stability;

/**
 * A growth rate found on the solver's mesh, in {@link Scales}.
 *
 * @param wavenumber kx
 * @param growth     s
 * @param slope      ds/dkx
 * @param error      estimated relative error: the correction that a finer mesh asks for, and rounding
 */
record GrowthRoot(double wavenumber, double growth, double slope, double error) {
}
