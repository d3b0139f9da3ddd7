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
import org.jfree.chart.annotations.XYTextAnnotation;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYItemRenderer;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Growth rate over the plane of wavenumbers, with contours, and the limit of infinitely short waves across beside it. */
public final class PlaneFigure implements Figure {
  private static final int LEVELS = 8;
  private static final int PIXELS = 240;

  private final PlaneResult plane;
  private final OutputUnits units;
  private final FigureStyle style;
  private final double[] along;
  private final double[] across;
  private final double[][] growth;
  private final GrowthSurface surface;
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
    greatest = best;
    surface = new GrowthSurface(across, along, growth);
  }

  private double scaled(double perCentimetre, double scale) {
    double value = units.wavenumber(perCentimetre);
    return units.length().equals("pc") ? scale * value : value;
  }

  private String lengthUnit() {
    return units.length().equals("pc") ? "kpc" : units.length();
  }

  @Override
  public Page page() {
    return new Page(1.35 * FigureStyle.COLUMN, 0.92 * FigureStyle.COLUMN, style.background());
  }

  @Override
  public String description() {
    return "Growth rate over wavenumbers along and across the field as a colour map with contours, its greatest value"
        + " marked; beside it the limit of infinitely short waves across the field";
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    double w = area.getWidth();
    double h = area.getHeight();
    Plots.column(map(), false, style, graphics, area, 0.0, 0.56);
    Plots.column(limit(), false, style, graphics, area, 0.56, 0.83);
    if (greatest > 0.0) {
      ColourBar.draw(graphics, new Rectangle2D.Double(area.getX() + 0.83 * w, area.getY(), 0.17 * w, h),
          ColourMap.SEQUENTIAL, 0.0, greatest, "growth rate (" + units.time() + "\u207b\u00b9)", style);
    }
  }

  private XYPlot map() {
    NumberAxis horizontal = Plots.axis("across the field, ky (" + lengthUnit() + "\u207b\u00b9)", style);
    horizontal.setRange(across[0], across[across.length - 1]);
    NumberAxis vertical = alongAxis();
    XYPlot plot = Plots.plot(horizontal, vertical, style);
    XYItemRenderer dot = dot();
    plot.setDataset(greatestPoint());
    plot.setRenderer(dot);
    dot.addAnnotation(new XYDataImageAnnotation(image(), across[0], 0.0, across[across.length - 1] - across[0],
        along[along.length - 1]), Layer.BACKGROUND);
    for (int level = 1; level < LEVELS && greatest > 0.0; level++) {
      double rate = greatest * level / LEVELS;
      contour(dot, rate * rate, 0.5f, new java.awt.Color(0xFF, 0xFF, 0xFF, 0xC0));
    }
    contour(dot, 0.0, 0.7f, style.ink());
    sayStable(plot);
    return plot;
  }

  private BufferedImage image() {
    BufferedImage image = new BufferedImage(PIXELS, PIXELS, BufferedImage.TYPE_INT_RGB);
    for (int i = 0; i < PIXELS; i++) {
      double y = along[along.length - 1] * (i + 0.5) / PIXELS;
      for (int j = 0; j < PIXELS; j++) {
        double x = across[0] + (across[across.length - 1] - across[0]) * (j + 0.5) / PIXELS;
        double square = surface.square(x, y);
        image.setRGB(j, PIXELS - 1 - i, square > 0.0 ? ColourMap.SEQUENTIAL.colour(Math.sqrt(square) / greatest)
            : style.shade().getRGB());
      }
    }
    return image;
  }

  private void contour(XYItemRenderer renderer, double square, float width, java.awt.Color colour) {
    renderer.addAnnotation(new XYShapeAnnotation(ContourLines.of(across, along, surface.square(), square),
        new BasicStroke(width), colour), Layer.BACKGROUND);
  }

  /** Where the grid has room for the word: in the middle of a stable plane, else in its upper left corner. */
  private void sayStable(XYPlot plot) {
    double x = 0.12 * across[across.length - 1];
    double y = 0.96 * along[along.length - 1];
    boolean everywhere = Arrays.stream(growth).allMatch(row -> Arrays.stream(row).allMatch(rate -> rate == 0.0));
    boolean room = surface.square(2.0 * x, 0.94 * along[along.length - 1]) < 0.0;
    if (everywhere || room) {
      XYTextAnnotation word = new XYTextAnnotation("stable", everywhere ? 0.5 * across[across.length - 1] : x,
          everywhere ? 0.5 * along[along.length - 1] : y);
      word.setFont(style.smallFont());
      word.setPaint(style.ink());
      plot.addAnnotation(word);
    }
  }

  private NumberAxis alongAxis() {
    NumberAxis axis = Plots.axis("along the field, kx (" + lengthUnit() + "\u207b\u00b9)", style);
    axis.setRange(0.0, along[along.length - 1]);
    return axis;
  }

  private XYItemRenderer dot() {
    XYLineAndShapeRenderer dot = new XYLineAndShapeRenderer(false, true);
    dot.setSeriesShape(0, new Ellipse2D.Double(-2.2, -2.2, 4.4, 4.4));
    dot.setSeriesPaint(0, java.awt.Color.BLACK);
    dot.setUseFillPaint(true);
    dot.setSeriesFillPaint(0, java.awt.Color.WHITE);
    return dot;
  }

  /** The greatest growth on the grid, where anything grows; drawn whole where it lies on the edge. */
  private XYSeriesCollection greatestPoint() {
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
    XYSeries series = new XYSeries("greatest");
    if (growth[bestAlong][bestAcross] > 0.0) {
      double hair = 0.02 * (across[across.length - 1] - across[0]);
      series.add(Math.max(across[0] + hair, Math.min(across[across.length - 1] - hair, across[bestAcross])),
          along[bestAlong]);
    }
    return new XYSeriesCollection(series);
  }

  /** The next smaller 1, 2 or 5 times a power of ten. */
  private static double roundDown(double value) {
    double decade = Math.pow(10.0, Math.floor(Math.log10(value)));
    return decade * (value >= 5.0 * decade ? 5.0 : value >= 2.0 * decade ? 2.0 : 1.0);
  }

  private XYPlot limit() {
    NumberAxis rate = Plots.axis("ky \u2192 \u221e (" + units.time() + "\u207b\u00b9)", style);
    rate.setRange(0.0, greatest > 0.0 ? 1.1 * greatest : 1.0);
    rate.setTickUnit(new NumberTickUnit(greatest > 0.0 ? roundDown(greatest) : 1.0));
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
