package org.archspan.figure;

import java.awt.Color;

/**
 * What a figure is drawn on.
 *
 * @param width  in units of 1/72 inch
 * @param height in units of 1/72 inch
 * @param colour of the empty page
 */
public record Page(double width, double height, Color colour) {
}
