package org.archspan.figure;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;
import org.archspan.boundary.Parity;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.GrowthPoint;
import org.archspan.units.OutputUnits;
import org.jfree.chart.annotations.XYTextAnnotation;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYItemRenderer;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.xy.XYDataset;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Growth rate against wavelength: all branches, the fastest marked, the limit of short waves across, the stable range. */
public final class GrowthFigure implements Figure {
  /**
   * A point that is marked and named.
   *
   * @param name  what it is, such as "fastest"
   * @param point where it is
   */
  public record Mark(String name, GrowthPoint point) {
  }

  private final List<GrowthCurve> curves;
  private final List<Mark> marks;
  private final OptionalDouble limit;
  private final OptionalDouble longestStable;
  private final OutputUnits units;
  private final FigureStyle style;

  /**
   * The figure of several curves.
   *
   * @param marks         points to mark, the one that matters most first
   * @param limit         growth rate of infinitely short waves across the field, s^-1
   * @param longestStable wavelength below which nothing grows, cm
   */
  public GrowthFigure(List<GrowthCurve> curves, List<Mark> marks, OptionalDouble limit,
      OptionalDouble longestStable, OutputUnits units, FigureStyle style) {
    this.curves = drawingOrder(curves);
    this.marks = marks.stream().filter(mark -> mark.point().wavenumber() > 0.0).toList();
    this.limit = limit;
    this.longestStable = longestStable;
    this.units = units.suiting(points().mapToDouble(GrowthPoint::wavelength).min().orElse(0.0) * 4.0);
    this.style = style;
  }

