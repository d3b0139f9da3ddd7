package org.archspan.catalogue;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import nom.tam.fits.BinaryTable;
import nom.tam.fits.BinaryTableHDU;
import nom.tam.fits.Fits;
import org.archspan.units.UnitException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ComplexesReaderTest {
  private static final double ARCSEC = Math.PI / 648_000.0;

  @TempDir
  Path folder;

  private Complexes read(String text) throws IOException {
    Path file = folder.resolve("table");
    Files.writeString(file, text.replace("|", "\n"));
    return ComplexesReader.read(file);
  }

  @Test
  void csvCarriesItsUnitsInTheHeader() throws IOException {
    Complexes complexes = read("id,East [arcsec],north [arcmin],error [mas]|A,1,2,30|B,-1.5,0,0");
    assertThat(complexes.kind()).isEqualTo(Complexes.Kind.OFFSETS);
    assertThat(complexes.names()).containsExactly("A", "B");
    // 1e-18: rounding of 1e-4
    assertThat(complexes.first()).containsExactly(new double[] {ARCSEC, -1.5 * ARCSEC}, within(1e-18));
    assertThat(complexes.second()[0]).isCloseTo(120.0 * ARCSEC, within(1e-18));
    assertThat(complexes.error()[0]).isCloseTo(0.03 * ARCSEC, within(1e-18));
  }

  @Test
  void ecsvCarriesThemInItsComments() throws IOException {
    Complexes complexes = read("# %ECSV 1.0|# ---|# datatype:|# - {name: x, unit: kpc, datatype: float64}|"
        + "# - {name: y, datatype: float64, unit: 'kpc'}|# schema: astropy-2.0|x y|1 2|3 4");
    assertThat(complexes.kind()).isEqualTo(Complexes.Kind.PLANE);
    // parsec of IAU 2015 B3, 3.0856775814913673e18 cm
    assertThat(complexes.second()[1]).isCloseTo(4 * 3.0856775814913673e21, within(1e8));
  }

  @Test
  void fitsBinaryTablesAreRead() throws Exception {
    BinaryTable table = new BinaryTable();
    table.addColumn(new double[] {10.0, 20.0, 30.0});
    table.addColumn(new float[] {-1.0f, 0.5f, 2.0f});
    table.addColumn(new String[] {"one", "two", "three"});
    BinaryTableHDU unit = BinaryTableHDU.wrap(table);
    String[] names = {"RA", "DEC", "NAME"};
    for (int i = 0; i < 3; i++) {
      unit.setColumnName(i, names[i], null);
    }
    unit.getHeader().addValue("TUNIT1", "deg", "");
    unit.getHeader().addValue("TUNIT2", "deg", "");
    Path file = folder.resolve("table.fits");
    try (Fits fits = new Fits()) {
      fits.addHDU(unit);
      fits.write(file.toFile());
    }
    Complexes complexes = ComplexesReader.read(file);
    assertThat(complexes.kind()).isEqualTo(Complexes.Kind.SKY);
    assertThat(complexes.names()).containsExactly("one", "two", "three");
    assertThat(complexes.first()[2]).isCloseTo(Math.toRadians(30.0), within(1e-15));
    assertThat(complexes.second()[1]).isCloseTo(Math.toRadians(0.5), within(1e-15));
    byte[] bytes = Files.readAllBytes(file);
    Files.write(file, java.util.Arrays.copyOf(bytes, 3000));
    assertThatThrownBy(() -> ComplexesReader.read(file)).isInstanceOf(RefusedTableException.class);
  }

  /** text; message. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {"east,north|1,2; column east: the unit is missing",
      "east [kpc],north [arcsec]|1,2; found the unit kpc", "east [arcsec],north [arcsec]|1,nan; :2: north: found"
          + " \"nan\"",
      "east [arcsec],north [arcsec]|1,|2,3; :2: north: found a gap",
      "east [arcsec],north [arcsec]|1,2|3,4|1,2; :4: the same position as in line 2",
      "east [arcsec],north [arcsec]|1,2,3; :2: found 3 values; the header has 2 columns",
      "a [kpc],b [kpc]|1,2; needed are east and north", "x [kpc],y [kpc],error [kpc]|1,2,-1; allowed is a finite"
          + " number, 0",
      "x [kpd],y [kpc]|1,2; did you mean"})
  void faultsAreNamed(String text, String message) {
    assertThatThrownBy(() -> read(text)).isInstanceOf(RefusedTableException.class).hasMessageContaining(message);
  }

  /**
   * Tangent plane against small angles: 60 arcsec to the north, and to the east at declination 60 deg, where RA
   * counts half.
   */
  @Test
  void offsetsAreThoseOfTheTangentPlane() throws UnitException {
    SkyCentre centre = SkyCentre.parse("150 deg, 60 deg", Complexes.Kind.SKY);
    double[] north = centre.offsets(Math.toRadians(150.0), Math.toRadians(60.0) + 60.0 * ARCSEC);
    double[] east = centre.offsets(Math.toRadians(150.0) + 120.0 * ARCSEC, Math.toRadians(60.0));
    // third order in the angle: (3e-4)^3 = 3e-11; the parallel bends by (6e-4)^2/8 sin 60 cos 60 tan..., below 4e-8
    assertThat(north[1]).isCloseTo(60.0 * ARCSEC, within(1e-10));
    assertThat(north[0]).isCloseTo(0.0, within(1e-15));
    assertThat(east[0]).isCloseTo(60.0 * ARCSEC, within(1e-10));
    assertThat(east[1]).isCloseTo(0.0, within(1e-7));
    assertThatThrownBy(() -> SkyCentre.parse("150, 60", Complexes.Kind.SKY)).hasMessageContaining("with its unit");
  }
}
