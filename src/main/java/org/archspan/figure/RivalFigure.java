package org.archspan.figure;

import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.archspan.rivals.Rival;
import org.archspan.rivals.RivalResult;
import org.archspan.units.OutputUnits;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;

/** E-folding time against wavelength of every instability that chooses a wave, with the range of waves that grow. */
public final class RivalFigure implements Figure {
  private static final double SPREAD = 4.0;
  private final RivalResult result;
  private final OutputUnits units;
  private final FigureStyle style;

  /** The figure of a result. */
  public RivalFigure(RivalResult result, OutputUnits units, FigureStyle style) {
    this.result = result;
    this.units = result.winner().map(winner -> units.suiting(winner.wavelength())).orElse(units);
    this.style = style;
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.PAGE, 0.5 * FigureStyle.PAGE, style.background());
  }

  @Override
  public String description() {
    return "E-folding time against wavelength: one mark for each instability of the gas that chooses a wave, and a line"
        + " over the waves that grow; the lower the faster";
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    Plots.chart(plot(), true, style).draw(graphics, area);
  }

  private XYPlot plot() {
    List<Rival> contest = result.contest();
    DecadeAxis wavelength = Plots.logAxis("wavelength (" + units.length() + ")", style);
    DecadeAxis time = Plots.logAxis("e-folding time (" + units.time() + ")", style);
    double[] lengths = contest.stream().mapToDouble(rival -> units.length(rival.wavelength()))
        .filter(Double::isFinite).sorted().toArray();
    double[] times = contest.stream().mapToDouble(rival -> units.time(rival.growthTime())).sorted().toArray();
    double shortest = lengths.length == 0 ? 1.0 : lengths[0] / SPREAD;
    double longest = lengths.length == 0 ? 10.0 : lengths[lengths.length - 1] * SPREAD;
    wavelength.setRange(shortest, longest);
    time.setRange(times.length == 0 ? 1.0 : 0.5 * times[0], times.length == 0 ? 10.0 : 2.0 * times[times.length - 1]);
    XYPlot plot = Plots.plot(wavelength, time, style);
    for (int i = 0; i < contest.size(); i++) {
      Rival rival = contest.get(i);
      double seconds = units.time(rival.growthTime());
      double middle = units.length(rival.wavelength());
      double from = rival.shortest() > 0.0 ? Math.max(shortest, units.length(rival.shortest())) : middle;
      double to = rival.longest() > 0.0 ? Math.min(longest, units.length(rival.longest())) : middle;
      plot.setDataset(2 * i, Plots.curve(rival.name(), new double[] {middle}, new double[] {seconds}));
      plot.setRenderer(2 * i, mark(i));
      plot.setDataset(2 * i + 1, Plots.curve("", new double[] {from, middle, to},
          new double[] {seconds, seconds, seconds}));
      CurveRenderer line = new CurveRenderer(style, i, 0.9);
      line.setDefaultSeriesVisibleInLegend(false);
      plot.setRenderer(2 * i + 1, line);
    }
    return plot;
  }

  private XYLineAndShapeRenderer mark(int i) {
    XYLineAndShapeRenderer mark = new XYLineAndShapeRenderer(false, true);
    mark.setSeriesPaint(0, style.colour(i));
    mark.setSeriesShape(0, shape(i));
    return mark;
  }

  /** Circle, square, diamond, triangle in turn: told apart without colour too. */
  private static Shape shape(int i) {
    if (i % 4 == 0) {
      return new Ellipse2D.Double(-3.0, -3.0, 6.0, 6.0);
    }
    if (i % 4 == 1) {
      return new Rectangle2D.Double(-2.7, -2.7, 5.4, 5.4);
    }
    Path2D path = new Path2D.Double();
    path.moveTo(0.0, -3.6);
    path.lineTo(3.6, i % 4 == 2 ? 0.0 : 2.7);
    path.lineTo(i % 4 == 2 ? 0.0 : -3.6, i % 4 == 2 ? 3.6 : 2.7);
    if (i % 4 == 2) {
      path.lineTo(-3.6, 0.0);
    }
    path.closePath();
    return path;
  }
}