  private Stream<GrowthPoint> points() {
    return Stream.concat(curves.stream().flatMap(curve -> curve.points().stream()), marks.stream().map(Mark::point));
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.COLUMN, 0.86 * FigureStyle.COLUMN, style.background());
  }

  @Override
  public String description() {
    StringBuilder words = new StringBuilder("Growth rate against wavelength along the field");
    marks.forEach(mark -> words.append("; ").append(named(mark)));
    return words.toString();
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    DecadeAxis wavelength = Plots.logAxis("wavelength along the field (" + units.length() + ")", style);
    NumberAxis growth = Plots.axis("growth rate (" + units.time() + "\u207b\u00b9)", style);
    XYPlot plot = Plots.plot(wavelength, growth, style);
    if (points().findAny().isEmpty()) {
      sayStable(plot);
    } else {
      setRanges(wavelength, growth);
      shadeStable(plot);
      addMarks(plot);
      addCurves(plot);
      addLimit(plot);
    }
    Plots.chart(plot, true, style).draw(graphics, area);
  }

  /** Axes without numbers: there are no wavelengths to show. */
  private void sayStable(XYPlot plot) {
    plot.getDomainAxis().setRange(1.0, 10.0);
    for (ValueAxis axis : List.of(plot.getDomainAxis(), plot.getRangeAxis())) {
      axis.setTickLabelsVisible(false);
      axis.setTickMarksVisible(false);
      axis.setMinorTickMarksVisible(false);
    }
    plot.addAnnotation(text("nothing grows", Math.sqrt(10.0), 0.5));
  }

  private XYTextAnnotation text(String words, double x, double y) {
    XYTextAnnotation annotation = new XYTextAnnotation(words, x, y);
    annotation.setFont(style.smallFont());
    annotation.setPaint(style.ink());
    return annotation;
  }

  private void setRanges(DecadeAxis wavelength, NumberAxis growth) {
    double shortest = points().mapToDouble(GrowthPoint::wavelength).min().orElseThrow();
    double longest = points().mapToDouble(GrowthPoint::wavelength).max().orElseThrow();
    if (curves.isEmpty()) {
      shortest /= 3.0;
      longest *= 3.0;
    }
    wavelength.setRange(units.length(0.8 * Math.min(shortest, longestStable.orElse(shortest))), units.length(longest));
    double greatest = Math.max(points().mapToDouble(GrowthPoint::growthRate).max().orElseThrow(), limit.orElse(0.0));
    growth.setRange(0.0, greatest > 0.0 ? 1.08 * units.rate(greatest) : 1.0);
  }

  private void shadeStable(XYPlot plot) {
    if (longestStable.isEmpty()) {
      return;
    }
    double from = plot.getDomainAxis().getLowerBound();
    double to = units.length(longestStable.getAsDouble());
    IntervalMarker stable = new IntervalMarker(from, to);
    stable.setPaint(style.shade());
    stable.setAlpha(1f);
    plot.addDomainMarker(stable, Layer.BACKGROUND);
    XYTextAnnotation word = text("stable", Math.sqrt(from * to), 0.5 * plot.getRangeAxis().getUpperBound());
    word.setRotationAngle(-0.5 * Math.PI);
    word.setRotationAnchor(TextAnchor.CENTER);
    plot.addAnnotation(word);
  }

  private void addLimit(XYPlot plot) {
    if (limit.isEmpty() || limit.getAsDouble() <= 0.0) {
      return;
    }
    double rate = units.rate(limit.getAsDouble());
    ValueAxis wavelength = plot.getDomainAxis();
    CurveRenderer renderer = new CurveRenderer(style, 2, 0.7);
    renderer.setDefaultPaint(style.ink());
    add(plot, Plots.curve("infinitely short waves across", new double[] {wavelength.getLowerBound(),
        wavelength.getUpperBound()}, new double[] {rate, rate}), renderer);
  }

  private static void add(XYPlot plot, XYDataset data, XYItemRenderer renderer) {
    int index = plot.getDataset(0) == null ? 0 : plot.getDatasetCount();
    plot.setDataset(index, data);
    plot.setRenderer(index, renderer);
  }

  private void addCurves(XYPlot plot) {
    Set<String> named = new HashSet<>();
    List<Double> across = curves.stream().map(GrowthCurve::crossWavenumber).distinct().toList();
    for (GrowthCurve curve : curves) {
      int group = across.indexOf(curve.crossWavenumber());
      int look = across.size() > 1 ? group : curve.parity() == Parity.FLEXING ? 1 : 0;
      double[] x = curve.points().stream().mapToDouble(point -> units.length(point.wavelength())).toArray();
      double[] y = curve.points().stream().mapToDouble(point -> units.rate(point.growthRate())).toArray();
      String name = name(curve, across.size() > 1);
      CurveRenderer renderer = new CurveRenderer(style, look, curve.order() == 0 ? 1.5 : 0.6);
      renderer.setDefaultSeriesVisibleInLegend(named.add(name));
      add(plot, Plots.curve(name, x, y), renderer);
    }
  }

  /** What comes first is named first and drawn last: higher orders below, dashed flexing curves above solid ones. */
  private static List<GrowthCurve> drawingOrder(List<GrowthCurve> curves) {
    return curves.stream().sorted(Comparator.comparingInt(GrowthCurve::order)
        .thenComparing(GrowthCurve::parity, Comparator.reverseOrder())).toList();
  }

  private String name(GrowthCurve curve, boolean severalAcross) {
    if (severalAcross) {
      double ky = curve.crossWavenumber();
      return ky == 0.0 ? "uniform across" : Plots.short3(units.length(2.0 * Math.PI / ky)) + " " + units.length() + " across";
    }
    return curve.order() == 0 ? parity(curve) : "thin: higher orders";
  }

  private static String parity(GrowthCurve curve) {
    return switch (curve.parity()) {
      case MIRROR -> "mirror";
      case FLEXING -> "flexing";
      case FLOOR -> "above the floor";
    };
  }

  private void addMarks(XYPlot plot) {
    for (int i = 0; i < marks.size(); i++) {
      GrowthPoint point = marks.get(i).point();
      XYSeries series = new XYSeries(named(marks.get(i)));
      series.add(units.length(point.wavelength()), units.rate(point.growthRate()));
      XYLineAndShapeRenderer dot = new XYLineAndShapeRenderer(false, true);
      dot.setSeriesShape(0, new Ellipse2D.Double(-2.6, -2.6, 5.2, 5.2));
      dot.setSeriesPaint(0, style.ink());
      dot.setUseFillPaint(true);
      dot.setSeriesFillPaint(0, i == 0 ? style.ink() : style.background());
      add(plot, new XYSeriesCollection(series), dot);
    }
  }

  private String named(Mark mark) {
    return mark.name() + ": " + Plots.short3(units.length(mark.point().wavelength())) + " " + units.length()
        + ", growth time " + Plots.short3(units.time(1.0 / mark.point().growthRate())) + " " + units.time();
  }
}
