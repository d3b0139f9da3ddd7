package org.archspan.catalogue;

import java.util.List;

/**
 * A table of complexes, in CGS and radians.
 *
 * @param kind   what the two coordinates are
 * @param names  of the complexes
 * @param first  to the east, right ascension, or x; in rad; in cm, for positions in the plane
 * @param second to the north, declination, or y; in rad; in cm, for positions in the plane
 * @param error  standard error of both, in rad; in cm, for positions in the plane; 0 where none is given
 */
public record Complexes(Kind kind, List<String> names, double[] first, double[] second, double[] error) {
  /** Kinds of coordinates. */
  public enum Kind {
    /** Offsets on the sky to the east and to the north. */
    OFFSETS("east", "north"),
    /** Right ascension and declination. */
    SKY("ra", "dec"),
    /** Positions in the plane of the disk. */
    PLANE("x", "y");

    private final String first;
    private final String second;

    Kind(String first, String second) {
      this.first = first;
      this.second = second;
    }

    /** Names of the two columns. */
    public List<String> columns() {
      return List.of(first, second);
    }
  }
}
