package org.archspan.figure;

import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.archspan.comparison.ComparedCase;
import org.archspan.comparison.Comparison;
import org.archspan.comparison.VariedInput;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.HeldBy;
import org.archspan.spacing.SpacingResult;
import org.archspan.units.OutputUnits;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.SymbolAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Wavelength, growth time and mass of a complex against one varied input, with what holds the mode. */
public final class ComparisonCurves implements Figure {
  private static final Shape DOT = new Ellipse2D.Double(-2.0, -2.0, 4.0, 4.0);
  private final VariedInput input;
  private final List<ComparedCase> cases;
  private final OutputUnits units;
  private final FigureStyle style;
  /** Power of ten that is taken out of masses: a thousand, a million, ... */
  private final int massScale;

  /** The figure of a comparison with one varied input. */
  public ComparisonCurves(Comparison comparison, OutputUnits units, FigureStyle style) {
    this.input = comparison.inputs().get(0);
    this.cases = comparison.cases();
    this.units = units.suiting(cases.stream().flatMap(one -> one.result().flatMap(SpacingResult::spacingPeak).stream())
        .mapToDouble(BranchPeak::wavelength).filter(Double::isFinite).max().orElse(0.0));
    this.style = style;
    double greatest = cases.stream().flatMap(one -> one.result().stream()).mapToDouble(this::unscaledMass)
        .filter(Double::isFinite).max().orElse(1.0);
    massScale = greatest > 0.0 ? 3 * (int) Math.floor(Math.log10(greatest) / 3.0) : 0;
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.COLUMN, 1.45 * FigureStyle.COLUMN, style.background());
  }

  @Override
  public String description() {
    return "Wavelength, growth time and mass of a complex against " + input.key() + "; filled points: held by the disk,"
        + " open: by the lid, triangles: by the atmosphere above";
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    String massUnit = (massScale == 0 ? "" : "10" + DecadeAxis.superscript(massScale) + " ")
        + (massive() ? units.mass() : units.mass() + "/" + units.length());
    panel(graphics, area, 0, 0.36, "wavelength (" + units.length() + ")", result -> peak(result,
        one -> units.length(one.wavelength())));
    panel(graphics, area, 1, 0.29, "growth time (" + units.time() + ")", result -> peak(result,
        one -> units.time(one.growthTime())));
    panel(graphics, area, 2, 0.35, "mass (" + massUnit + ")", this::mass);
  }

  private boolean massive() {
    return cases.stream().flatMap(one -> one.result().flatMap(SpacingResult::complex).stream())
        .anyMatch(complex -> complex.mass().isPresent());
  }

  private static double peak(SpacingResult result, ToDoubleFunction<BranchPeak> value) {
    return result.spacingPeak().map(value::applyAsDouble).orElse(Double.NaN);
  }

  private double mass(SpacingResult result) {
    return Math.pow(10.0, -massScale) * unscaledMass(result);
  }

  private double unscaledMass(SpacingResult result) {
    return result.complex().map(complex -> complex.mass().isPresent() ? units.mass(complex.mass().getAsDouble())
        : units.mass(complex.massPerWidth()) * units.centimetresPerLength()).orElse(Double.NaN);
  }

  /** Panels lie above one another; the first carries the legend, the last the labels of the input. */
  private void panel(Graphics2D graphics, Rectangle2D area, int place, double share, String label,
      ToDoubleFunction<SpacingResult> value) {
    double above = place == 0 ? 0.0 : place == 1 ? 0.36 : 0.65;
    XYPlot plot = Plots.plot(horizontal(place == 2), vertical(label, value), style);
    List<HeldBy> kinds = List.of(HeldBy.values());
    add(plot, line(value), null, -1);
    for (HeldBy kind : kinds) {
      add(plot, points(value, kind), kind, kinds.indexOf(kind));
    }
    if (input.numeric()) {
      new StableRanges(input, cases, style).shade(plot);
    }
    org.jfree.chart.axis.AxisSpace space = new org.jfree.chart.axis.AxisSpace();
    space.setLeft(42.0);
    space.setBottom(place == 2 ? 30.0 : 6.0);
    plot.setFixedRangeAxisSpace(space);
    Plots.chart(plot, place == 0, style).draw(graphics, new Rectangle2D.Double(area.getX(),
        area.getY() + above * area.getHeight(), area.getWidth(), share * area.getHeight()));
  }

  private ValueAxis horizontal(boolean labelled) {
    String name = input.unit().isEmpty() ? input.key() : input.key() + " (" + Plots.printed(input.unit()) + ")";
    ValueAxis axis;
    if (!input.numeric()) {
      axis = new SymbolAxis(labelled ? name : null, input.values().toArray(String[]::new));
      Plots.dress(axis, style);
      axis.setRange(-0.5, input.values().size() - 0.5);
      ((SymbolAxis) axis).setGridBandsVisible(false);
    } else {
      double[] ends = input.numbers().stream().mapToDouble(Double::doubleValue).sorted().toArray();
      double least = ends[0];
      double greatest = ends[ends.length - 1];
      axis = input.wide() ? Plots.logAxis(labelled ? name : null, style) : Plots.axis(labelled ? name : null, style);
      double margin = greatest > least ? 0.04 : 0.5;
      double step = margin * Math.max(greatest - least, 1e-9);
      double factor = Math.pow(greatest / least, margin);
      axis.setRange(input.wide() ? least / factor : least - step, input.wide() ? greatest * factor : greatest + step);
    }
    axis.setTickLabelsVisible(labelled);
    return axis;
  }

  /** Logarithmic where the values spread over more than a factor of eight. */
  private ValueAxis vertical(String label, ToDoubleFunction<SpacingResult> value) {
    double[] sorted = cases.stream().flatMap(one -> one.result().stream()).mapToDouble(value)
        .filter(number -> Double.isFinite(number) && number > 0.0).sorted().toArray();
    if (sorted.length > 0 && sorted[sorted.length - 1] > 8.0 * sorted[0]) {
      DecadeAxis axis = Plots.logAxis(label, style);
      axis.setRange(0.8 * sorted[0], 1.25 * sorted[sorted.length - 1]);
      return axis;
    }
    NumberAxis axis = Plots.axis(label, style);
    axis.setRange(0.0, sorted.length > 0 ? 1.15 * sorted[sorted.length - 1] : 1.0);
    return axis;
  }

  private double position(int index) {
    return input.numeric() ? input.numbers().get(index) : index;
  }

  private XYSeries line(ToDoubleFunction<SpacingResult> value) {
    XYSeries series = new XYSeries("line", input.numeric());
    for (int i = 0; i < cases.size(); i++) {
      double y = cases.get(i).result().map(value::applyAsDouble).orElse(Double.NaN);
      series.add(position(i), Double.isFinite(y) ? (Double) y : null);
    }
    return series;
  }

  private XYSeries points(ToDoubleFunction<SpacingResult> value, HeldBy kind) {
    XYSeries series = new XYSeries("held by the " + kind.name().toLowerCase(java.util.Locale.ROOT));
    for (int i = 0; i < cases.size(); i++) {
      SpacingResult result = cases.get(i).result().orElse(null);
      boolean shown = result != null && result.spacingPeak().filter(peak -> peak.heldBy() == kind).isPresent();
      if (shown && Double.isFinite(value.applyAsDouble(result))) {
        series.add(position(i), value.applyAsDouble(result));
      }
    }
    return series;
  }

  private void add(XYPlot plot, XYSeries series, HeldBy kind, int order) {
    XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(kind == null && input.numeric(), kind != null);
    renderer.setSeriesPaint(0, kind == null ? style.faint() : style.colour(Math.max(0, order)));
    renderer.setSeriesStroke(0, style.stroke(0, 0.8));
    renderer.setSeriesShape(0, kind == HeldBy.HALO ? triangle() : DOT);
    renderer.setUseFillPaint(true);
    renderer.setSeriesFillPaint(0, kind == HeldBy.LID ? style.background() : style.colour(Math.max(0, order)));
    renderer.setDefaultSeriesVisibleInLegend(kind != null && series.getItemCount() > 0);
    plot.setDataset(order < 0 ? 3 : order, new XYSeriesCollection(series));
    plot.setRenderer(order < 0 ? 3 : order, renderer);
  }

  static Shape triangle() {
    Path2D path = new Path2D.Double();
    path.moveTo(0.0, -2.6);
    path.lineTo(2.4, 1.8);
    path.lineTo(-2.4, 1.8);
    path.closePath();
    return path;
  }
}
