package org.archspan.shear;

/**
 * Displacement and velocity of a wave at one time, each times the root of the density, on the nodes of a column: along the
 * field (x), across it (y) and upward (z), as real amplitudes of {@code (-i x, -i y, z) exp(i k r)}; and what the relaxing
 * pressures remember. Mutable: the integrator that owns it moves it on.
 */
final class WaveState {
  final double[] x;
  final double[] y;
  final double[] z;
  final double[] xVelocity;
  final double[] yVelocity;
  final double[] zVelocity;
  /** One row of nodes for each relaxation. */
  final double[][] memory;

  WaveState(int nodes, int relaxations) {
    x = new double[nodes];
    y = new double[nodes];
    z = new double[nodes];
    xVelocity = new double[nodes];
    yVelocity = new double[nodes];
    zVelocity = new double[nodes];
    memory = new double[relaxations][nodes];
  }

  /** The same wave in arrays of its own. */
  WaveState copy() {
    WaveState copy = new WaveState(x.length, memory.length);
    System.arraycopy(x, 0, copy.x, 0, x.length);
    System.arraycopy(y, 0, copy.y, 0, x.length);
    System.arraycopy(z, 0, copy.z, 0, x.length);
    System.arraycopy(xVelocity, 0, copy.xVelocity, 0, x.length);
    System.arraycopy(yVelocity, 0, copy.yVelocity, 0, x.length);
    System.arraycopy(zVelocity, 0, copy.zVelocity, 0, x.length);
    for (int j = 0; j < memory.length; j++) {
      System.arraycopy(memory[j], 0, copy.memory[j], 0, x.length);
    }
    return copy;
  }
}
