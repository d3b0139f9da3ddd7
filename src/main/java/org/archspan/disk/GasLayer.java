package org.archspan.disk;

/**
 * One layer of an atmosphere.
 *
 * @param from              lower end, cm; of the lowest layer it does not matter
 * @param dispersionSquared square of the isothermal speed, cm^2 s^-2, positive
 * @param blend             half-width of the change from the layer below, cm, positive
 */
public record GasLayer(double from, double dispersionSquared, double blend) {
}
