package org.archspan.rivals;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * All instabilities of one gas, side by side.
 *
 * @param rivals     magnetic buoyancy first
 * @param layer      the gas as means over its column
 * @param interfaces as in the model
 */
public record RivalResult(List<Rival> rivals, LayerMeans layer, List<LayerInterface> interfaces) {
  /** Those that choose a wave, fastest first. */
  public List<Rival> contest() {
    return rivals.stream().filter(rival -> rival.outcome() == Rival.Outcome.GROWS)
        .sorted(Comparator.comparingDouble(Rival::growthRate).reversed()).toList();
  }

  /** Magnetic buoyancy. */
  public Rival buoyancy() {
    return rivals.get(0);
  }

  /** The fastest of all. */
  public Optional<Rival> winner() {
    return contest().stream().findFirst();
  }

  /** Whether a row that could be asked failed. */
  public boolean failed() {
    return rivals.stream().anyMatch(rival -> rival.outcome() == Rival.Outcome.FAILED);
  }
}
