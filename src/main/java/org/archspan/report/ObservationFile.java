package org.archspan.report;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParseException;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.archspan.inference.ObservedSpacing;
import org.archspan.table.ReadException;
import org.archspan.units.OutputUnits;
import org.archspan.units.Quantity;
import org.archspan.units.UnitException;

/** Reads the spacing and its error from the JSON document of an observation. */
public final class ObservationFile {
  private static final String FORM = "it needs \"spacing\": { \"value\": 2.0, \"unit\": \"kpc\", \"error\": 0.3 }";

  private ObservationFile() {
  }

  /**
   * The observed spacing, in units of the output.
   *
   * @throws ReadException when the file is not such a document
   */
  public static ObservedSpacing read(Path file, OutputUnits units) throws ReadException {
    try {
      JsonObject spacing = JsonParser.parseString(Files.readString(file)).getAsJsonObject().getAsJsonObject("spacing");
      double unit = units.length(Quantity.parse("1 " + spacing.get("unit").getAsString()).value());
      JsonElement error = spacing.get("error");
      ObservedSpacing observed =
          new ObservedSpacing(unit * spacing.get("value").getAsDouble(), unit * error.getAsDouble());
      if (observed.wavelength() > 0.0 && observed.error() > 0.0 && Double.isFinite(observed.wavelength())) {
        return observed;
      }
      throw new ReadException(file + " holds no positive spacing with a positive error; " + FORM);
    } catch (JsonParseException | IllegalStateException | ClassCastException | NullPointerException | UnitException
        | NumberFormatException | UnsupportedOperationException wrong) {
      throw new ReadException(file + " is not the document of an observation; " + FORM);
    } catch (ReadException known) {
      throw known;
    } catch (IOException fault) {
      throw new ReadException(file + " cannot be read: " + fault.getMessage());
    }
  }
}
