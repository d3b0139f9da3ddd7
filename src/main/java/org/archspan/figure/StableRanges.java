package org.archspan.figure;

import java.util.List;
import java.util.stream.IntStream;
import org.archspan.comparison.ComparedCase;
import org.archspan.comparison.VariedInput;
import org.archspan.spacing.SpacingResult;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;

/** Shades the values of an input at which the gas is stable, up to half-way to the next that is not. */
final class StableRanges {
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
      if (cases.get(order[i]).result().filter(SpacingResult::stable).isPresent()) {
        double low = i == 0 ? plot.getDomainAxis().getLowerBound() : between(order[i - 1], order[i]);
        double high = i == order.length - 1 ? plot.getDomainAxis().getUpperBound() : between(order[i], order[i + 1]);
        IntervalMarker marker = new IntervalMarker(low, high);
        marker.setPaint(style.shade());
        marker.setAlpha(1f);
        plot.addDomainMarker(marker, Layer.BACKGROUND);
      }
    }
  }

  private double between(int first, int second) {
    double low = input.numbers().get(first);
    double high = input.numbers().get(second);
    return input.wide() ? Math.sqrt(low * high) : 0.5 * (low + high);
  }
}
