package org.archspan.shear;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.archspan.mesh.Mesh;

/** Finds the winding at the start from which a wave gains most: a row of starts first, then between its best neighbours. */
final class StartSearch {
  private static final int STARTS = 9;
  private static final double TOLERANCE = 0.01;
  private static final double WINDING_TOLERANCE = 0.02;
  private static final int ROUNDS = 8;

  private final Swing swing;
  private final WindingWave winding;
  private final int steps;
  private final List<StartGain> gains = new ArrayList<>();

  StartSearch(Swing swing, Mesh mesh) {
    this.swing = swing;
    winding = swing.winding(swing.column(mesh));
    steps = swing.coarseSteps(winding.column());
  }

  /** All that was tried. */
  List<StartGain> gains() {
    return gains;
  }

  /** The best start between two windings, dimensionless. */
  StartGain best(double lowest, double highest) {
    int best = 0;
    double spacing = (highest - lowest) / (STARTS - 1);
    for (int i = 0; i < STARTS; i++) {
      gain(lowest + i * spacing);
      best = gains.get(i).eFoldings() > gains.get(best).eFoldings() ? i : best;
    }
    double peak = gains.get(best).winding();
    new BrentOptimizer(WINDING_TOLERANCE, WINDING_TOLERANCE).optimize(new MaxEval(30), GoalType.MAXIMIZE,
        new UnivariateObjectiveFunction(this::gain),
        new SearchInterval(Math.max(lowest, peak - spacing), Math.min(highest, peak + spacing), peak));
    return gains.stream().max(java.util.Comparator.comparingDouble(StartGain::eFoldings)).orElseThrow();
  }

  /** What one given start gains. */
  StartGain at(double start) {
    gain(start);
    return gains.get(gains.size() - 1);
  }

  private double gain(double start) {
    BestKick kick = swing.kick(winding, start, steps);
    kick.improve(TOLERANCE, ROUNDS);
    double eFoldings = 0.5 * Math.log(kick.gain());
    gains.add(new StartGain(swing.parity(), start, eFoldings));
    return eFoldings;
  }
}
