package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.geom.Rectangle2D;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.List;
import java.util.Locale;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.axis.CategoryAxis;
import org.jfree.chart.axis.CategoryLabelPositions;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.labels.ItemLabelAnchor;
import org.jfree.chart.labels.ItemLabelPosition;
import org.jfree.chart.labels.StandardCategoryItemLabelGenerator;
import org.jfree.chart.plot.CategoryPlot;
import org.jfree.chart.plot.PlotOrientation;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.renderer.category.BarRenderer;
import org.jfree.chart.renderer.category.StandardBarPainter;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.category.DefaultCategoryDataset;

/** What drives a mode (bars to the right) and what resists it (to the left), in units of the square of its growth rate. */
public final class DriverFigure implements Figure {
  private static final double ROW = 17.0;

  /**
   * One bar.
   *
   * @param name  what does the work
   * @param share of s^2, dimensionless; positive drives
   */
  public record Bar(String name, double share) {
  }

  private final List<Bar> bars;
  private final FigureStyle style;

  /** The figure of a mode's terms; their sum, 1, is added below. */
  public DriverFigure(List<Bar> bars, FigureStyle style) {
    this.bars = List.copyOf(bars);
    this.style = style;
  }

  @Override
  public Page page() {
    return new Page(0.85 * FigureStyle.PAGE, ROW * (bars.size() + 1) + 42.0, style.background());
  }

  @Override
  public String description() {
    StringBuilder words = new StringBuilder("Terms of the square of the growth rate:");
    bars.forEach(bar -> words.append(String.format(Locale.ROOT, " %s %+.3f;", bar.name(), bar.share())));
    return words + " sum 1";
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    DefaultCategoryDataset data = new DefaultCategoryDataset();
    bars.forEach(bar -> data.addValue(bar.share(), "share", bar.name()));
    data.addValue(1.0, "share", "sum");
    CategoryAxis names = new CategoryAxis();
    names.setTickLabelFont(style.font());
    names.setTickLabelPaint(style.ink());
    names.setAxisLineVisible(false);
    names.setTickMarksVisible(false);
    names.setMaximumCategoryLabelWidthRatio(0.9f);
    names.setCategoryLabelPositions(CategoryLabelPositions.STANDARD);
    names.setCategoryMargin(0.25);
    NumberAxis shares = Plots.axis("share of the square of the growth rate", style);
    double greatest = Math.max(1.0, bars.stream().mapToDouble(Bar::share).max().orElse(1.0));
    double least = Math.min(0.0, bars.stream().mapToDouble(Bar::share).min().orElse(0.0));
    double margin = 0.2 * (greatest - least);
    shares.setRange(least < 0.0 ? least - margin : 0.0, greatest + margin);
    CategoryPlot plot = new CategoryPlot(data, names, shares, renderer());
    plot.setOrientation(PlotOrientation.HORIZONTAL);
    plot.setRangeAxisLocation(AxisLocation.BOTTOM_OR_RIGHT);
    plot.setBackgroundPaint(style.background());
    plot.setOutlinePaint(style.ink());
    plot.setOutlineStroke(new BasicStroke(0.6f));
    plot.setRangeGridlinesVisible(false);
    plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
    plot.addRangeMarker(new ValueMarker(0.0, style.ink(), new BasicStroke(0.6f)));
    Plots.chart(plot, false, style).draw(graphics, area);
  }

  private BarRenderer renderer() {
    BarRenderer renderer = new BarRenderer() {
      private static final long serialVersionUID = 1L;

      @Override
      public Paint getItemPaint(int row, int column) {
        return column == bars.size() ? style.faint() : style.colour(bars.get(column).share() > 0.0 ? 0 : 1);
      }
    };
    renderer.setBarPainter(new StandardBarPainter());
    renderer.setShadowVisible(false);
    renderer.setMaximumBarWidth(0.09);
    renderer.setDefaultItemLabelGenerator(new StandardCategoryItemLabelGenerator("{2}",
        new DecimalFormat("+0.00;\u22120.00", DecimalFormatSymbols.getInstance(Locale.ROOT))));
    renderer.setDefaultItemLabelsVisible(true);
    renderer.setDefaultPositiveItemLabelPosition(new ItemLabelPosition(ItemLabelAnchor.OUTSIDE3, TextAnchor.CENTER_LEFT));
    renderer.setDefaultNegativeItemLabelPosition(new ItemLabelPosition(ItemLabelAnchor.OUTSIDE9, TextAnchor.CENTER_RIGHT));
    renderer.setDefaultItemLabelFont(style.smallFont());
    renderer.setDefaultItemLabelPaint(style.ink());
    return renderer;
  }
}
