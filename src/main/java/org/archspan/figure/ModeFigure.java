package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.Arrays;
import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import org.archspan.boundary.Parity;
import org.archspan.stability.EigenMode;
import org.archspan.units.OutputUnits;
import org.jfree.chart.annotations.XYDataImageAnnotation;
import org.jfree.chart.annotations.XYShapeAnnotation;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.XYPlot;

/** A mode: bent field lines over the density change, two wavelengths wide, and its amplitudes against height. */
public final class ModeFigure implements Figure {
  private static final int COLUMNS = 240;
  private static final int ROWS = 240;
  private static final int LINES = 9;
  /** Room for the legend above, in sizes of the font: beside each other the panels keep one scale of height. */
  private static final double HEAD = 2.9;
  private static final double LARGEST_BEND = 0.09;
  /** Greatest horizontal strain drawn: beyond 1 the lines would cross themselves. */
  private static final double STEEPEST = 0.45;

  private final EigenMode mode;
  private final ModeProfile profile;
  private final OutputUnits units;
  private final FigureStyle style;
  private final double lowest;
  private final double highest;

  /** The figure of a mode. */
  public ModeFigure(EigenMode mode, OutputUnits units, FigureStyle style) {
    this.mode = mode;
    this.profile = new ModeProfile(mode);
    this.units = units.suiting(profile.visibleTop());
    this.style = style;
    highest = profile.visibleTop();
    lowest = mode.parity() == Parity.FLOOR ? profile.bottom() : -highest;
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.PAGE, 0.42 * FigureStyle.PAGE, style.background());
  }

  @Override
  public String description() {
    double greatest = 0.0;
    for (int j = 0; j < ROWS; j++) {
      greatest = Math.max(greatest, Math.abs(profile.vertical(height(j))));
    }
    return String.format(Locale.ROOT, "Field lines bent by the %s mode of order %d over its density change, two"
        + " wavelengths of %s %s wide, drawn for vertical displacements of up to %s %s (linear theory leaves the size"
        + " open); beside it displacement amplitudes and kinetic energy against height",
        mode.parity().name().toLowerCase(Locale.ROOT), mode.order(), Plots.short3(units.length(wavelength())),
        units.length(), Plots.short3(units.length(drawn() * greatest)), units.length());
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    double greatest = greatestContrast();
    double w = area.getWidth();
    double h = area.getHeight();
    double head = HEAD * style.fontSize();
    double top = area.getY() + head;
    Plots.chart(map(greatest), false, style).draw(graphics,
        new Rectangle2D.Double(area.getX(), top, 0.53 * w, h - head));
    ColourBar.draw(graphics, new Rectangle2D.Double(area.getX() + 0.535 * w, top, 0.12 * w, h - head),
        ColourMap.DIVERGING, -1.0, 1.0, "density change \u03b4\u03c1/\u03c1 (of its greatest)", style);
    XYPlot amplitudes = amplitudes();
    Plots.chart(amplitudes, false, style).draw(graphics,
        new Rectangle2D.Double(area.getX() + 0.66 * w, top, 0.34 * w, h - head));
    Plots.legend(amplitudes, style, graphics,
        new Rectangle2D.Double(area.getX() + 0.66 * w, area.getY(), 0.34 * w, head + 0.4 * style.fontSize()));
  }

  private double greatestContrast() {
    double greatest = 0.0;
    for (int j = 0; j < ROWS; j++) {
      greatest = Math.max(greatest, Math.abs(profile.density(height(j))));
    }
    return greatest > 0.0 ? greatest : 1.0;
  }

  private double height(int row) {
    return lowest + (highest - lowest) * (row + 0.5) / ROWS;
  }

  private double wavelength() {
    return 2.0 * Math.PI / mode.wavenumber();
  }

  private XYPlot map(double greatest) {
    BufferedImage image = new BufferedImage(COLUMNS, ROWS, BufferedImage.TYPE_INT_RGB);
    for (int j = 0; j < ROWS; j++) {
      double contrast = profile.density(height(j)) / greatest;
      for (int i = 0; i < COLUMNS; i++) {
        double phase = 4.0 * Math.PI * (i + 0.5) / COLUMNS;
        image.setRGB(i, ROWS - 1 - j, ColourMap.DIVERGING.colour(0.5 + 0.5 * contrast * Math.cos(phase)));
      }
    }
    NumberAxis along = Plots.axis("along the field (" + units.length() + ")", style);
    NumberAxis up = Plots.axis("height (" + units.length() + ")", style);
    double width = units.length(2.0 * wavelength());
    along.setRange(0.0, width);
    up.setRange(units.length(lowest), units.length(highest));
    XYPlot plot = Plots.plot(along, up, style);
    plot.addAnnotation(new XYDataImageAnnotation(image, 0.0, units.length(lowest), width,
        units.length(highest - lowest)));
    addFieldLines(plot);
    return plot;
  }

  /** Factor on the mode as it is drawn, dimensionless: the greatest bend that can be seen and does not cross itself. */
  private double drawn() {
    double vertical = 0.0;
    double along = 0.0;
    for (int j = 0; j < ROWS; j++) {
      vertical = Math.max(vertical, Math.abs(profile.vertical(height(j))));
      along = Math.max(along, Math.abs(profile.along(height(j))));
    }
    double bend = vertical > 0.0 ? LARGEST_BEND * (highest - lowest) / vertical : 0.0;
    double steepest = along * bend * mode.wavenumber();
    return bend * Math.min(1.0, STEEPEST / Math.max(STEEPEST, steepest));
  }

  /** Lines that were horizontal before: (x + X sin kx, z + Z cos kx). */
  private void addFieldLines(XYPlot plot) {
    double amplitude = drawn();
    for (int line = 1; line <= LINES; line++) {
      double z = lowest + (highest - lowest) * line / (LINES + 1.0);
      Path2D path = new Path2D.Double();
      for (int i = -20; i <= COLUMNS + 20; i++) {
        double x = 2.0 * wavelength() * i / COLUMNS;
        double px = x + amplitude * profile.along(z) * Math.sin(mode.wavenumber() * x);
        double pz = z + amplitude * profile.vertical(z) * Math.cos(mode.wavenumber() * x);
        if (i == -20) {
          path.moveTo(units.length(px), units.length(pz));
        } else {
          path.lineTo(units.length(px), units.length(pz));
        }
      }
      plot.addAnnotation(new XYShapeAnnotation(path, new BasicStroke(0.8f), new java.awt.Color(0x1A1C20)));
    }
  }

  private XYPlot amplitudes() {
    NumberAxis share = Plots.axis("amplitude, of the greatest", style);
    share.setRange(-1.05, 1.05);
    NumberAxis up = Plots.axis("height (" + units.length() + ")", style);
    up.setRange(units.length(lowest), units.length(highest));
    XYPlot plot = Plots.plot(share, up, style);
    double[] heights = new double[ROWS + 1];
    for (int i = 0; i <= ROWS; i++) {
      heights[i] = lowest + (highest - lowest) * i / ROWS;
    }
    double greatest = Math.max(greatest(profile::vertical, heights),
        Math.max(greatest(profile::along, heights), greatest(profile::across, heights)));
    add(plot, "vertical", 0, heights, profile::vertical, greatest);
    add(plot, "along", 1, heights, profile::along, greatest);
    if (mode.crossWavenumber() > 0.0) {
      add(plot, "across", 2, heights, profile::across, greatest);
    }
    add(plot, "kinetic energy", 3, heights, profile::kineticEnergy, 1.0);
    return plot;
  }

  private static double greatest(DoubleUnaryOperator value, double[] heights) {
    return Arrays.stream(heights).map(value).map(Math::abs).max().orElse(1.0);
  }

  private void add(XYPlot plot, String name, int look, double[] heights, DoubleUnaryOperator value, double scale) {
    int index = plot.getDataset(0) == null ? 0 : plot.getDatasetCount();
    plot.setDataset(index, Plots.curve(name, Arrays.stream(heights).map(z -> value.applyAsDouble(z) / scale).toArray(),
        Arrays.stream(heights).map(units::length).toArray()));
    plot.setRenderer(index, new CurveRenderer(style, look, 1.2));
  }
}
