package org.archspan.shear;

/** Waves that start as motion alone: neither displacement nor memory, only a velocity at each height. */
final class Kick {
  private Kick() {
  }

  /** The product of three amplitudes with the velocity of a wave, by weight, in units of the column. */
  static double product(ShearingColumn column, double[] x, double[] y, double[] z, WaveState wave) {
    double sum = 0.0;
    for (int i = 0; i < column.weight.length; i++) {
      sum += column.weight[i] * (x[i] * wave.xVelocity[i] + y[i] * wave.yVelocity[i] + z[i] * wave.zVelocity[i]);
    }
    return sum;
  }

  /**
   * The adjoint wave whose product with any other is that of the velocities at its start: their velocity as displacement,
   * and the velocity that undoes the Coriolis term of the product.
   */
  static WaveState asAdjoint(WaveState wave, WindingWave winding) {
    WaveState adjoint = winding.rest();
    double coriolis = 2.0 * winding.flow().angularSpeed();
    for (int i = 0; i < wave.x.length; i++) {
      adjoint.x[i] = wave.xVelocity[i];
      adjoint.y[i] = wave.yVelocity[i];
      adjoint.z[i] = wave.zVelocity[i];
      adjoint.xVelocity[i] = -coriolis * wave.yVelocity[i];
      adjoint.yVelocity[i] = coriolis * wave.xVelocity[i];
    }
    return adjoint;
  }
}
