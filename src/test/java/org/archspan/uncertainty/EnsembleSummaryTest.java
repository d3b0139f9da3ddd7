package org.archspan.uncertainty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

/** Running ensembles and summing them up. */
class EnsembleSummaryTest {
  private static final DrawDesign DESIGN = new DrawDesign(List.of(new UncertainInput("x",
      new Uncertainty(Uncertainty.Shape.FACTOR, 100.0, 1.5, 0.0, Double.POSITIVE_INFINITY), "", 1.0)), 4, false);

  private static DrawRow row(long draw, double[] values) {
    DrawRow.Outcome outcome = draw % 10 == 3 ? DrawRow.Outcome.STABLE
        : draw % 100 == 7 ? DrawRow.Outcome.FAILED : DrawRow.Outcome.UNSTABLE;
    boolean unstable = outcome == DrawRow.Outcome.UNSTABLE;
    return new DrawRow(draw, List.of(values[0]), outcome, unstable ? values[0] : Double.NaN,
        unstable ? 2.0 * values[0] : Double.NaN, unstable ? 1.0 : Double.NaN, unstable ? draw % 2 == 0 ? "lid"
        : "disk" : "", true, outcome == DrawRow.Outcome.FAILED ? "no state" : "");
  }

  @Test
  void rowsComeInOrderWhateverTheThreads() {
    List<DrawRow> one = new ArrayList<>();
    List<DrawRow> four = new ArrayList<>();
    try (EnsembleRun run = new EnsembleRun(DESIGN, EnsembleSummaryTest::row, 1)) {
      run.solve(100, 1100, one::add);
    }
    try (EnsembleRun run = new EnsembleRun(DESIGN, EnsembleSummaryTest::row, 4)) {
      run.solve(100, 777, four::add);
      run.solve(777, 1100, four::add);
    }
    assertThat(four).isEqualTo(one);
    assertThat(one).hasSize(1000);
    assertThat(one.get(0).draw()).isEqualTo(100);
  }

  /** Quantiles of the log-normal distribution that was drawn: e^(ln 1.5 q). */
  @Test
  void quantilesAndCounts() {
    EnsembleSummary summary = new EnsembleSummary(DESIGN);
    try (EnsembleRun run = new EnsembleRun(DESIGN, EnsembleSummaryTest::row, 2)) {
      run.solve(0, 20000, summary::add);
    }
    assertThat(summary.draws()).isEqualTo(20000);
    assertThat(summary.stable()).isEqualTo(2000);
    assertThat(summary.failed()).isEqualTo(200);
    assertThat(summary.heldBy("lid")).isEqualTo(10000);
    assertThat(summary.reasons()).containsExactly(java.util.Map.entry("no state", 200L));
    NormalDistribution normal = new NormalDistribution();
    for (double share : new double[] {0.025, 0.16, 0.5, 0.84, 0.975}) {
      double expected = 100.0 * Math.pow(1.5, normal.inverseCumulativeProbability(share));
      // 1 per cent: draws that are left out break the evenness of the sequence
      assertThat(summary.wavelength().quantile(share)).isCloseTo(expected, within(0.01 * expected));
      assertThat(summary.growthTime().quantile(share)).isCloseTo(2.0 * expected, within(0.02 * expected));
    }
    // one value in all draws: the width of a bin
    assertThat(summary.mass().quantile(0.5)).isCloseTo(1.0, within(3e-4));
    assertThat(summary.wavelength().share(100.0, 150.0)).isCloseTo(0.3413, within(0.01));
  }

  @Test
  void nothingToSumUp() {
    EnsembleSummary summary = new EnsembleSummary(DESIGN);
    assertThat(summary.draws()).isZero();
    assertThat(summary.wavelength().quantile(0.5)).isNaN();
  }
}
