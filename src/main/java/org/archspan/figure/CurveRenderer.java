package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.geom.Line2D;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;

/** Draws lines without markers, with a legend line that shows the dash. */
final class CurveRenderer extends XYLineAndShapeRenderer {
  private static final long serialVersionUID = 1L;

  CurveRenderer(FigureStyle style, int look, double width) {
    super(true, false);
    setDrawSeriesLineAsPath(true);
    setLegendLine(new Line2D.Double(-11.0, 0.0, 11.0, 0.0));
    setAutoPopulateSeriesPaint(false);
    setAutoPopulateSeriesStroke(false);
    setDefaultPaint(style.colour(look));
    setDefaultStroke(style.stroke(look, width));
  }

  /** A thin line of another colour. */
  CurveRenderer thin(java.awt.Color colour) {
    setDefaultPaint(colour);
    setDefaultStroke(new BasicStroke(0.7f));
    return this;
  }
}
