package org.archspan.catalogue;

import java.util.List;
import org.archspan.units.Dimension;
import org.archspan.units.Quantity;
import org.archspan.units.UnitException;

/**
 * The centre of a galaxy in the coordinates of a table.
 *
 * @param first  as the first coordinate of the table, in rad; in cm, for positions in the plane
 * @param second as the second, in rad; in cm, for positions in the plane
 */
public record SkyCentre(double first, double second) {
  /** The origin of offsets. */
  public static final SkyCentre ORIGIN = new SkyCentre(0.0, 0.0);

  /**
   * Reads two numbers with units, separated by a comma: {@code "24.174 deg, 15.783 deg"}.
   *
   * @throws UnitException when it is something else
   */
  public static SkyCentre parse(String text, Complexes.Kind kind) throws UnitException {
    List<String> parts = List.of(text.split(","));
    Dimension needed = kind == Complexes.Kind.PLANE ? new Dimension(2, 0, 0, 0) : Dimension.NONE;
    if (parts.size() != 2) {
      throw new UnitException("found \"" + text + "\"; two values separated by a comma are needed");
    }
    double[] values = new double[2];
    for (int i = 0; i < 2; i++) {
      Quantity quantity = Quantity.parse(parts.get(i).strip());
      if (!quantity.dimension().equals(needed) || Quantity.unitOf(parts.get(i).strip()).isEmpty()) {
        throw new UnitException("found \"" + parts.get(i).strip() + "\"; " + (needed.equals(Dimension.NONE)
            ? "an angle with its unit is needed, such as 24.174 deg" : "a length with its unit is needed, such as 0"
            + " kpc"));
      }
      values[i] = quantity.value();
    }
    return new SkyCentre(values[0], values[1]);
  }

  /**
   * Offsets to the east and to the north (rad) of a point on the sky (rad), on the tangent plane at this centre.
   *
   * <p>Source: Calabretta and Greisen (2002), A and A 395, 1077, section 5.1.3.
   */
  public double[] offsets(double rightAscension, double declination) {
    double turn = rightAscension - first;
    double depth = Math.sin(second) * Math.sin(declination) + Math.cos(second) * Math.cos(declination) * Math.cos(turn);
    return new double[] {Math.cos(declination) * Math.sin(turn) / depth,
        (Math.cos(second) * Math.sin(declination) - Math.sin(second) * Math.cos(declination) * Math.cos(turn)) / depth};
  }
}
