package org.archspan.disk;

import java.util.List;
import java.util.OptionalDouble;

/** The gas: what is known of its density and dispersion before the equilibrium is built. */
public sealed interface Gas {
  /** One isothermal gas; exactly one of its two amounts is present. Densities g cm^-3, surface density g cm^-2. */
  record Isothermal(double dispersion, OptionalDouble bottomDensity, OptionalDouble surfaceDensity) implements Gas {
  }

  /** Several isothermal components that share one potential; at least one. */
  record Components(List<GasComponent> components) implements Gas {
  }

  /**
   * A prescribed stratification of isothermal gas; the field is what the force balance leaves over.
   *
   * @param strata     at least one
   * @param dispersion isothermal speed, cm s^-1; absent when the midplane field is given and fixes it
   */
  record Stratified(List<GasStratum> strata, OptionalDouble dispersion) implements Gas {
  }

  /**
   * An atmosphere of layers, each with its own temperature; exactly one of the two amounts is present.
   *
   * @param layers         from below, at least one
   * @param bottomDensity  at the lower end, g cm^-3
   * @param surfaceDensity g cm^-2
   */
  record Layered(List<GasLayer> layers, OptionalDouble bottomDensity, OptionalDouble surfaceDensity) implements Gas {
  }
}
