package org.archspan.shear;

/** Growth of the fastest mode of a column that rotates rigidly, at a fixed wavevector. */
final class RigidGrowth {
  private static final double STEP = 0.1;
  private static final int STEPS = 800;
  private static final int WINDOW = 100;
  private static final int MOST_ROUNDS = 40;
  private static final double ALIKE = 0.05;

  private RigidGrowth() {
  }

  /**
   * Growth rate in units of the column; 0 where nothing grows, NaN where what grows oscillates. Found from the late growth of
   * a random motion, then as a zero of the response of the column to a fixed force.
   */
  static double of(ShearingColumn column, double angularSpeed, double ky) {
    DiskFlow flow = new DiskFlow(angularSpeed, 0.0);
    WindingWave winding = new WindingWave(column, flow, Composition.MIDPOINT);
    double[] energy = new double[STEPS + 1];
    BestKick kick = new BestKick(winding, ky, STEP, 1);
    winding.run(kick.kick(), ky, STEP, STEPS, (at, now, wave) -> energy[at] = winding.kineticEnergy(wave));
    double late = 0.5 * Math.log(energy[STEPS] / energy[STEPS - WINDOW]) / (WINDOW * STEP);
    double before = 0.5 * Math.log(energy[STEPS - WINDOW] / energy[STEPS - 2 * WINDOW]) / (WINDOW * STEP);
    if (!(late > 1.0 / (STEPS * STEP))) {
      return 0.0;
    }
    double root = zero(new StepMatrix(column), column, flow, ky, late, Math.abs(late - before) + 1e-4 * late);
    return Math.abs(root / late - 1.0) < ALIKE ? root : Double.NaN;
  }

  /** Secant iteration on the inverse response, whose zeros are the growth rates. */
  private static double zero(StepMatrix matrix, ShearingColumn column, DiskFlow flow, double ky, double guess,
      double width) {
    double last = guess + width;
    double now = guess;
    double lastValue = inverseResponse(matrix, column, flow, ky, last);
    for (int round = 0; round < MOST_ROUNDS; round++) {
      double value = inverseResponse(matrix, column, flow, ky, now);
      double change = value * (now - last) / (value - lastValue);
      last = now;
      lastValue = value;
      now -= change;
      if (!(Math.abs(change) > 1e-13 * Math.abs(now))) {
        return now;
      }
    }
    return Double.NaN;
  }

  private static double inverseResponse(StepMatrix matrix, ShearingColumn column, DiskFlow flow, double ky, double s) {
    matrix.factor(s, ky, flow);
    double[] force = new double[column.nodes()];
    double[] slopeForce = new double[column.nodes()];
    double[] answer = new double[column.nodes()];
    double[] height = column.mesh.nodes();
    for (int i = 0; i < force.length; i++) {
      force[i] = 1.0 + 0.1 * height[i];
    }
    double[] given = force.clone();
    matrix.solve(slopeForce, force, answer);
    double product = 0.0;
    for (int i = 0; i < force.length; i++) {
      product += column.weight[i] * given[i] * answer[i];
    }
    return 1.0 / product;
  }
}
