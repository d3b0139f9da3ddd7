package org.archspan.cli;

import org.archspan.units.Dimension;
import org.archspan.units.Quantity;
import org.archspan.units.UnitException;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * A span of time on the command line.
 *
 * @param seconds positive
 */
record TimeSpan(double seconds) {
  /** Reads a time with a unit. */
  static final class Converter implements ITypeConverter<TimeSpan> {
    @Override
    public TimeSpan convert(String text) {
      try {
        Quantity quantity = Quantity.parse(text);
        if (quantity.dimension().equals(new Dimension(0, 0, 2, 0)) && quantity.value() > 0.0) {
          return new TimeSpan(quantity.value());
        }
      } catch (UnitException fault) {
        throw new TypeConversionException(fault.getMessage());
      }
      throw new TypeConversionException("\"" + text + "\" is not a positive time such as \"200 Myr\"");
    }
  }
}
