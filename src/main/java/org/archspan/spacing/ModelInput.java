package org.archspan.spacing;

import java.util.function.DoubleFunction;
import org.archspan.disk.Disk;

/**
 * One number that a model is given, and the model with that number changed.
 *
 * @param key    its name in the model file
 * @param scaled the model with the number times a factor (dimensionless); throws
 *               {@link org.archspan.disk.RefusedModelException} when that is none
 */
public record ModelInput(String key, DoubleFunction<Scaled> scaled) {
  /**
   * What a changed number makes.
   *
   * @param disk    the physics
   * @param options what to search
   */
  public record Scaled(Disk disk, SearchOptions options) {
  }
}
