package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.archspan.reference.UniformAtmosphere;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;

/** Cosmic rays that diffuse at a finite rate stiffen fast growth and long waves only: no branch may be lost for that. */
class DiffusionMarginTest {
  private static final int SCAN = 400;

  /** Against the closed form (Parker 1966). */
  @RepeatedTest(60)
  void everyBranchOfTheExactAtmosphereIsFound(RepetitionInfo repetition) {
    Random random = new Random(7000 + repetition.getCurrentRepetition());
    double alpha = Math.pow(10.0, -0.5 + random.nextDouble());
    double beta = 0.3 + 1.2 * random.nextDouble();
    double gasIndex = 0.9 + 0.5 * random.nextDouble();
    double diffusivity = Math.pow(10.0, -2.0 + 4.0 * random.nextDouble());
    double top = 6.0 + 10.0 * random.nextDouble();
    UniformAtmosphere exact = new UniformAtmosphere(alpha, beta, gasIndex, 4.0 / 3.0, diffusivity);
    ModeSolver solver = ExactGrowthTest.solver(exact, top, 0.0, 1e-8);
    for (int order = 0; order < 3; order++) {
      double marginal = exact.marginalWavenumber(0.0, (order + 1) * Math.PI / top);
      FastestMode found = FastestMode.find(solver, order, 0.0, Double.POSITIVE_INFINITY, 0.0);
      // 1e-8 of the wavenumber: the tolerance asked for
      assertThat(solver.marginalWavenumber(order) / solver.scales().length())
          .isCloseTo(marginal, within(1e-8 * marginal));
      assertThat(found.root().isPresent()).isEqualTo(marginal > 0.0);
      double fastest = 0.0;
      for (int i = 1; i < SCAN && marginal > 0.0; i++) {
        fastest = Math.max(fastest, exact.growthRate(marginal * i / SCAN, 0.0, top, order + 1));
      }
      double growth = found.root().map(GrowthRoot::growth).orElse(0.0) / solver.scales().time();
      // the proof leaves 1e-4 above the fastest branch, 1e-2 above the others; 1e-3: a scan passes beside the peak
      assertThat(growth).isBetween(fastest * (order == 0 ? 1.0 - 1e-4 : 1.0 - 1e-2), fastest * (1.0 + 1e-3));
    }
  }
}
