package org.archspan.figure;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.archspan.boundary.Parity;
import org.archspan.shear.Amplification;
import org.archspan.shear.StartGain;
import org.archspan.units.OutputUnits;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.SeriesRenderingOrder;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.DefaultXYDataset;

/**
 * Left: amplification of velocity and density contrast against time, beside the growth of the modes of rigid rotation and of
 * no rotation. Right: what the best motion gains from each start; of a single start its winding against time.
 */
public final class AmplificationFigure implements Figure {
  private static final double SHARE = 0.64;

  private final Amplification wave;
  private final OutputUnits units;
  private final FigureStyle style;

  /** The figure of a wave. */
  public AmplificationFigure(Amplification wave, OutputUnits units, FigureStyle style) {
    this.wave = wave;
    this.units = units;
    this.style = style;
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.PAGE, 0.42 * FigureStyle.PAGE, style.background());
  }

  @Override
  public String description() {
    return "Left: velocity over that at the start and density contrast of a wave wound up by differential rotation, with the"
        + " growth of the fastest modes of rigid rotation and of no rotation; right: "
        + (wave.starts().size() > 1 ? "e-foldings gained from each start" : "radial over azimuthal wavenumber");
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    Plots.column(growth(), true, style, graphics, area, 0.0, SHARE);
    Plots.column(wave.starts().size() > 1 ? starts() : winding(), true, style, graphics, area, SHARE, 1.0);
  }

  private double[] times() {
    return Arrays.stream(wave.time()).map(units::time).toArray();
  }

  private ValueAxis timeAxis() {
    NumberAxis axis = Plots.axis("time since the start (" + units.time() + ")", style);
    axis.setRange(0.0, units.time(wave.duration()));
    return axis;
  }

  private XYPlot growth() {
    DefaultXYDataset data = new DefaultXYDataset();
    data.addSeries("velocity", new double[][] {times(), wave.amplification()});
    data.addSeries("density contrast", new double[][] {times(), wave.densityContrast()});
    data.addSeries("rigid rotation", new double[][] {times(), mode(wave.rigidGrowth())});
    data.addSeries("no rotation", new double[][] {times(), mode(wave.staticGrowth())});
    ValueAxis gain = Plots.logAxis("amplitude / initial Mach number", style);
    double highest = Arrays.stream(wave.amplification()).max().orElseThrow();
    gain.setRange(0.1, 10.0 * Math.max(highest, Math.exp(finite(wave.staticGrowth()) * wave.duration())));
    XYPlot plot = Plots.plot(timeAxis(), gain, style);
    plot.setDataset(data);
    plot.setRenderer(lines(4));
    return plot;
  }

  private static double finite(double growth) {
    return Double.isFinite(growth) ? growth : 0.0;
  }

  /** What a mode gains that starts at one. */
  private double[] mode(double growth) {
    return Arrays.stream(wave.time()).map(time -> Math.exp(growth * time)).toArray();
  }

  private XYPlot winding() {
    ValueAxis ratio = Plots.axis("radial / azimuthal wavenumber", style);
    double start = wave.winding()[0];
    double end = wave.winding()[wave.winding().length - 1];
    double margin = 0.05 * Math.max(1.0, Math.abs(end - start));
    ratio.setRange(Math.min(start, end) - margin, Math.max(start, end) + margin);
    XYPlot plot = Plots.plot(timeAxis(), ratio, style);
    plot.setDataset(Plots.curve("the wave that gains most", times(), wave.winding()));
    plot.setRenderer(lines(1));
    return plot;
  }

  private XYPlot starts() {
    DefaultXYDataset data = new DefaultXYDataset();
    List<Parity> parities = wave.starts().stream().map(StartGain::parity).distinct().toList();
    for (Parity parity : parities) {
      List<StartGain> gains = wave.starts().stream().filter(start -> start.parity() == parity).toList();
      data.addSeries(parity.name().toLowerCase(Locale.ROOT), new double[][] {
          gains.stream().mapToDouble(StartGain::winding).toArray(),
          gains.stream().mapToDouble(StartGain::eFoldings).toArray()});
    }
    XYPlot plot = Plots.plot(Plots.axis("radial / azimuthal wavenumber", style),
        Plots.axis("e-foldings gained", style), style);
    plot.setDataset(data);
    plot.setRenderer(lines(parities.size()));
    // the dashed curve on top: where both gain the same it would hide behind the full one
    plot.setSeriesRenderingOrder(SeriesRenderingOrder.FORWARD);
    return plot;
  }

  private XYLineAndShapeRenderer lines(int count) {
    XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
    renderer.setDrawSeriesLineAsPath(true);
    for (int i = 0; i < count; i++) {
      renderer.setSeriesPaint(i, style.colour(i));
      renderer.setSeriesStroke(i, style.stroke(i, i == 0 ? 1.3 : 1.0));
    }
    return renderer;
  }
}
