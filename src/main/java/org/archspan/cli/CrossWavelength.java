package org.archspan.cli;

import org.archspan.units.Dimension;
import org.archspan.units.Quantity;
import org.archspan.units.UnitException;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * A wavelength on the command line.
 *
 * @param centimetres may be infinite
 */
record CrossWavelength(double centimetres) {
  /** Wavenumber, cm^-1. */
  double wavenumber() {
    return 2.0 * Math.PI / centimetres;
  }

  /** Reads "infinite" or a length with a unit. */
  static final class Converter implements ITypeConverter<CrossWavelength> {
    @Override
    public CrossWavelength convert(String text) {
      if (text.equals("infinite")) {
        return new CrossWavelength(Double.POSITIVE_INFINITY);
      }
      try {
        Quantity quantity = Quantity.parse(text);
        if (quantity.dimension().equals(new Dimension(2, 0, 0, 0)) && quantity.value() > 0.0) {
          return new CrossWavelength(quantity.value());
        }
      } catch (UnitException fault) {
        throw new TypeConversionException(fault.getMessage());
      }
      throw new TypeConversionException("\"" + text + "\" is not a positive length such as \"2 kpc\"");
    }
  }
}
