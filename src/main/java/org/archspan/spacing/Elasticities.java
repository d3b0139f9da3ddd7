package org.archspan.spacing;

import java.util.List;
import java.util.Optional;
import org.archspan.stability.PeakElasticity;

/**
 * How the growth rate and the wavelength of the peak that sets the spacing answer each input.
 *
 * @param inputs one entry for each, in the order of the model; empty where there is no such peak
 * @param remark what a reader must know of all of them, or why there are none; may be empty
 */
public record Elasticities(List<Elasticity> inputs, String remark) {
  /**
   * Those of one input.
   *
   * @param key   of the input
   * @param value the elasticities; empty where the input cannot be changed to both sides
   * @param why   it cannot; empty otherwise
   */
  public record Elasticity(String key, Optional<PeakElasticity> value, String why) {
  }

  static Elasticities none(String remark) {
    return new Elasticities(List.of(), remark);
  }
}
