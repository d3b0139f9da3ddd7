package org.archspan.observe;

/**
 * A length with its error.
 *
 * @param value cm
 * @param error standard error, cm
 */
public record MeasuredLength(double value, double error) {
}
