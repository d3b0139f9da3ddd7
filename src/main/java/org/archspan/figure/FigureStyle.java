package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;

/**
 * The one hand that draws all figures. Lengths are in points, 1/72 inch.
 *
 * @param dark     light on dark instead of dark on light
 * @param fontSize size of labels, in units of 1/72 inch
 */
public record FigureStyle(boolean dark, double fontSize) {
  /** Width of one column of a journal, points (88 mm). */
  static final double COLUMN = 88.0 / 25.4 * 72.0;
  /** Width of a page of two columns, points (180 mm). */
  static final double PAGE = 180.0 / 25.4 * 72.0;

  private static final Color[] ON_LIGHT = {new Color(0x1F4E8C), new Color(0xB8531A), new Color(0x1E7F74),
      new Color(0x7A4B94), new Color(0x8A7A1C), new Color(0x4B535E)};
  private static final Color[] ON_DARK = {new Color(0x7FB2F0), new Color(0xF2A269), new Color(0x69CFC0),
      new Color(0xC79BE0), new Color(0xD8C85A), new Color(0xB9C2CE)};
  private static final float[][] DASHES = {null, {6f, 2.2f}, {1.4f, 1.8f}, {6f, 2f, 1.4f, 2f}, {3f, 1.6f},
      {8f, 2f, 1.4f, 2f, 1.4f, 2f}};

  /** Dark on light, 8 points: for journals. */
  public static FigureStyle journal() {
    return new FigureStyle(false, 8.0);
  }

  Color background() {
    return dark ? new Color(0x15181D) : Color.WHITE;
  }

  Color ink() {
    return dark ? new Color(0xE6E8EB) : new Color(0x1A1C20);
  }

  Color faint() {
    return dark ? new Color(0x5A616B) : new Color(0xB4B9C0);
  }

  Color shade() {
    return dark ? new Color(0x262B33) : new Color(0xEEF0F3);
  }

  /** Colour of the i-th curve; told apart by its dash too. */
  Color colour(int i) {
    Color[] palette = dark ? ON_DARK : ON_LIGHT;
    return palette[i % palette.length];
  }

  BasicStroke stroke(int i, double width) {
    float[] dash = DASHES[i % DASHES.length];
    return new BasicStroke((float) width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10f, dash, 0f);
  }

  Font font() {
    return new Font(Font.SANS_SERIF, Font.PLAIN, 1).deriveFont((float) fontSize);
  }

  Font smallFont() {
    return font().deriveFont((float) (0.9 * fontSize));
  }
}
