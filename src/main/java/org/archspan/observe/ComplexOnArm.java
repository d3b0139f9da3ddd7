package org.archspan.observe;

/**
 * A complex that belongs to the arm.
 *
 * @param index       of the complex in the table, from 0
 * @param azimuth     of the turn it belongs to, any turn, rad
 * @param arcPosition along the arm from its innermost complex, cm
 * @param across      signed distance from the middle of the arm, positive outward, cm
 */
public record ComplexOnArm(int index, double azimuth, double arcPosition, double across) {
}
