package org.archspan.figure;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.function.ToDoubleFunction;
import org.archspan.comparison.ComparedCase;
import org.archspan.comparison.Comparison;
import org.archspan.comparison.VariedInput;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.HeldBy;
import org.archspan.spacing.SpacingResult;
import org.archspan.units.OutputUnits;
import org.jfree.chart.annotations.XYBoxAnnotation;
import org.jfree.chart.annotations.XYTextAnnotation;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.axis.SymbolAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Wavelength and growth time over the values of two inputs: one cell for each case, side by side. */
public final class ComparisonMap implements Figure {
  private static final int MOST_LABELS = 7;
  /** Values that spread over more than this factor are coloured by their logarithms. */
  private static final double WIDE = 8.0;
  /** Height of the line that explains the marks, points. */
  private static final double KEY = 14.0;
  private static final String MARKS = "dot: held by the lid; triangle: by the atmosphere above; grey: stable; cross:"
      + " no answer";
  private final Comparison comparison;
  private final VariedInput across;
  private final VariedInput up;
  private final OutputUnits units;
  private final FigureStyle style;

  /** The figure of a comparison with two varied inputs. */
  public ComparisonMap(Comparison comparison, OutputUnits units, FigureStyle style) {
    this.comparison = comparison;
    this.across = comparison.inputs().get(0);
    this.up = comparison.inputs().get(1);
    this.units = units.suiting(peaks(BranchPeak::wavelength).max().orElse(0.0));
    this.style = style;
  }

  private java.util.stream.DoubleStream peaks(ToDoubleFunction<BranchPeak> value) {
    return comparison.cases().stream().flatMap(one -> one.result().flatMap(SpacingResult::spacingPeak).stream())
        .mapToDouble(value).filter(Double::isFinite);
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.PAGE, 0.42 * FigureStyle.PAGE, style.background());
  }

  @Override
  public String description() {
    return "Wavelength and growth time over " + across.key() + " and " + up.key() + "; " + MARKS;
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    graphics.setPaint(style.ink());
    graphics.setFont(style.smallFont());
    graphics.drawString(MARKS, (float) area.getX() + 6f, (float) (area.getY() + KEY - 3.0));
    double half = 0.5 * area.getWidth();
    double height = area.getHeight() - KEY;
    map(graphics, new Rectangle2D.Double(area.getX(), area.getY() + KEY, half, height),
        "wavelength (" + units.length() + ")", peak -> units.length(peak.wavelength()));
    map(graphics, new Rectangle2D.Double(area.getX() + half, area.getY() + KEY, half, height),
        "growth time (" + units.time() + ")", peak -> units.time(peak.growthTime()));
  }

  private void map(Graphics2D graphics, Rectangle2D area, String label, ToDoubleFunction<BranchPeak> value) {
    boolean wide = peaks(value).max().orElse(1.0) > WIDE * peaks(value).min().orElse(1.0);
    ToDoubleFunction<BranchPeak> shown = wide ? peak -> Math.log10(value.applyAsDouble(peak)) : value;
    double low = peaks(shown).min().orElse(0.0);
    double greatest = peaks(shown).max().orElse(1.0);
    double high = greatest > low ? greatest : low + Math.max(1e-6, 0.01 * Math.abs(low));
    XYPlot plot = Plots.plot(axis(across), axis(up), style);
    plot.setRenderer(new XYLineAndShapeRenderer(false, true));
    for (int i = 0; i < comparison.cases().size(); i++) {
      cell(plot, i, shown, low, high);
    }
    addHeld(plot);
    Plots.chart(plot, false, style).draw(graphics, new Rectangle2D.Double(area.getX(), area.getY(),
        0.78 * area.getWidth(), area.getHeight()));
    ColourBar.draw(graphics, new Rectangle2D.Double(area.getX() + 0.78 * area.getWidth(), area.getY(),
        0.22 * area.getWidth(), area.getHeight()), ColourMap.SEQUENTIAL, low, high,
        (wide ? "log\u2081\u2080 " : "") + label, style);
  }

  /** Values stand at equal distances, words and numbers alike; where there are many, only some are labelled. */
  private SymbolAxis axis(VariedInput input) {
    String name = input.unit().isEmpty() ? input.key() : input.key() + " (" + Plots.printed(input.unit()) + ")";
    String[] labels = input.numeric() ? input.numbers().stream().map(ComparisonMap::shown).toArray(String[]::new)
        : input.values().toArray(String[]::new);
    SymbolAxis axis = new SymbolAxis(name, labels);
    Plots.dress(axis, style);
    axis.setGridBandsVisible(false);
    axis.setTickUnit(new NumberTickUnit(Math.max(1, (labels.length + MOST_LABELS - 2) / MOST_LABELS)));
    axis.setRange(-0.5, labels.length - 0.5);
    return axis;
  }

  /** Three digits at most. */
  private static String shown(double number) {
    return number == 0.0 ? "0" : new BigDecimal(number).round(new MathContext(3)).stripTrailingZeros().toPlainString();
  }

  private void cell(XYPlot plot, int index, ToDoubleFunction<BranchPeak> value, double low, double high) {
    double x = index / up.values().size();
    double y = index % up.values().size();
    ComparedCase one = comparison.cases().get(index);
    double number = one.result().flatMap(SpacingResult::spacingPeak).map(value::applyAsDouble).orElse(Double.NaN);
    Color colour = Double.isNaN(number) ? one.failed() ? style.background() : style.shade()
        : new Color(ColourMap.SEQUENTIAL.colour((number - low) / (high - low)));
    plot.getRenderer().addAnnotation(new XYBoxAnnotation(x - 0.5, y - 0.5, x + 0.5, y + 0.5, null, null, colour),
        org.jfree.chart.ui.Layer.BACKGROUND);
    if (one.failed()) {
      XYTextAnnotation cross = new XYTextAnnotation("\u00d7", x, y);
      cross.setFont(style.font());
      cross.setPaint(style.ink());
      plot.addAnnotation(cross);
    }
  }

  private void addHeld(XYPlot plot) {
    XYSeries lid = new XYSeries("lid");
    XYSeries halo = new XYSeries("halo");
    for (int i = 0; i < comparison.cases().size(); i++) {
      HeldBy held = comparison.cases().get(i).result().flatMap(SpacingResult::spacingPeak).map(BranchPeak::heldBy)
          .orElse(HeldBy.DISK);
      if (held != HeldBy.DISK) {
        (held == HeldBy.LID ? lid : halo).add(i / up.values().size(), i % up.values().size());
      }
    }
    XYSeriesCollection data = new XYSeriesCollection(lid);
    data.addSeries(halo);
    plot.setDataset(data);
    XYLineAndShapeRenderer marks = (XYLineAndShapeRenderer) plot.getRenderer();
    for (int series = 0; series < 2; series++) {
      marks.setSeriesShape(series, series == 0 ? new Ellipse2D.Double(-1.3, -1.3, 2.6, 2.6)
          : ComparisonCurves.triangle());
      marks.setSeriesPaint(series, Color.BLACK);
      marks.setSeriesFillPaint(series, Color.WHITE);
    }
    marks.setUseFillPaint(true);
  }
}
