package org.archspan.figure;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import org.archspan.observe.ComplexOnArm;
import org.archspan.observe.LogarithmicSpiral;
import org.archspan.observe.ObservedArm;
import org.archspan.units.OutputUnits;
import org.jfree.chart.annotations.XYTextAnnotation;
import org.jfree.chart.axis.AxisSpace;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** The complexes in the plane of the disk with the fitted arm, their places along it, and the periodogram of those. */
public final class ObservationFigure implements Figure {
  private static final Shape DOT = new Ellipse2D.Double(-2.0, -2.0, 4.0, 4.0);
  private static final Shape TICK = new Line2D.Double(0.0, -7.0, 0.0, 7.0);
  private static final double[] CHANCES = {0.05, 0.01, 0.001};
  private static final double MAP = 0.46;
  private static final double STRIP = 0.36;
  /** By how much the margins of the map are wider than high, points; equal scales on both axes follow. */
  private static final double MARGINS = 14.6;
  private static final int CURVE_POINTS = 400;
  private final ObservedArm arm;
  private final OutputUnits units;
  private final FigureStyle style;

  /** The figure of an observation. */
  public ObservationFigure(ObservedArm arm, OutputUnits units, FigureStyle style) {
    this.arm = arm;
    this.units = units.suiting(arm.chain().length());
    this.style = style;
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.PAGE, MAP * FigureStyle.PAGE - MARGINS, style.background());
  }

  @Override
  public String description() {
    return "Left: complexes in the plane of the disk with the fitted arm, strays open. Right: places along the arm with"
        + " multiples of the spacing, and the Rayleigh power against wavelength with the levels that chance exceeds";
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    double left = MAP * area.getWidth();
    double upper = STRIP * area.getHeight();
    panel(map(), graphics, new Rectangle2D.Double(area.getX(), area.getY(), left, area.getHeight()));
    panel(strip(), graphics, new Rectangle2D.Double(area.getX() + left, area.getY(), area.getWidth() - left, upper));
    panel(periodogram(), graphics, new Rectangle2D.Double(area.getX() + left, area.getY() + upper,
        area.getWidth() - left, area.getHeight() - upper));
  }

  private void panel(XYPlot plot, Graphics2D graphics, Rectangle2D area) {
    AxisSpace left = new AxisSpace();
    left.setLeft(34.0);
    AxisSpace below = new AxisSpace();
    below.setBottom(30.0);
    plot.setFixedRangeAxisSpace(left);
    plot.setFixedDomainAxisSpace(below);
    Plots.chart(plot, false, style).draw(graphics, area);
  }

  private XYPlot map() {
    double reach = 1.12 * arm.positions().stream().mapToDouble(each -> units.length(each.radius())).max().orElseThrow();
    NumberAxis x = Plots.axis("along the line of nodes (" + units.length() + ")", style);
    NumberAxis y = Plots.axis("across it, in the plane (" + units.length() + ")", style);
    x.setRange(-reach, reach);
    y.setRange(-reach, reach);
    XYPlot plot = Plots.plot(x, y, style);
    XYSeries members = new XYSeries("members", false);
    XYSeries strays = new XYSeries("strays", false);
    List<Integer> onArm = arm.chain().complexes().stream().map(ComplexOnArm::index).toList();
    for (int i = 0; i < arm.positions().size(); i++) {
      (onArm.contains(i) ? members : strays).add(units.length(arm.positions().get(i).x()),
          units.length(arm.positions().get(i).y()));
    }
    XYSeries centre = new XYSeries("centre", false);
    centre.add(0.0, 0.0);
    add(plot, 0, members, points(style.colour(0), style.colour(0), DOT));
    add(plot, 1, strays, points(style.colour(1), style.background(), DOT));
    add(plot, 2, centre, points(style.ink(), style.ink(), cross()));
    add(plot, 3, spiral(), new CurveRenderer(style, 0, 0.9).thin(style.ink()));
    plot.addAnnotation(text("pitch angle " + Plots.short3(Math.abs(Math.toDegrees(arm.arm().spiral().pitchAngle())))
        + " \u00b1 " + new BigDecimal(Math.toDegrees(arm.arm().pitchError())).round(new
        MathContext(2)).toPlainString() + " deg", -0.95 * reach, 0.95 * reach));
    return plot;
  }

  private static Shape cross() {
    Path2D path = new Path2D.Double();
    path.append(new Line2D.Double(-3.0, 0.0, 3.0, 0.0), false);
    path.append(new Line2D.Double(0.0, -3.0, 0.0, 3.0), false);
    return path;
  }

  private XYSeries spiral() {
    LogarithmicSpiral spiral = arm.arm().spiral();
    List<ComplexOnArm> complexes = arm.chain().complexes();
    double from = complexes.get(0).azimuth();
    double to = complexes.get(complexes.size() - 1).azimuth();
    XYSeries series = new XYSeries("arm", false);
    for (int k = 0; k <= CURVE_POINTS; k++) {
      double azimuth = from + (to - from) * k / CURVE_POINTS;
      double radius = units.length(spiral.radius(azimuth));
      series.add(radius * Math.cos(azimuth), radius * Math.sin(azimuth));
    }
    return series;
  }

  /** Complexes along the arm; faint lines are multiples of the spacing in the phase of the peak. */
  private XYPlot strip() {
    double length = units.length(arm.chain().length());
    NumberAxis x = Plots.axis("place along the arm (" + units.length() + ")", style);
    x.setRange(-0.02 * length, 1.02 * length);
    NumberAxis y = new NumberAxis();
    Plots.dress(y, style);
    y.setRange(-1.0, 1.0);
    y.setTickLabelsVisible(false);
    y.setTickMarksVisible(false);
    XYPlot plot = Plots.plot(x, y, style);
    double spacing = units.length(arm.peak().wavelength().value());
    for (double place = phase() * spacing; place <= 1.02 * length; place += spacing) {
      plot.addDomainMarker(new ValueMarker(place, style.faint(), style.stroke(4, 0.7)), Layer.BACKGROUND);
    }
    XYSeries series = new XYSeries("complexes", false);
    for (double place : arm.chain().arcPositions()) {
      series.add(units.length(place), 0.0);
    }
    add(plot, 0, series, points(style.colour(0), style.colour(0), TICK));
    return plot;
  }

  /** Where in a period the complexes stand, 0 to 1. */
  private double phase() {
    double cosine = 0.0;
    double sine = 0.0;
    for (double place : arm.chain().arcPositions()) {
      double angle = 2.0 * Math.PI * place / arm.peak().wavelength().value();
      cosine += Math.cos(angle);
      sine += Math.sin(angle);
    }
    double turns = Math.atan2(sine, cosine) / (2.0 * Math.PI);
    return turns < 0.0 ? turns + 1.0 : turns;
  }

  private XYPlot periodogram() {
    XYSeries series = new XYSeries("power", false);
    double[] powers = arm.peak().powers();
    for (int k = 0; k < powers.length; k++) {
      series.add(units.length(1.0 / arm.peak().grid().frequency(k)), powers[k]);
    }
    double highest = Math.max(arm.peak().power(), arm.chance().level(CHANCES[CHANCES.length - 1]));
    DecadeAxis x = Plots.logAxis("wavelength along the arm (" + units.length() + ")", style);
    x.setRange(series.getMinX(), series.getMaxX());
    NumberAxis y = Plots.axis("Rayleigh power", style);
    y.setRange(0.0, 1.12 * highest);
    XYPlot plot = Plots.plot(x, (ValueAxis) y, style);
    for (double chance : CHANCES) {
      double level = arm.chance().level(chance);
      plot.addRangeMarker(new ValueMarker(level, style.faint(), style.stroke(1, 0.7)));
      XYTextAnnotation label = text(BigDecimal.valueOf(100.0 * chance).stripTrailingZeros().toPlainString()
          + " per cent by chance", 0.97 * series.getMaxX(), level);
      label.setTextAnchor(TextAnchor.BOTTOM_RIGHT);
      plot.addAnnotation(label);
    }
    add(plot, 0, series, new CurveRenderer(style, 0, 1.1));
    return plot;
  }

  private XYTextAnnotation text(String words, double x, double y) {
    XYTextAnnotation annotation = new XYTextAnnotation(words, x, y);
    annotation.setFont(style.smallFont());
    annotation.setPaint(style.ink());
    annotation.setTextAnchor(TextAnchor.TOP_LEFT);
    return annotation;
  }

  private XYLineAndShapeRenderer points(Color line, Color fill, Shape shape) {
    XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(false, true);
    renderer.setSeriesPaint(0, line);
    renderer.setSeriesShape(0, shape);
    renderer.setSeriesStroke(0, style.stroke(0, 1.0));
    renderer.setUseFillPaint(true);
    renderer.setSeriesFillPaint(0, fill);
    renderer.setUseOutlinePaint(true);
    renderer.setSeriesOutlinePaint(0, line);
    return renderer;
  }

  private static void add(XYPlot plot, int index, XYSeries series, XYLineAndShapeRenderer renderer) {
    plot.setDataset(index, new XYSeriesCollection(series));
    plot.setRenderer(index, renderer);
  }
}
