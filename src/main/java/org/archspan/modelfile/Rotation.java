package org.archspan.modelfile;

import java.util.OptionalDouble;

/**
 * Rotation of the disk at the radius of the model.
 *
 * @param angularSpeed        s^-1
 * @param epicyclicFrequency  s^-1; absent: twice the angular speed
 */
public record Rotation(OptionalDouble angularSpeed, OptionalDouble epicyclicFrequency) {
}
