package org.archspan.figure;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/** A logarithmic axis whose labels read 10, 100 or powers of ten, with 2 and 5 between where there is room. */
final class DecadeAxis extends LogAxis {
  private static final long serialVersionUID = 1L;
  private static final String SUPERSCRIPTS = "\u2070\u00b9\u00b2\u00b3\u2074\u2075\u2076\u2077\u2078\u2079";

  DecadeAxis(String label) {
    super(label);
    setSmallestValue(1e-300);
  }

  @Override
  public List<NumberTick> refreshTicks(Graphics2D graphics, AxisState state, Rectangle2D area, RectangleEdge edge) {
    boolean horizontal = RectangleEdge.isTopOrBottom(edge);
    TextAnchor anchor = horizontal ? TextAnchor.TOP_CENTER : TextAnchor.CENTER_RIGHT;
    double decades = Math.log10(getUpperBound() / getLowerBound());
    double roomPerDecade = (horizontal ? area.getWidth() : area.getHeight()) / decades;
    int step = (int) Math.max(1, Math.ceil((horizontal ? 30.0 : 14.0) / roomPerDecade));
    boolean between = roomPerDecade > (horizontal ? 80.0 : 40.0);
    List<NumberTick> ticks = new ArrayList<>();
    int first = (int) Math.floor(Math.log10(getLowerBound()));
    int last = (int) Math.ceil(Math.log10(getUpperBound()));
    for (int decade = first; decade <= last; decade++) {
      for (int digit = 1; digit <= 9; digit++) {
        double value = digit * Math.pow(10.0, decade);
        if (value >= getLowerBound() * (1.0 - 1e-9) && value <= getUpperBound() * (1.0 + 1e-9)) {
          boolean labelled = digit == 1 ? Math.floorMod(decade, step) == 0 : between && (digit == 2 || digit == 5);
          ticks.add(new NumberTick(labelled ? TickType.MAJOR : TickType.MINOR, value,
              labelled ? label(digit, decade) : "", anchor, TextAnchor.CENTER, 0.0));
        }
      }
    }
    return ticks;
  }

  private String label(int digit, int decade) {
    boolean powers = getLowerBound() < 0.0099 || getUpperBound() > 1.01e5;
    if (!powers) {
      return decade >= 0 ? String.format(Locale.ROOT, "%.0f", digit * Math.pow(10.0, decade))
          : String.format(Locale.ROOT, "%." + -decade + "f", digit * Math.pow(10.0, decade));
    }
    String power = "10" + superscript(decade);
    return digit == 1 ? power : digit + "\u00d7" + power;
  }

  static String superscript(int exponent) {
    StringBuilder text = new StringBuilder(exponent < 0 ? "\u207b" : "");
    for (char c : Integer.toString(Math.abs(exponent)).toCharArray()) {
      text.append(SUPERSCRIPTS.charAt(c - '0'));
    }
    return text.toString();
  }
}
