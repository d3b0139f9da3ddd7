package org.archspan.inference;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.DoubleFunction;
import org.archspan.uncertainty.DrawRow;

/**
 * All intervals of an input that reproduce an observed spacing. The relation need not be monotonic, may end where
 * the gas is stable, and may jump where another mode takes over. It is followed from point to point of a scan;
 * between two points that lie on either side of the observation, and beside a point that is nearer to it than its
 * neighbours, it is followed further. An interval between two points of the scan that shows on neither is missed.
 */
public final class IntervalSearch {
  private static final int HALVINGS = 40;
  private static final double SETTLED = 1e-9;
  private static final int NARROWINGS = 30;
  private static final double GOLDEN = 0.5 * (Math.sqrt(5.0) - 1.0);

  private final DoubleFunction<DrawRow> relation;
  private final ObservedSpacing observed;
  private final TreeMap<Double, DrawRow> known = new TreeMap<>();
  private int jumps;

  /**
   * A search.
   *
   * @param relation the row for a value of the input, in its unit
   */
  public IntervalSearch(DoubleFunction<DrawRow> relation, ObservedSpacing observed) {
    this.relation = relation;
    this.observed = observed;
  }

  /**
   * The intervals, ascending.
   *
   * @param scan rows by the value of the input in its unit, at least two
   */
  public List<ReproducingInterval> search(Map<Double, DrawRow> scan) {
    known.putAll(scan);
    List<Double> points = List.copyOf(known.keySet());
    for (int i = 0; i + 1 < points.size(); i++) {
      crossing(points.get(i), points.get(i + 1));
    }
    for (int i = 1; i + 1 < points.size(); i++) {
      nearest(points.get(i - 1), points.get(i), points.get(i + 1));
    }
    return collected();
  }

  /** How often the relation jumps over the observation. */
  public int jumps() {
    return jumps;
  }

  private DrawRow at(double value) {
    return known.computeIfAbsent(value, relation::apply);
  }

  private double excess(double value) {
    DrawRow row = at(value);
    return row.hasSpacing() ? row.wavelength() - observed.wavelength() : Double.NaN;
  }

  private boolean inside(double value) {
    return observed.reproducedBy(at(value));
  }

  /** Between a point below the observation and one above it lies a point that meets it, or a jump. */
  private void crossing(double first, double second) {
    double low = first;
    double high = second;
    if (inside(low) || inside(high) || !(excess(low) * excess(high) < 0.0)) {
      return;
    }
    for (int step = 0; step < HALVINGS && high - low > SETTLED * Math.abs(high); step++) {
      double middle = 0.5 * (low + high);
      if (inside(middle)) {
        return;
      }
      if (excess(low) * excess(middle) < 0.0) {
        high = middle;
      } else if (excess(middle) * excess(high) < 0.0) {
        low = middle;
      } else {
        return;
      }
    }
    jumps++;
  }

  /** Golden section towards the least distance beside a point that is nearer than both its neighbours. */
  private void nearest(double left, double middle, double right) {
    double here = observed.distance(at(middle));
    if (inside(middle) || !(here <= observed.distance(at(left)) && here <= observed.distance(at(right)))
        || Double.isInfinite(here)) {
      return;
    }
    double low = left;
    double high = right;
    for (int step = 0; step < NARROWINGS; step++) {
      double lower = high - GOLDEN * (high - low);
      double upper = low + GOLDEN * (high - low);
      if (inside(lower) || inside(upper)) {
        return;
      }
      if (observed.distance(at(lower)) < observed.distance(at(upper))) {
        high = upper;
      } else {
        low = lower;
      }
    }
  }

  /** Runs of points that reproduce the observation, their ends found by halving. */
  private List<ReproducingInterval> collected() {
    List<Double> points = List.copyOf(known.keySet());
    List<ReproducingInterval> intervals = new ArrayList<>();
    for (int i = 0; i < points.size();) {
      int last = i;
      if (inside(points.get(i))) {
        while (last + 1 < points.size() && inside(points.get(last + 1))) {
          last++;
        }
        boolean below = i == 0;
        boolean above = last + 1 == points.size();
        intervals.add(new ReproducingInterval(below ? points.get(0) : end(points.get(i), points.get(i - 1)),
            above ? points.get(last) : end(points.get(last), points.get(last + 1)), below, above));
      }
      i = last + 1;
    }
    return List.copyOf(intervals);
  }

  private double end(double within, double beyond) {
    double in = within;
    double out = beyond;
    for (int step = 0; step < HALVINGS && Math.abs(out - in) > SETTLED * Math.abs(in); step++) {
      double middle = 0.5 * (in + out);
      if (observed.reproducedBy(relation.apply(middle))) {
        in = middle;
      } else {
        out = middle;
      }
    }
    return in;
  }
}
