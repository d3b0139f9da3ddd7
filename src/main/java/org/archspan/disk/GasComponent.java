package org.archspan.disk;

/**
 * One isothermal component of the gas.
 *
 * @param name           what it is called in messages; may be empty
 * @param dispersion     isothermal sound speed, thermal and turbulent, cm s^-1, positive
 * @param bottomDensity  density at the midplane (or on the floor), g cm^-3, positive
 */
public record GasComponent(String name, double dispersion, double bottomDensity) {
}
