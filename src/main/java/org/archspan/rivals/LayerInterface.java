package org.archspan.rivals;

/**
 * Two uniform layers of incompressible gas with an interface between them, level and at rest but for a shear along the
 * field; rigid walls bound them. CGS.
 *
 * @param name         what it is called in tables
 * @param densityBelow g cm^-3, positive
 * @param densityAbove g cm^-3, positive
 * @param fieldBelow   horizontal field below, G, not negative
 * @param fieldAbove   parallel to it above, G, not negative
 * @param shear        difference of velocity along the field, cm s^-1, not negative
 * @param gravity      towards the layer below, cm s^-2; negative: towards the one above
 * @param depthBelow   cm, positive, may be infinite
 * @param depthAbove   cm, positive, may be infinite
 */
public record LayerInterface(String name, double densityBelow, double densityAbove, double fieldBelow,
    double fieldAbove, double shear, double gravity, double depthBelow, double depthAbove) {
  /** Refuses values out of their range. */
  public LayerInterface {
    if (!(densityBelow > 0.0 && densityAbove > 0.0 && depthBelow > 0.0 && depthAbove > 0.0 && fieldBelow >= 0.0
        && fieldAbove >= 0.0 && shear >= 0.0 && Double.isFinite(gravity))) {
      throw new IllegalArgumentException("two layers need densities and depths above 0, fields and shear of 0 or more"
          + " and a finite gravity");
    }
  }

  /** As waves across field and shear see it, which feel neither. */
  LayerInterface acrossField() {
    return new LayerInterface(name, densityBelow, densityAbove, 0.0, 0.0, 0.0, gravity, depthBelow, depthAbove);
  }

  /** Weight that turns the interface over, {@code g (rho_above - rho_below)}, dyn cm^-3; negative: it restores. */
  double overturningWeight() {
    return gravity * (densityAbove - densityBelow);
  }
}
