package org.archspan.figure;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;

/** Something that can be drawn at a fixed size. */
public interface Figure {
  /** What it is drawn on. */
  Page page();

  /** What the figure shows, for those who cannot see it. */
  String description();

  /** Draws into an area. */
  void draw(Graphics2D graphics, Rectangle2D area);
}
