package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.Arrays;
import org.archspan.spacing.PlaneResult;
import org.archspan.units.OutputUnits;
import org.jfree.chart.annotations.XYDataImageAnnotation;
import org.jfree.chart.annotations.XYShapeAnnotation;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Growth rate over the plane of wavenumbers, with contours, and the limit of infinitely short waves across beside it. */
public final class PlaneFigure implements Figure {
  private static final int LEVELS = 8;

  private final PlaneResult plane;
  private final OutputUnits units;
  private final FigureStyle style;
  private final double[] along;
  private final double[] across;
  private final double[][] growth;
  private final double greatest;

  /** The figure of a plane. */
  public PlaneFigure(PlaneResult plane, OutputUnits units, FigureStyle style) {
    this.plane = plane;
    this.units = units;
    this.style = style;
    double scale = 1e3;
    along = Arrays.stream(plane.along()).map(k -> scaled(k, scale)).toArray();
    across = Arrays.stream(plane.across()).map(k -> scaled(k, scale)).toArray();
    growth = new double[along.length][];
    double best = Arrays.stream(plane.limit()).map(units::rate).max().orElse(0.0);
    for (int i = 0; i < along.length; i++) {
      growth[i] = Arrays.stream(plane.growthRate()[i]).map(units::rate).toArray();
      best = Math.max(best, Arrays.stream(growth[i]).max().orElse(0.0));
    }
    greatest = best > 0.0 ? best : 1.0;
  }

  private double scaled(double perCentimetre, double scale) {
    double value = units.wavenumber(perCentimetre);
    return units.length().equals("pc") ? scale * value : value;
  }

  private String lengthUnit() {
    return units.length().equals("pc") ? "kpc" : units.length();
  }

  @Override
  public double width() {
    return 1.35 * FigureStyle.COLUMN;
  }

  @Override
  public double height() {
    return 0.92 * FigureStyle.COLUMN;
  }

  @Override
  public String description() {
    return "Growth rate over wavenumbers along and across the field as a colour map with contours, its greatest value"
        + " marked; beside it the limit of infinitely short waves across the field";
  }

  @Override
  public java.awt.Color background() {
    return style.background();
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    graphics.setPaint(style.background());
    graphics.fill(area);
    double w = area.getWidth();
    double h = area.getHeight();
    Plots.chart(map(), false, style).draw(graphics, new Rectangle2D.Double(area.getX(), area.getY(), 0.56 * w, h));
    Plots.chart(limit(), false, style).draw(graphics,
        new Rectangle2D.Double(area.getX() + 0.56 * w, area.getY(), 0.27 * w, h));
    ColourBar.draw(graphics, new Rectangle2D.Double(area.getX() + 0.83 * w, area.getY(), 0.17 * w, h),
        ColourMap.SEQUENTIAL, 0.0, greatest, "growth rate (" + units.time() + "\u207b\u00b9)", style);
  }

  private XYPlot map() {
    int n = along.length;
    int m = across.length;
    BufferedImage image = new BufferedImage(m, n, BufferedImage.TYPE_INT_RGB);
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < m; j++) {
        image.setRGB(j, n - 1 - i, ColourMap.SEQUENTIAL.colour(growth[i][j] / greatest));
      }
    }
    double halfAcross = 0.5 * (across[1] - across[0]);
    double halfAlong = 0.5 * (along[1] - along[0]);
    NumberAxis horizontal = Plots.axis("wavenumber across (" + lengthUnit() + "\u207b\u00b9)", style);
    horizontal.setRange(across[0], across[m - 1]);
    NumberAxis vertical = alongAxis();
    XYPlot plot = Plots.plot(horizontal, vertical, style);
    plot.addAnnotation(new XYDataImageAnnotation(image, across[0] - halfAcross, along[0] - halfAlong,
        across[m - 1] - across[0] + 2.0 * halfAcross, along[n - 1] - along[0] + 2.0 * halfAlong));
    for (int level = 1; level < LEVELS; level++) {
      plot.addAnnotation(new XYShapeAnnotation(ContourLines.of(across, along, transposed(), greatest * level / LEVELS),
          new BasicStroke(0.5f), new java.awt.Color(0xFF, 0xFF, 0xFF, 0xC0)));
    }
    markGreatest(plot);
    return plot;
  }

  private NumberAxis alongAxis() {
    NumberAxis axis = Plots.axis("wavenumber along (" + lengthUnit() + "\u207b\u00b9)", style);
    axis.setRange(0.0, along[along.length - 1]);
    return axis;
  }

  private double[][] transposed() {
    double[][] turned = new double[across.length][along.length];
    for (int i = 0; i < along.length; i++) {
      for (int j = 0; j < across.length; j++) {
        turned[j][i] = growth[i][j];
      }
    }
    return turned;
  }

  private void markGreatest(XYPlot plot) {
    int bestAlong = 0;
    int bestAcross = 0;
    for (int i = 0; i < along.length; i++) {
      for (int j = 0; j < across.length; j++) {
        if (growth[i][j] > growth[bestAlong][bestAcross]) {
          bestAlong = i;
          bestAcross = j;
        }
      }
    }
    double rx = 0.012 * (across[across.length - 1] - across[0]);
    double ry = 0.012 * along[along.length - 1];
    double centre = Math.max(across[0] + rx, Math.min(across[across.length - 1] - rx, across[bestAcross]));
    plot.addAnnotation(new XYShapeAnnotation(new Ellipse2D.Double(centre - rx, along[bestAlong] - ry,
        2.0 * rx, 2.0 * ry), new BasicStroke(0.8f), java.awt.Color.BLACK, java.awt.Color.WHITE));
  }

  /** The next smaller 1, 2 or 5 times a power of ten. */
  private static double roundDown(double value) {
    double decade = Math.pow(10.0, Math.floor(Math.log10(value)));
    return decade * (value >= 5.0 * decade ? 5.0 : value >= 2.0 * decade ? 2.0 : 1.0);
  }

  private XYPlot limit() {
    NumberAxis rate = Plots.axis("limit (" + units.time() + "\u207b\u00b9)", style);
    rate.setRange(0.0, 1.1 * greatest);
    rate.setTickUnit(new NumberTickUnit(roundDown(greatest)));
    NumberAxis vertical = alongAxis();
    vertical.setLabel(null);
    vertical.setTickLabelsVisible(false);
    XYPlot plot = Plots.plot(rate, vertical, style);
    XYSeries series = new XYSeries("infinitely short waves across", false);
    for (int i = 0; i < along.length; i++) {
      series.add(units.rate(plane.limit()[i]), along[i]);
    }
    plot.setDataset(new XYSeriesCollection(series));
    XYLineAndShapeRenderer renderer = new CurveRenderer(style, 0, 1.2);
    plot.setRenderer(renderer);
    return plot;
  }
}
