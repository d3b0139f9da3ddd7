package org.archspan.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Where an observation comes from.
 *
 * @param file     the table
 * @param names    of the complexes, as they stand in it
 * @param geometry inclination, position angle, distance and centre as given; empty for positions in the plane
 * @param seed     of the random numbers
 */
public record ObservationSource(String file, List<String> names, Map<String, String> geometry, long seed) {
  /** Keeps the order of the geometry. */
  public ObservationSource {
    names = List.copyOf(names);
    geometry = new LinkedHashMap<>(geometry);
  }

  ModelEcho echo() {
    Map<String, String> inputs = new LinkedHashMap<>(geometry);
    inputs.put("seed", Long.toString(seed));
    return new ModelEcho(file, "Complexes along an arm", inputs);
  }
}
