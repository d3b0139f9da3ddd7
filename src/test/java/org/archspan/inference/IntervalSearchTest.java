package org.archspan.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;
import java.util.function.DoubleUnaryOperator;
import org.archspan.uncertainty.DrawRow;
import org.junit.jupiter.api.Test;

/** Intervals of relations whose answer is known. */
class IntervalSearchTest {
  private int jumps;

  private static DrawRow row(double x, double spacing) {
    return new DrawRow(-1, List.of(x), Double.isNaN(spacing) ? DrawRow.Outcome.STABLE : DrawRow.Outcome.UNSTABLE,
        spacing, 1.0, 1.0, "disk", true, "");
  }

  /** Low and high ends one after another, from a scan of 0, 1, ..., 10. */
  private List<Double> ends(DoubleUnaryOperator relation, double observed, double error) {
    TreeMap<Double, DrawRow> scan = new TreeMap<>();
    for (int i = 0; i <= 10; i++) {
      scan.put((double) i, row(i, relation.applyAsDouble(i)));
    }
    IntervalSearch search = new IntervalSearch(x -> row(x, relation.applyAsDouble(x)), new ObservedSpacing(observed,
        error));
    List<Double> ends = new ArrayList<>();
    search.search(scan).forEach(one -> ends.addAll(List.of(one.low(), one.high())));
    jumps = search.jumps();
    return ends;
  }

  private static void assertEnds(List<Double> ends, double... expected) {
    assertThat(ends).hasSize(expected.length);
    for (int i = 0; i < expected.length; i++) {
      // 1e-8: halving stops at 1e-9 of the value
      assertThat(ends.get(i)).isCloseTo(expected[i], within(1e-8 * Math.max(1.0, expected[i])));
    }
  }

  @Test
  void monotonic() {
    assertEnds(ends(x -> 2.0 * x + 1.0, 8.0, 1.5), 2.75, 4.25);
  }

  @Test
  void narrowerThanAStepOfTheScan() {
    assertEnds(ends(x -> 2.0 * x + 1.0, 8.0, 0.01), 3.495, 3.505);
  }

  /** (x - 5)^2 + 1 within 5 +- 1: |x - 5| between sqrt 3 and sqrt 5. */
  @Test
  void twoIntervalsOfAValley() {
    double root3 = Math.sqrt(3.0);
    double root5 = Math.sqrt(5.0);
    assertEnds(ends(x -> (x - 5.0) * (x - 5.0) + 1.0, 5.0, 1.0), 5.0 - root5, 5.0 - root3, 5.0 + root3, 5.0 + root5);
  }

  /** 20 - (x - 5.5)^2 touches 20 +- 0.01 between two points of the scan, both below it. */
  @Test
  void theTopOfAHillBetweenTwoPoints() {
    assertEnds(ends(x -> 20.0 - (x - 5.5) * (x - 5.5), 20.0, 0.01), 5.4, 5.6);
  }

  @Test
  void endsWhereTheGasIsStable() {
    double edge = Math.PI;
    assertEnds(ends(x -> x < edge ? 4.0 + 0.1 * x : Double.NaN, 4.3, 0.1), 2.0, edge);
  }

  @Test
  void reachesTheEndsOfTheRange() {
    TreeMap<Double, DrawRow> scan = new TreeMap<>();
    for (double x = 0.0; x <= 2.0; x += 1.0) {
      scan.put(x, row(x, 5.0));
    }
    List<ReproducingInterval> all =
        new IntervalSearch(x -> row(x, 5.0), new ObservedSpacing(5.0, 1.0)).search(scan);
    assertThat(all).containsExactly(new ReproducingInterval(0.0, 2.0, true, true));
  }

  @Test
  void aJumpOverTheObservationIsNoInterval() {
    assertThat(ends(x -> x < 4.3 ? 1.0 : 9.0, 5.0, 1.0)).isEmpty();
    assertThat(jumps).isEqualTo(1);
  }

  @Test
  void nothingReachesTheObservation() {
    assertThat(ends(x -> 1.0 + 0.1 * x, 50.0, 1.0)).isEmpty();
    assertThat(jumps).isZero();
    assertThat(ends(x -> Double.NaN, 50.0, 1.0)).isEmpty();
  }
}
