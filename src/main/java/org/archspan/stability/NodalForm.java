package org.archspan.stability;

import org.archspan.boundary.TopBoundary;

/**
 * The condensed form of a problem at the nodes of a mesh, with what the gas's own gravity and the top add: everything that a
 * matrix or a vector needs of the physics. In {@link Scales}. Owns its work arrays: one instance for one thread.
 */
final class NodalForm {
  final CondensedForm light;
  /** What the perturbed gravity adds; without room where the gas is light. */
  final PotentialForm potential;
  final TopCondition top;
  /** The wave, or the interval of waves, to be set before {@link #fill}. */
  final WaveSquared wave = new WaveSquared();
  private final Atmosphere atmosphere;
  private final PressureResponse response;
  private final TurningForm turning;

  NodalForm(Atmosphere atmosphere, PressureResponse response, TopBoundary topBoundary) {
    this.atmosphere = atmosphere;
    this.response = response;
    light = new CondensedForm(atmosphere.nodes());
    turning = new TurningForm(atmosphere.turning ? atmosphere.nodes() : 0, response);
    potential = new PotentialForm(atmosphere.gravitating ? atmosphere.nodes() : 0);
    top = new TopCondition(topBoundary);
  }

  /**
   * Fills all coefficients. O(nodes), no allocation.
   *
   * @param growth    s, positive
   * @param softestAt wavenumber at which the cosmic rays are softest
   * @return whether the number of modes is finite: not where the waves above an open top propagate
   */
  boolean fill(double growth, double softestAt) {
    double growthSquared = growth * growth;
    if (atmosphere.turning) {
      turning.fill(light, atmosphere, growth, wave, softestAt);
    } else {
      response.evaluate(growth, softestAt);
      light.fill(atmosphere, 0, atmosphere.nodes(), growthSquared, wave, response.gas, response.cosmicRay);
    }
    if (!top.evaluate(light, atmosphere, atmosphere.nodes() - 1)) {
      return false;
    }
    if (atmosphere.gravitating && atmosphere.turning) {
      potential.fill(atmosphere, wave, turning);
    } else if (atmosphere.gravitating) {
      potential.fill(atmosphere, growthSquared, wave, light.stiffness());
    }
    return true;
  }
}
