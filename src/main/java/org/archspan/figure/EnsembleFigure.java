package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.Map;
import org.archspan.uncertainty.EnsembleSummary;
import org.archspan.uncertainty.EnsembleSummary.JointBin;
import org.archspan.uncertainty.LogHistogram;
import org.archspan.uncertainty.SobolIndices;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.units.OutputUnits;
import org.jfree.chart.annotations.XYBoxAnnotation;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.SymbolAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;

/** Histogram of the wavelength, wavelength and growth time together, and what drives the spread. */
public final class EnsembleFigure implements Figure {
  private static final int BARS = 40;
  private final EnsembleSummary summary;
  private final OutputUnits units;
  private final FigureStyle style;
  private final double shortest;
  private final double longest;

  /** The figure of an ensemble that has a spacing. */
  public EnsembleFigure(EnsembleSummary summary, OutputUnits units, FigureStyle style) {
    this.summary = summary;
    this.units = units;
    this.style = style;
    this.shortest = 0.95 * summary.wavelength().quantile(0.003);
    this.longest = 1.05 * summary.wavelength().quantile(0.997);
  }

  /** Whether the wavelength varies, so that something drives it. */
  private boolean driven() {
    SobolIndices indices = summary.ofWavelength();
    return summary.design().sensitivities() && indices.groups() > 1 && Double.isFinite(indices.first(0));
  }

  @Override
  public Page page() {
    return new Page(driven() ? FigureStyle.PAGE : 0.68 * FigureStyle.PAGE, 0.36 * FigureStyle.PAGE, style.background());
  }

  @Override
  public String description() {
    return "Histogram of the wavelength with its median and its range of 68 per cent, the joint distribution of"
        + " wavelength and growth time, and the Sobol' indices of the inputs";
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    double share = driven() ? 0.3 : 0.5;
    Plots.column(histogram(), false, style, graphics, area, 0.0, share);
    Plots.column(joint(), false, style, graphics, area, share, 2.0 * share);
    if (driven()) {
      Plots.column(drivers(), true, style, graphics, area, 2.0 * share, 1.0);
    }
  }

  private ValueAxis wavelength() {
    return axis("wavelength (" + units.length() + ")", shortest, longest);
  }

  /** Whether a decade has room for its labels. */
  private static boolean logarithmic(double low, double high) {
    return high > 15.0 * low;
  }

  /** End of a bar at a share of the axis. */
  private double edge(double share) {
    return logarithmic(shortest, longest) ? shortest * Math.pow(longest / shortest, share)
        : shortest + share * (longest - shortest);
  }

  private ValueAxis axis(String label, double low, double high) {
    ValueAxis axis = logarithmic(low, high) ? Plots.logAxis(label, style) : Plots.axis(label, style);
    axis.setRange(low, high);
    return axis;
  }

  private XYPlot histogram() {
    NumberAxis share = Plots.axis("share of draws per bin", style);
    XYPlot plot = Plots.plot(wavelength(), share, style);
    XYLineAndShapeRenderer bars = new XYLineAndShapeRenderer(false, false);
    plot.setRenderer(bars);
    LogHistogram values = summary.wavelength();
    double greatest = 0.0;
    for (int i = 0; i < BARS; i++) {
      double low = edge((double) i / BARS);
      double high = edge((i + 1.0) / BARS);
      double height = values.share(low, high);
      greatest = Math.max(greatest, height);
      if (height > 0.0) {
        bars.addAnnotation(new XYBoxAnnotation(low, 0.0, high, height, new BasicStroke(0.4f), style.background(),
            style.colour(0)), Layer.FOREGROUND);
      }
    }
    share.setRange(0.0, 1.1 * Math.max(greatest, 1e-6));
    IntervalMarker middle = new IntervalMarker(values.quantile(0.16), values.quantile(0.84));
    middle.setPaint(style.shade());
    middle.setAlpha(1f);
    plot.addDomainMarker(middle, Layer.BACKGROUND);
    plot.addDomainMarker(new ValueMarker(values.quantile(0.5), style.colour(1), new BasicStroke(1.2f)),
        Layer.FOREGROUND);
    return plot;
  }

  private XYPlot joint() {
    ValueAxis time = axis("growth time (" + units.time() + ")", 0.95 * summary.growthTime().quantile(0.003),
        1.05 * summary.growthTime().quantile(0.997));
    XYPlot plot = Plots.plot(wavelength(), time, style);
    XYLineAndShapeRenderer cells = new XYLineAndShapeRenderer(false, false);
    plot.setRenderer(cells);
    double greatest = summary.joint().values().stream().mapToLong(Long::longValue).max().orElse(1);
    for (Map.Entry<JointBin, Long> cell : summary.joint().entrySet()) {
      int x = cell.getKey().wavelength();
      int y = cell.getKey().growthTime();
      if (JointBin.lower(x + 1) > shortest && JointBin.lower(x) < longest
          && JointBin.lower(y + 1) > time.getLowerBound() && JointBin.lower(y) < time.getUpperBound()) {
        Color colour = new Color(ColourMap.SEQUENTIAL.colour(1.0 - 0.92 * Math.sqrt(cell.getValue() / greatest)));
        cells.addAnnotation(new XYBoxAnnotation(JointBin.lower(x), JointBin.lower(y), JointBin.lower(x + 1),
            JointBin.lower(y + 1), null, null, colour), Layer.BACKGROUND);
      }
    }
    return plot;
  }

  private XYPlot drivers() {
    SobolIndices indices = summary.ofWavelength();
    int inputs = summary.design().inputs().size();
    String[] names = summary.design().inputs().stream().map(UncertainInput::key)
        .toArray(String[]::new);
    SymbolAxis axis = new SymbolAxis(null, names);
    Plots.dress(axis, style);
    axis.setGridBandsVisible(false);
    axis.setRange(-0.6, inputs - 0.4);
    axis.setInverted(true);
    axis.setTickLabelFont(style.smallFont());
    NumberAxis share = Plots.axis("Sobol' index of ln(wavelength)", style);
    share.setRange(0.0, 1.05);
    XYPlot plot = Plots.plot(share, axis, style);
    for (int series = 0; series < 2; series++) {
      double[] x = new double[inputs];
      double[] y = new double[inputs];
      for (int j = 0; j < inputs; j++) {
        x[j] = Math.max(0.0, series == 0 ? indices.first(j) : indices.total(j));
        y[j] = j + (series == 0 ? -0.17 : 0.17);
      }
      bars(plot, series, x, y);
    }
    return plot;
  }

  private void bars(XYPlot plot, int series, double[] x, double[] y) {
    XYLineAndShapeRenderer bars = new XYLineAndShapeRenderer(false, true);
    bars.setSeriesShape(0, new Rectangle2D.Double(-2.0, -2.0, 4.0, 4.0));
    bars.setSeriesPaint(0, style.colour(series));
    plot.setDataset(series, Plots.curve(series == 0 ? "first order" : "total", new double[] {Double.NaN},
        new double[] {Double.NaN}));
    plot.setRenderer(series, bars);
    // the axis runs downwards, and so must the boxes
    for (int j = 0; j < x.length; j++) {
      bars.addAnnotation(new XYBoxAnnotation(0.0, y[j] + 0.14, x[j], y[j] - 0.14, null, null, style.colour(series)),
          Layer.BACKGROUND);
    }
  }
}
