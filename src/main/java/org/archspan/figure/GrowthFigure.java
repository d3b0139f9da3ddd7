package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.archspan.boundary.Parity;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.GrowthPoint;
import org.archspan.units.OutputUnits;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Growth rate against wavelength: all branches, the fastest marked, the limit of short waves across, the stable range. */
public final class GrowthFigure implements Figure {
  private final List<GrowthCurve> curves;
  private final Optional<GrowthPoint> marked;
  private final OptionalDouble limit;
  private final OptionalDouble longestStable;
  private final OutputUnits units;
  private final FigureStyle style;

  /**
   * The figure of several curves.
   *
   * @param marked        the point that sets the spacing
   * @param limit         growth rate of infinitely short waves across the field, s^-1
   * @param longestStable wavelength below which nothing grows, cm
   */
  public GrowthFigure(List<GrowthCurve> curves, Optional<GrowthPoint> marked, OptionalDouble limit,
      OptionalDouble longestStable, OutputUnits units, FigureStyle style) {
    this.curves = drawingOrder(curves);
    this.marked = marked;
    this.limit = limit;
    this.longestStable = longestStable;
    this.units = units.suiting(curves.stream().flatMap(curve -> curve.points().stream())
        .mapToDouble(GrowthPoint::wavelength).min().orElse(0.0) * 4.0);
    this.style = style;
  }

  @Override
  public double width() {
    return FigureStyle.COLUMN;
  }

  @Override
  public double height() {
    return 0.86 * FigureStyle.COLUMN;
  }

  @Override
  public String description() {
    return "Growth rate against wavelength along the field" + marked.map(point -> String.format(Locale.ROOT,
        "; the marked mode has wavelength %.4g %s and growth rate %.4g per %s", units.length(point.wavelength()),
        units.length(), units.rate(point.growthRate()), units.time())).orElse("");
  }

  @Override
  public java.awt.Color background() {
    return style.background();
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    DecadeAxis wavelength = Plots.logAxis("wavelength along the field (" + units.length() + ")", style);
    NumberAxis growth = Plots.axis("growth rate (" + units.time() + "\u207b\u00b9)", style);
    XYPlot plot = Plots.plot(wavelength, growth, style);
    setRanges(wavelength, growth);
    shadeStable(plot, wavelength);
    markLimit(plot);
    addCurves(plot);
    mark(plot);
    Plots.chart(plot, true, style).draw(graphics, area);
  }

  private double greatestGrowth() {
    double greatest = curves.stream().flatMap(curve -> curve.points().stream()).mapToDouble(GrowthPoint::growthRate)
        .max().orElse(0.0);
    return Math.max(greatest, Math.max(limit.orElse(0.0), marked.map(GrowthPoint::growthRate).orElse(0.0)));
  }

  private void setRanges(DecadeAxis wavelength, NumberAxis growth) {
    double shortest = curves.stream().flatMap(curve -> curve.points().stream()).mapToDouble(GrowthPoint::wavelength)
        .min().orElse(marked.map(GrowthPoint::wavelength).orElse(units.centimetresPerLength()) / 3.0);
    double longest = curves.stream().flatMap(curve -> curve.points().stream()).mapToDouble(GrowthPoint::wavelength)
        .max().orElse(9.0 * shortest);
    double from = 0.8 * Math.min(shortest, longestStable.orElse(shortest));
    wavelength.setRange(units.length(from), units.length(longest));
    double greatest = units.rate(greatestGrowth());
    growth.setRange(0.0, greatest > 0.0 ? 1.16 * greatest : 1.0);
  }

  private void shadeStable(XYPlot plot, DecadeAxis wavelength) {
    if (longestStable.isEmpty()) {
      return;
    }
    IntervalMarker stable = new IntervalMarker(wavelength.getLowerBound(), units.length(longestStable.getAsDouble()));
    stable.setPaint(style.shade());
    stable.setAlpha(1f);
    plot.addDomainMarker(stable, Layer.BACKGROUND);
  }

