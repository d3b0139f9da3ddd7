package org.archspan.comparison;

import java.util.List;
import org.archspan.spacing.SpacingResult;

/** A model whose inputs take other values. Must be safe for several threads. */
@FunctionalInterface
public interface VariedModel {
  /**
   * Solves the model with one combination of values.
   *
   * @param values one for each varied input
   * @throws org.archspan.disk.RefusedModelException  when it is not a model, or has no equilibrium
   * @throws org.archspan.stability.UnsolvedException when the tolerance is missed
   */
  SpacingResult solve(List<String> values);
}
