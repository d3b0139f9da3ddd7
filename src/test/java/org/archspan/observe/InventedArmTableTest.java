package org.archspan.observe;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;

/**
 * The shipped table of an invented galaxy is what its generator makes: 10 Mpc away, inclined by 35 deg, nodes at 60
 * deg.
 */
class InventedArmTableTest {
  private static final Path SHIPPED = Path.of("models", "invented-arm.ecsv");

  @Test
  void theShippedTableIsTheGenerators() throws IOException {
    StringBuilder text = new StringBuilder("""
        # %ECSV 1.0
        # ---
        # delimiter: ','
        # datatype:
        # - {name: name, datatype: string}
        # - {name: east, unit: arcsec, datatype: float64, description: 'offset from the centre'}
        # - {name: north, unit: arcsec, datatype: float64, description: 'offset from the centre'}
        # meta: {title: 'complexes of an invented galaxy: 10 Mpc, inclination 35 deg, position angle 60 deg',
        # truth: 'pitch angle 17 deg, spacing 1.6 kpc, 15 per cent of the sites empty, 3 strays'}
        # schema: astropy-2.0
        name,east,north
        """);
    List<double[]> plane = InventedArm.shipped().plane(1);
    double angle = Math.toRadians(60.0);
    for (int i = 0; i < plane.size(); i++) {
      double minor = plane.get(i)[1] * Math.cos(Math.toRadians(35.0));
      double arcsecPerKpc = Math.toDegrees(1e-4) * 3600.0;
      double east = arcsecPerKpc * (plane.get(i)[0] * Math.sin(angle) + minor * Math.cos(angle));
      double north = arcsecPerKpc * (plane.get(i)[0] * Math.cos(angle) - minor * Math.sin(angle));
      text.append(String.format(Locale.ROOT, "C%d,%.2f,%.2f%n", i + 1, east, north));
    }
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(SHIPPED, text);
    }
    assertThat(Files.readString(SHIPPED)).isEqualTo(text.toString());
  }
}