  private void markLimit(XYPlot plot) {
    if (limit.isEmpty() || limit.getAsDouble() <= 0.0) {
      return;
    }
    ValueMarker line = new ValueMarker(units.rate(limit.getAsDouble()), style.ink(),
        new BasicStroke(0.7f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10f, new float[] {1.2f, 2f}, 0f));
    line.setLabel("infinitely short waves across");
    line.setLabelFont(style.smallFont());
    line.setLabelPaint(style.ink());
    line.setLabelBackgroundColor(new java.awt.Color(0, 0, 0, 0));
    line.setLabelAnchor(RectangleAnchor.TOP_RIGHT);
    line.setLabelTextAnchor(TextAnchor.BOTTOM_RIGHT);
    plot.addRangeMarker(line, Layer.BACKGROUND);
  }

  private void addCurves(XYPlot plot) {
    Set<String> named = new HashSet<>();
    List<Double> across = curves.stream().map(GrowthCurve::crossWavenumber).distinct().toList();
    int index = 0;
    plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
    for (GrowthCurve curve : curves) {
      int group = across.indexOf(curve.crossWavenumber());
      int look = across.size() > 1 ? group : curve.parity() == Parity.FLEXING ? 1 : 0;
      double[] x = curve.points().stream().mapToDouble(point -> units.length(point.wavelength())).toArray();
      double[] y = curve.points().stream().mapToDouble(point -> units.rate(point.growthRate())).toArray();
      String name = name(curve, across.size() > 1);
      plot.setDataset(index, Plots.curve(name, x, y));
      CurveRenderer renderer = new CurveRenderer(style, look, curve.order() == 0 ? 1.5 : 0.6);
      renderer.setDefaultSeriesVisibleInLegend(curve.order() == 0 && named.add(name));
      plot.setRenderer(index++, renderer);
    }
  }

  /** Higher orders below, and the dashed flexing curves above the solid ones. */
  private static List<GrowthCurve> drawingOrder(List<GrowthCurve> curves) {
    return curves.stream().sorted(Comparator.comparingInt((GrowthCurve curve) -> -curve.order())
        .thenComparing(GrowthCurve::parity)).toList();
  }

  private String name(GrowthCurve curve, boolean severalAcross) {
    double ky = curve.crossWavenumber();
    if (severalAcross) {
      return ky == 0.0 ? "uniform across" : String.format(Locale.ROOT, "%.4g %s across",
          units.length(2.0 * Math.PI / ky), units.length());
    }
    String thin = curves.stream().anyMatch(other -> other.parity() == curve.parity() && other.order() > 0)
        ? " (thin: higher orders)" : "";
    return thin.isEmpty() ? parity(curve) : parity(curve) + thin;
  }

  private static String parity(GrowthCurve curve) {
    return switch (curve.parity()) {
      case MIRROR -> "mirror-symmetric";
      case FLEXING -> "flexing the midplane";
      case FLOOR -> "above the floor";
    };
  }

  private void mark(XYPlot plot) {
    if (marked.isEmpty() || marked.get().wavenumber() == 0.0) {
      return;
    }
    double x = units.length(marked.get().wavelength());
    double y = units.rate(marked.get().growthRate());
    XYSeries series = new XYSeries(text(x, y));
    series.add(x, y);
    XYLineAndShapeRenderer dot = new XYLineAndShapeRenderer(false, true);
    dot.setSeriesShape(0, new Ellipse2D.Double(-2.6, -2.6, 5.2, 5.2));
    dot.setSeriesPaint(0, style.ink());
    int index = curves.isEmpty() ? 0 : plot.getDatasetCount();
    plot.setDataset(index, new XYSeriesCollection(series));
    plot.setRenderer(index, dot);
  }

  private String text(double x, double y) {
    return String.format(Locale.ROOT, "sets the spacing: %.3g %s, growth time %.3g %s", x, units.length(), 1.0 / y,
        units.time());
  }
}
