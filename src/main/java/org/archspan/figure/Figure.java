package org.archspan.figure;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;

/** Something that can be drawn at a fixed size. */
public interface Figure {
  /** Width, in units of 1/72 inch. */
  double width();

  /** Height, in units of 1/72 inch. */
  double height();

  /** What the figure shows, for those who cannot see it. */
  String description();

  /** Colour of the page. */
  Color background();

  /** Draws into an area. */
  void draw(Graphics2D graphics, Rectangle2D area);
}
