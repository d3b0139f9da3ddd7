package org.archspan.figure;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import org.jfree.chart.annotations.XYDataImageAnnotation;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleInsets;

/** The scale that belongs to a colour map, as a narrow plot of its own, laid out like the map beside it. */
final class ColourBar {
  private static final int STEPS = 256;

  private ColourBar() {
  }

  static void draw(Graphics2D graphics, Rectangle2D area, ColourMap map, double low, double high, String label,
      FigureStyle style) {
    BufferedImage image = new BufferedImage(1, STEPS, BufferedImage.TYPE_INT_RGB);
    for (int i = 0; i < STEPS; i++) {
      image.setRGB(0, STEPS - 1 - i, map.colour((double) i / (STEPS - 1)));
    }
    NumberAxis value = Plots.axis(label, style);
    value.setRange(low, high);
    NumberAxis none = Plots.axis(" ", style);
    none.setRange(0.0, 1.0);
    none.setTickLabelPaint(style.background());
    none.setTickMarksVisible(false);
    XYPlot plot = Plots.plot(none, value, style);
    plot.setInsets(new RectangleInsets(4.0, 0.0, 4.0, 0.0));
    plot.setRangeAxisLocation(AxisLocation.BOTTOM_OR_RIGHT);
    plot.addAnnotation(new XYDataImageAnnotation(image, 0.0, low, 1.0, high - low));
    Plots.chart(plot, false, style).draw(graphics, area);
  }
}
