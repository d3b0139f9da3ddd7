package org.archspan.uncertainty;

/**
 * An input of the model that is uncertain.
 *
 * @param key          of the model file
 * @param distribution of its value, CGS
 * @param unit         in which its values are written; empty for a pure number
 * @param unitSize     size of that unit, in the CGS unit of the input
 */
public record UncertainInput(String key, Uncertainty distribution, String unit, double unitSize) {
}
