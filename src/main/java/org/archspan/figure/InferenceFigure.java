package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import org.archspan.inference.BinnedWeights;
import org.archspan.inference.Inference;
import org.archspan.inference.ReproducingInterval;
import org.archspan.uncertainty.DrawRow;
import org.archspan.units.OutputUnits;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;

/**
 * Spacing against the input that is asked for, with the observation; beside it what is known of the input before and
 * after.
 */
public final class InferenceFigure implements Figure {
  private static final int PARTS = 80;
  private final Inference inference;
  private final OutputUnits units;
  private final FigureStyle style;
  /** From the unit of the rows to that of the figure. */
  private final double scale;

  /** The figure of an inference. */
  public InferenceFigure(Inference inference, OutputUnits units, FigureStyle style) {
    this.inference = inference;
    this.units = units.suiting(units.centimetresPerLength() * inference.observed().wavelength());
    this.style = style;
    scale = units.centimetresPerLength() / this.units.centimetresPerLength();
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.PAGE, 0.42 * FigureStyle.PAGE, style.background());
  }

  @Override
  public String description() {
    return "Left: wavelength against " + inference.input().key() + " with all other inputs at their middles, the"
        + " observed spacing with its error, and the values that reproduce it; right: distribution of the input"
        + " before and after";
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    Plots.column(relation(), true, style, graphics, area, 0.0, 0.5);
    Plots.column(distribution(), true, style, graphics, area, 0.5, 1.0);
  }

  private double value(DrawRow row) {
    return row.values().get(inference.target());
  }

  private ValueAxis inputAxis() {
    String unit = inference.input().unit();
    String label = inference.input().key() + (unit.isEmpty() ? "" : " (" + Plots.printed(unit) + ")");
    return inference.input().distribution().byFactors() ? Plots.logAxis(label, style) : Plots.axis(label, style);
  }

  private XYPlot relation() {
    ValueAxis input = inputAxis();
    input.setRange(value(inference.scan().get(0)), value(inference.scan().get(inference.scan().size() - 1)));
    double[] x = inference.scan().stream().mapToDouble(this::value).toArray();
    double[] y = inference.scan().stream().mapToDouble(row -> row.hasSpacing() ? scale * row.wavelength() : Double.NaN)
        .toArray();
    double middle = scale * inference.observed().wavelength();
    double error = scale * inference.observed().error();
    XYPlot plot = Plots.plot(input, wavelengthAxis(y), style);
    IntervalMarker observed = new IntervalMarker(middle - error, middle + error);
    observed.setPaint(style.colour(1));
    observed.setAlpha(0.18f);
    observed.setOutlinePaint(null);
    plot.addRangeMarker(observed, Layer.BACKGROUND);
    plot.addRangeMarker(new ValueMarker(middle, style.colour(1), new BasicStroke(0.8f)), Layer.BACKGROUND);
    for (ReproducingInterval interval : inference.intervals()) {
      IntervalMarker marker = new IntervalMarker(interval.low(), interval.high());
      marker.setPaint(style.shade());
      marker.setAlpha(1f);
      marker.setOutlinePaint(null);
      plot.addDomainMarker(marker, Layer.BACKGROUND);
    }
    XYLineAndShapeRenderer points = new XYLineAndShapeRenderer(true, true);
    points.setSeriesPaint(0, style.colour(0));
    points.setSeriesStroke(0, style.stroke(0, 0.8));
    points.setSeriesShape(0, new Ellipse2D.Double(-1.4, -1.4, 2.8, 2.8));
    plot.setDataset(Plots.curve("model, others at their middles; band: observed", x, y));
    plot.setRenderer(points);
    return plot;
  }

  /** Wide enough for the observation too; logarithmic where the wavelengths spread over more than a factor of eight. */
  private ValueAxis wavelengthAxis(double[] wavelengths) {
    double low = scale * (inference.observed().wavelength() - inference.observed().error());
    double high = scale * (inference.observed().wavelength() + inference.observed().error());
    for (double wavelength : wavelengths) {
      low = wavelength < low ? wavelength : low;
      high = wavelength > high ? wavelength : high;
    }
    String label = "wavelength (" + units.length() + ")";
    boolean wide = low > 0.0 && high > 8.0 * low;
    ValueAxis axis = wide ? Plots.logAxis(label, style) : Plots.axis(label, style);
    axis.setRange(wide ? 0.8 * low : 0.0, (wide ? 1.25 : 1.1) * high);
    return axis;
  }

  private XYPlot distribution() {
    BinnedWeights before = inference.posterior().before(inference.target());
    BinnedWeights after = inference.posterior().after(inference.target());
    ValueAxis input = inputAxis();
    input.setRange(before.low(), before.high());
    NumberAxis density = Plots.axis("share per bin", style);
    XYPlot plot = Plots.plot(input, density, style);
    double[] left = new double[2 * PARTS];
    for (int i = 0; i < 2 * PARTS; i++) {
      left[i] = before.at((double) ((i + 1) / 2) / PARTS);
    }
    double[] prior = steps(before.shares(PARTS));
    double[] posterior = steps(after.shares(PARTS));
    double greatest = 0.0;
    for (int i = 0; i < prior.length; i++) {
      greatest = Math.max(greatest, Math.max(prior[i], posterior[i]));
    }
    density.setRange(0.0, 1.1 * Math.max(greatest, 1e-6));
    plot.setDataset(0, Plots.curve("after", left, posterior));
    plot.setRenderer(0, new CurveRenderer(style, 0, 1.4));
    plot.setDataset(1, Plots.curve("before", left, prior));
    plot.setRenderer(1, new CurveRenderer(style, 1, 0.9));
    return plot;
  }

  /** The outline of a histogram. */
  private static double[] steps(double[] shares) {
    double[] outline = new double[2 * shares.length];
    for (int i = 0; i < outline.length; i++) {
      outline[i] = shares[i / 2];
    }
    return outline;
  }
}
