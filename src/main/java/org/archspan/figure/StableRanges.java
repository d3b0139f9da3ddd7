package org.archspan.figure;

import java.util.List;
import java.util.stream.IntStream;
import org.archspan.comparison.ComparedCase;
import org.archspan.comparison.VariedInput;
import org.archspan.spacing.SpacingResult;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.TextAnchor;

/** Shades the values of an input at which the gas is stable, up to half-way to the next that is not. */
final class StableRanges {
  private static final double ROOM_FOR_WORD = 0.15;
  private final VariedInput input;
  private final List<ComparedCase> cases;
  private final FigureStyle style;

  StableRanges(VariedInput input, List<ComparedCase> cases, FigureStyle style) {
    this.input = input;
    this.cases = cases;
    this.style = style;
  }

  void shade(XYPlot plot) {
    int[] order = IntStream.range(0, cases.size()).boxed()
        .sorted((a, b) -> Double.compare(input.numbers().get(a), input.numbers().get(b)))
        .mapToInt(Integer::intValue).toArray();
    for (int i = 0; i < order.length; i++) {
      int first = i;
      while (i < order.length && stable(order[i])) {
        i++;
      }
      if (i > first) {
        double low = first == 0 ? plot.getDomainAxis().getLowerBound() : between(order[first - 1], order[first]);
        double high = i == order.length ? plot.getDomainAxis().getUpperBound() : between(order[i - 1], order[i]);
        shade(plot, low, high);
      }
    }
  }

  private boolean stable(int index) {
    return cases.get(index).result().filter(SpacingResult::stable).isPresent();
  }

  private void shade(XYPlot plot, double low, double high) {
    IntervalMarker marker = new IntervalMarker(low, high);
    marker.setPaint(style.shade());
    marker.setOutlinePaint(null);
    marker.setAlpha(1f);
    double left = plot.getDomainAxis().getLowerBound();
    double right = plot.getDomainAxis().getUpperBound();
    double share = input.wide() ? Math.log(high / low) / Math.log(right / left) : (high - low) / (right - left);
    if (share > ROOM_FOR_WORD) {
      marker.setLabel("stable");
      marker.setLabelFont(style.smallFont());
      marker.setLabelPaint(style.ink());
      marker.setLabelBackgroundColor(style.shade());
      marker.setLabelAnchor(RectangleAnchor.CENTER);
      marker.setLabelTextAnchor(TextAnchor.CENTER);
    }
    plot.addDomainMarker(marker, Layer.BACKGROUND);
  }

  private double between(int first, int second) {
    double low = input.numbers().get(first);
    double high = input.numbers().get(second);
    return input.wide() ? Math.sqrt(low * high) : 0.5 * (low + high);
  }
}
