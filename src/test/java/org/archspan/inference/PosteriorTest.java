package org.archspan.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.archspan.uncertainty.DrawDesign;
import org.archspan.uncertainty.DrawRow;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.uncertainty.Uncertainty;
import org.junit.jupiter.api.Test;

/** The posterior where it is known in closed form. */
class PosteriorTest {
  private static final double PRIOR_WIDTH = 3.0;
  private static final double ERROR = 1.5;
  private static final UncertainInput INPUT = new UncertainInput("x",
      new Uncertainty(Uncertainty.Shape.NORMAL, 20.0, PRIOR_WIDTH, Double.NEGATIVE_INFINITY,
      Double.POSITIVE_INFINITY), "", 1.0);

  private static Posterior posterior(UncertainInput input, ObservedSpacing observed, int draws) {
    Posterior posterior = new Posterior(observed, List.of(input));
    double[][] values = new DrawDesign(List.of(input), 1, false).values(0, draws);
    for (int i = 0; i < draws; i++) {
      posterior.add(new DrawRow(i, List.of(values[i][0]), DrawRow.Outcome.UNSTABLE, values[i][0], 1.0, 1.0, "", true,
          ""));
    }
    return posterior;
  }

  /** Spacing = input, both Gaussian: weights 1/s^2 and 1/e^2 add up; moments of the weights are Gaussian integrals. */
  @Test
  void gaussianPriorAndObservation() {
    double observed = 24.0;
    int draws = 16384;
    Posterior posterior = posterior(INPUT, new ObservedSpacing(observed, ERROR), draws);
    double s2 = PRIOR_WIDTH * PRIOR_WIDTH;
    double e2 = ERROR * ERROR;
    double width = Math.sqrt(1.0 / (1.0 / s2 + 1.0 / e2));
    double mean = (20.0 / s2 + observed / e2) * width * width;
    // 0.01: bins are 0.013 wide, and draws are even
    assertThat(posterior.after(0).quantile(0.5)).isCloseTo(mean, within(0.01));
    // 0.16 and 0.84 lie 0.99446 standard deviations from the middle of a normal distribution
    assertThat(posterior.after(0).quantile(0.84)).isCloseTo(mean + 0.99446 * width, within(0.01));
    assertThat(posterior.after(0).quantile(0.16)).isCloseTo(mean - 0.99446 * width, within(0.01));
    assertThat(posterior.before(0).quantile(0.84)).isCloseTo(20.0 + 0.99446 * PRIOR_WIDTH, within(0.01));
    double off = (observed - 20.0) * (observed - 20.0);
    double first = ERROR / Math.sqrt(e2 + s2) * Math.exp(-0.5 * off / (e2 + s2));
    double second = ERROR / Math.sqrt(e2 + 2.0 * s2) * Math.exp(-0.5 * off / (0.5 * e2 + s2));
    // 0.1 per cent: an even sequence integrates a Gaussian far better than that
    assertThat(posterior.foreseen()).isCloseTo(first, within(1e-3 * first));
    double effective = draws * first * first / second;
    assertThat(posterior.effectiveSize()).isCloseTo(effective, within(2e-3 * effective));
    assertThat(posterior.nearest()).isLessThan(0.01);
  }

  /** Equal weights below and above the geometric mean of a range in equal ratios. */
  @Test
  void equalRatios() {
    UncertainInput ratios = new UncertainInput("x",
        new Uncertainty(Uncertainty.Shape.RATIO_RANGE, 10.0, 100.0, 0.0, Double.POSITIVE_INFINITY), "", 1.0);
    Posterior posterior = posterior(ratios, new ObservedSpacing(10.0, 1e9), 4096);
    // 0.5 per cent: the width of a bin
    assertThat(posterior.after(0).quantile(0.5)).isCloseTo(10.0, within(0.05));
    assertThat(posterior.after(0).quantile(0.25)).isCloseTo(1.0, within(0.005));
    assertThat(posterior.effectiveSize()).isCloseTo(4096.0, within(1e-6));
  }

  @Test
  void drawsWithoutSpacingHaveNoWeight() {
    Posterior posterior = new Posterior(new ObservedSpacing(1.0, 0.1), List.of(INPUT));
    posterior.add(new DrawRow(0, List.of(20.0), DrawRow.Outcome.STABLE, Double.NaN, Double.NaN, Double.NaN, "", false,
        ""));
    posterior.add(new DrawRow(1, List.of(21.0), DrawRow.Outcome.FAILED, Double.NaN, Double.NaN, Double.NaN, "", false,
        "no"));
    assertThat(posterior.effectiveSize()).isZero();
    assertThat(posterior.failed()).isEqualTo(1);
    assertThat(posterior.nearest()).isInfinite();
    assertThat(posterior.after(0).quantile(0.5)).isNaN();
  }
}
