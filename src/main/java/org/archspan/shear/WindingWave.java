package org.archspan.shear;

/**
 * A wave that differential rotation winds up, stepped in time at a fixed length of step. Units of the column.
 *
 * <p>Owns its work arrays: one instance for one thread.
 */
final class WindingWave {
  /** Sees the wave after each step. */
  interface Observer {
    void see(int step, double ky, WaveState wave);
  }

  private final ShearingColumn column;
  private final DiskFlow flow;
  private final Composition composition;
  private final MidpointRule rule;

  WindingWave(ShearingColumn column, DiskFlow flow, Composition composition) {
    this.column = column;
    this.flow = flow;
    this.composition = composition;
    rule = new MidpointRule(column);
  }

  ShearingColumn column() {
    return column;
  }

  DiskFlow flow() {
    return flow;
  }

  long factorisations() {
    return rule.factorisations();
  }

  /** A wave that neither moves nor stands out. */
  WaveState rest() {
    return new WaveState(column.nodes(), column.relaxations.size());
  }

  /**
   * Moves a wave through so many steps. O(steps * elements * degree^3).
   *
   * @param start    ky at the first moment
   * @param step     length of a step, positive
   * @param observer also sees the wave before the first step, as step 0
   * @return whether every step was short enough to have a well-posed matrix
   */
  boolean run(WaveState wave, double start, double step, int steps, Observer observer) {
    return run(wave, start, flow.shear() * column.kx, flow, step, steps, observer);
  }

  /**
   * The adjoint of {@link #run}: the same wave backwards in time, with the Coriolis force reversed. What it keeps together
   * with a wave that runs forward is, at a wave at rest, the product of displacement here and velocity there.
   *
   * @param end ky at the last moment, where this begins
   */
  boolean runBack(WaveState wave, double end, double step, int steps) {
    return run(wave, end, -flow.shear() * column.kx, flow.adjoint(), step, steps, (at, ky, state) -> { });
  }

  private boolean run(WaveState wave, double start, double winding, DiskFlow sense, double step, int steps,
      Observer observer) {
    boolean wellPosed = true;
    observer.see(0, start, wave);
    for (int at = 0; at < steps; at++) {
      double passed = 0.0;
      for (double share : composition.shares()) {
        double middle = start + winding * step * (at + passed + 0.5 * share);
        wellPosed &= rule.step(wave, share * step, middle, sense);
        passed += share;
      }
      observer.see(at + 1, start + winding * step * (at + 1), wave);
    }
    return wellPosed;
  }

  /** Kinetic energy of a wave, the mean square of its velocity by weight, in units of the column. */
  double kineticEnergy(WaveState wave) {
    double sum = 0.0;
    for (int i = 0; i < column.weight.length; i++) {
      sum += column.weight[i] * (wave.xVelocity[i] * wave.xVelocity[i] + wave.yVelocity[i] * wave.yVelocity[i]
          + wave.zVelocity[i] * wave.zVelocity[i]);
    }
    return 0.5 * sum;
  }
}
