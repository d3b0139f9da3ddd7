package org.archspan.shear;

/**
 * One step of the implicit midpoint rule. It keeps every quadratic invariant of the wave exactly where the wavevector stands
 * still, so it neither feeds nor drains a wave; each step factors one matrix.
 *
 * <p>Owns its work arrays: one instance for one thread.
 */
final class MidpointRule {
  private final ShearingColumn column;
  private final StepMatrix matrix;
  private final double[] x;
  private final double[] y;
  private final double[] z;
  private final double[] slopeForce;
  private final double[] valueForce;
  private long factorisations;

  MidpointRule(ShearingColumn column) {
    this.column = column;
    matrix = new StepMatrix(column);
    int nodes = column.nodes();
    x = new double[nodes];
    y = new double[nodes];
    z = new double[nodes];
    slopeForce = new double[nodes];
    valueForce = new double[nodes];
  }

  long factorisations() {
    return factorisations;
  }

  /**
   * Moves a wave on.
   *
   * @param h  step, may be negative
   * @param ky wavenumber across the field in the middle of the step
   * @return whether the matrix had positive pivots; otherwise the step is too long and the state is meaningless
   */
  boolean step(WaveState wave, double h, double ky, DiskFlow flow) {
    double s = 2.0 / h;
    factorisations++;
    boolean positive = matrix.factor(s, ky, flow);
    force(wave, s, ky, flow);
    NodeElimination node = matrix.node();
    node.reduceForces(x, y, slopeForce, valueForce);
    matrix.solve(slopeForce, valueForce, z);
    expand();
    node.recover(z, slopeForce, x, y);
    remember(wave, s, ky);
    advance(wave.x, wave.xVelocity, x, s);
    advance(wave.y, wave.yVelocity, y, s);
    advance(wave.z, wave.zVelocity, z, s);
    return positive;
  }

  /** Right-hand sides: inertia, Coriolis force and what the relaxing pressures remember. */
  private void force(WaveState wave, double s, double ky, DiskFlow flow) {
    double coriolis = 2.0 * flow.angularSpeed() * s;
    for (int i = 0; i < x.length; i++) {
      double remembered = 0.0;
      for (int j = 0; j < wave.memory.length; j++) {
        Relaxation relaxation = column.relaxations.get(j);
        remembered += relaxation.modulus()[i] * s / (s + relaxation.rate()) * wave.memory[j][i];
      }
      x[i] = s * (s * wave.x[i] + wave.xVelocity[i]) - coriolis * wave.y[i] + column.kx * remembered;
      y[i] = s * (s * wave.y[i] + wave.yVelocity[i]) + coriolis * wave.x[i] + ky * remembered;
      valueForce[i] = s * (s * wave.z[i] + wave.zVelocity[i]);
      slopeForce[i] = remembered;
    }
  }

  /** Leaves z' + z/(2 H) in slopeForce. */
  private void expand() {
    column.differentiate(z, slopeForce);
    for (int i = 0; i < z.length; i++) {
      slopeForce[i] += 0.5 * column.inverseScaleHeight[i] * z[i];
    }
  }

  private void remember(WaveState wave, double s, double ky) {
    for (int j = 0; j < wave.memory.length; j++) {
      double rate = column.relaxations.get(j).rate();
      double[] memory = wave.memory[j];
      for (int i = 0; i < memory.length; i++) {
        double divergence = column.kx * x[i] + ky * y[i] + slopeForce[i];
        double middle = (s * memory[i] + rate * divergence) / (s + rate);
        memory[i] = 2.0 * middle - memory[i];
      }
    }
  }

  private static void advance(double[] position, double[] velocity, double[] middle, double s) {
    for (int i = 0; i < middle.length; i++) {
      double change = middle[i] - position[i];
      velocity[i] = 2.0 * s * change - velocity[i];
      position[i] = middle[i] + change;
    }
  }
}
