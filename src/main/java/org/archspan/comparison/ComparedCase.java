package org.archspan.comparison;

import java.util.List;
import java.util.Optional;
import org.archspan.spacing.SpacingResult;

/**
 * One combination of values and its answer.
 *
 * @param values one for each varied input, in their order
 * @param result present where there is an answer; that the gas is stable is one
 * @param reason why there is none; empty where there is
 */
public record ComparedCase(List<String> values, Optional<SpacingResult> result, String reason) {
  /** Whether there is no answer. */
  public boolean failed() {
    return result.isEmpty();
  }
}
