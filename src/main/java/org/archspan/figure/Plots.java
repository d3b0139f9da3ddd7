package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.math.BigDecimal;
import java.math.MathContext;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.Locale;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.axis.TickUnits;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.block.RectangleConstraint;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.Range;
import org.jfree.data.xy.DefaultXYDataset;

/** Axes, plots and charts in the common style. */
final class Plots {
  private static final TickUnits TICKS = ticks();

  private Plots() {
  }

  /** 1, 2 and 5 times every power of ten, each with as many decimals as it needs. */
  private static TickUnits ticks() {
    TickUnits units = new TickUnits();
    for (int power = -12; power <= 12; power++) {
      String pattern = power < 0 ? "0." + "0".repeat(-power) : "0";
      DecimalFormat format = new DecimalFormat(pattern, DecimalFormatSymbols.getInstance(Locale.ROOT));
      format.setNegativePrefix("\u2212");
      for (int digit : new int[] {1, 2, 5}) {
        units.add(new NumberTickUnit(digit * Math.pow(10.0, power), format));
      }
    }
    return units;
  }

  static NumberAxis axis(String label, FigureStyle style) {
    NumberAxis axis = new NumberAxis(label);
    axis.setAutoRangeIncludesZero(false);
    axis.setStandardTickUnits(TICKS);
    dress(axis, style);
    return axis;
  }

  static DecadeAxis logAxis(String label, FigureStyle style) {
    DecadeAxis axis = new DecadeAxis(label);
    dress(axis, style);
    axis.setMinorTickMarksVisible(true);
    axis.setMinorTickMarkInsideLength(1.6f);
    axis.setMinorTickMarkOutsideLength(0f);
    return axis;
  }

  static void dress(ValueAxis axis, FigureStyle style) {
    axis.setLabelFont(style.font());
    axis.setTickLabelFont(style.font());
    axis.setLabelPaint(style.ink());
    axis.setTickLabelPaint(style.ink());
    axis.setAxisLinePaint(style.ink());
    axis.setTickMarkPaint(style.ink());
    axis.setAxisLineStroke(new BasicStroke(0.6f));
    axis.setTickMarkStroke(new BasicStroke(0.6f));
    axis.setTickMarkInsideLength(3f);
    axis.setTickMarkOutsideLength(0f);
    axis.setLabelInsets(new RectangleInsets(1.5, 1.5, 1.5, 1.5));
    axis.setTickLabelInsets(new RectangleInsets(1.5, 2.5, 1.5, 2.5));
  }

  static XYPlot plot(ValueAxis horizontal, ValueAxis vertical, FigureStyle style) {
    XYPlot plot = new XYPlot(null, horizontal, vertical, null);
    plot.setBackgroundPaint(style.background());
    plot.setDomainGridlinesVisible(false);
    plot.setRangeGridlinesVisible(false);
    plot.setOutlinePaint(style.ink());
    plot.setOutlineStroke(new BasicStroke(0.6f));
    plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
    return plot;
  }

  static JFreeChart chart(Plot plot, boolean legend, FigureStyle style) {
    JFreeChart chart = new JFreeChart(null, style.font(), plot, false);
    chart.setBackgroundPaint(style.background());
    chart.setPadding(new RectangleInsets(3.0, 3.0, 3.0, 6.0));
    if (legend) {
      LegendTitle title = legend(plot, style);
      title.setPosition(RectangleEdge.TOP);
      chart.addLegend(title);
    }
    return chart;
  }

  /** Draws a chart of a plot over a part of the width of an area, from one share of it (0 to 1) to another. */
  static void column(Plot plot, boolean legend, FigureStyle style, Graphics2D graphics, Rectangle2D area, double from,
      double to) {
    chart(plot, legend, style).draw(graphics, new Rectangle2D.Double(area.getX() + from * area.getWidth(), area.getY(),
        (to - from) * area.getWidth(), area.getHeight()));
  }

  private static LegendTitle legend(Plot plot, FigureStyle style) {
    LegendTitle title = new LegendTitle(plot);
    title.setItemFont(style.smallFont());
    title.setItemPaint(style.ink());
    title.setBackgroundPaint(style.background());
    title.setLegendItemGraphicPadding(new RectangleInsets(1.0, 3.0, 1.0, 3.0));
    title.setItemLabelPadding(new RectangleInsets(0.5, 0.5, 0.5, 5.0));
    return title;
  }

  /** The legend of a plot in a place of its own. */
  static void legend(Plot plot, FigureStyle style, Graphics2D graphics, Rectangle2D area) {
    LegendTitle title = legend(plot, style);
    title.arrange(graphics, new RectangleConstraint(area.getWidth(), new Range(0.0, area.getHeight())));
    title.draw(graphics, area);
  }

  /** Three significant digits without an exponent. */
  static String short3(double value) {
    if (!Double.isFinite(value) || value == 0.0) {
      return Double.isInfinite(value) ? "\u221e" : "0";
    }
    BigDecimal rounded = new BigDecimal(value).round(new MathContext(3));
    int exponent = rounded.precision() - rounded.scale() - 1;
    return rounded.setScale(Math.max(0, 2 - exponent)).toPlainString();
  }

  /** A unit as journals print it. */
  static String printed(String unit) {
    return unit.startsWith("u") ? "\u00b5" + unit.substring(1) : unit;
  }

  /** One curve. */
  static DefaultXYDataset curve(String name, double[] x, double[] y) {
    DefaultXYDataset data = new DefaultXYDataset();
    data.addSeries(name, new double[][] {x, y});
    return data;
  }
}
