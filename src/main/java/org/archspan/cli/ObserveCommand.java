package org.archspan.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.archspan.catalogue.Complexes;
import org.archspan.catalogue.ComplexesReader;
import org.archspan.catalogue.SkyCentre;
import org.archspan.observe.ArmStudy;
import org.archspan.observe.ObserveOptions;
import org.archspan.observe.ObservedArm;
import org.archspan.observe.PlanePosition;
import org.archspan.observe.SkyOrientation;
import org.archspan.report.ObservationFiles;
import org.archspan.report.ObservationJson;
import org.archspan.report.ObservationSource;
import org.archspan.report.ObservationText;
import org.archspan.units.Dimension;
import org.archspan.units.OutputUnits;
import org.archspan.units.Quantity;
import org.archspan.units.UnitException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The spacing of complexes along an arm. */
@Command(name = "observe", mixinStandardHelpOptions = true,
    description = "Measure the spacing of complexes along a spiral arm: deproject, fit a logarithmic spiral, search the"
        + " places along it for a period, and compare with complexes placed at random.")
final class ObserveCommand implements Callable<Integer> {
  private static final Dimension LENGTH = new Dimension(2, 0, 0, 0);

  @Parameters(index = "0", paramLabel = "TABLE", description = "CSV, ECSV or FITS table with the columns east and north"
      + " (offsets), or ra and dec, or x and y (in the plane), with units; optional: error, name")
  Path table;

  @Option(names = "--inclination", paramLabel = "ANGLE", description = "of the disk, 0 deg is face on, such as \"30"
      + " deg\"")
  String inclination;

  @Option(names = "--position-angle", paramLabel = "ANGLE",
      description = "of the line of nodes, from north through east, such as \"120 deg\"")
  String positionAngle;

  @Option(names = "--distance", paramLabel = "LENGTH", description = "of the galaxy, such as \"10 Mpc\"")
  String distance;

  @Option(names = "--centre", paramLabel = "A,B", description = "of the galaxy in the coordinates of the table, such as"
      + " \"24.174 deg, 15.783 deg\"; needed for ra and dec, else the origin")
  String centre;

  @Option(names = "--shortest", paramLabel = "LENGTH",
      description = "shortest wavelength searched (default: 0.6 of the mean separation)")
  String shortest;

  @Option(names = "--longest", paramLabel = "LENGTH",
      description = "longest wavelength searched (default: half the length of the arm)")
  String longest;

  @Option(names = "--trials", paramLabel = "N", defaultValue = "10000",
      description = "random placings, 100 to 10000000 (default ${DEFAULT-VALUE})")
  int trials;

  @Option(names = "--seed", paramLabel = "N", defaultValue = "1", description = "of the random numbers (default"
      + " ${DEFAULT-VALUE})")
  long seed;

  @Mixin
  OutputOptions output;

  @Spec
  CommandSpec spec;

  @Override
  public Integer call() throws IOException {
    if (trials < 100 || trials > 10_000_000) {
      throw fault("--trials " + trials + ": allowed is 100 to 10000000");
    }
    output.fault().ifPresent(fault -> {
      throw fault(fault);
    });
    ObserveOptions options = new ObserveOptions(optionalLength("--shortest", shortest),
        optionalLength("--longest", longest), trials, seed, output.threads);
    Complexes complexes = ComplexesReader.read(table);
    List<PlanePosition> positions = positions(complexes);
    ObservedArm arm;
    try (Progress progress = new Progress("observe", trials, output.quiet || output.json)) {
      arm = ArmStudy.solve(positions, options, progress::step);
    }
    write(new ObservationSource(table.toString(), complexes.names(), geometry(), seed), arm);
    return ExitStatus.SOLVED;
  }

  private void write(ObservationSource source, ObservedArm arm) throws IOException {
    OutputUnits units = OutputUnits.galactic();
    if (output.out != null) {
      ObservationFiles.write(source, arm, units, output.out, output.overwrite);
    }
    if (output.json) {
      spec.commandLine().getOut().print(ObservationJson.text(source, arm, units));
    } else if (!output.quiet) {
      spec.commandLine().getOut().print(ObservationText.text(source, arm, units, ModelCommand.width()));
    }
    spec.commandLine().getOut().flush();
  }

  private List<PlanePosition> positions(Complexes complexes) {
    SkyCentre origin = origin(complexes.kind());
    boolean plane = complexes.kind() == Complexes.Kind.PLANE;
    SkyOrientation orientation = plane ? null : orientation();
    if (plane && (inclination != null || positionAngle != null || distance != null)) {
      throw fault("x and y lie in the plane of the disk already; --inclination, --position-angle and --distance are for"
          + " offsets on the sky, in columns east and north or ra and dec");
    }
    List<PlanePosition> positions = new ArrayList<>();
    for (int i = 0; i < complexes.names().size(); i++) {
      double first = complexes.first()[i];
      double second = complexes.second()[i];
      double error = complexes.error()[i];
      double[] offset = complexes.kind() == Complexes.Kind.SKY ? origin.offsets(first, second)
          : new double[] {first - origin.first(), second - origin.second()};
      positions.add(plane ? new PlanePosition(offset[0], offset[1], error, error)
          : orientation.deproject(offset[0], offset[1], error));
      if (!(positions.get(i).radius() > 0.0)) {
        throw new ModelFault(table + ": complex " + complexes.names().get(i) + " stands at the centre of the galaxy,"
            + " which"
            + " has no azimuth; leave it out or correct --centre");
      }
    }
    return positions;
  }

  private SkyCentre origin(Complexes.Kind kind) {
    if (centre == null) {
      if (kind == Complexes.Kind.SKY) {
        throw fault("--centre is missing; for ra and dec it is needed, such as --centre \"24.174 deg, 15.783 deg\"");
      }
      return SkyCentre.ORIGIN;
    }
    try {
      return SkyCentre.parse(centre, kind);
    } catch (UnitException wrong) {
      throw fault("--centre: " + wrong.getMessage());
    }
  }

  private SkyOrientation orientation() {
    double tilt = needed("--inclination", inclination, Dimension.NONE, "30 deg");
    double angle = needed("--position-angle", positionAngle, Dimension.NONE, "120 deg");
    double far = needed("--distance", distance, LENGTH, "10 Mpc");
    try {
      return new SkyOrientation(tilt, angle, far);
    } catch (IllegalArgumentException wrong) {
      throw fault(wrong.getMessage());
    }
  }

  private double needed(String option, String text, Dimension dimension, String example) {
    if (text == null) {
      throw fault(option + " is missing; offsets on the sky need it, such as " + option + " \"" + example + "\"");
    }
    try {
      Quantity quantity = Quantity.parse(text);
      if (quantity.dimension().equals(dimension) && !Quantity.unitOf(text).isEmpty()) {
        return quantity.value();
      }
    } catch (UnitException wrong) {
      throw fault(option + ": " + wrong.getMessage());
    }
    throw fault(option + " " + text + ": " + (Quantity.unitOf(text).isEmpty() ? "the unit is missing" : "found"
        + " another unit")
        + "; needed is a value such as \"" + example + "\"");
  }

  private OptionalDouble optionalLength(String option, String text) {
    if (text == null) {
      return OptionalDouble.empty();
    }
    double length = needed(option, text, LENGTH, "1 kpc");
    if (!(length > 0.0)) {
      throw fault(option + " " + text + ": a positive length is needed");
    }
    return OptionalDouble.of(length);
  }

  private Map<String, String> geometry() {
    Map<String, String> geometry = new LinkedHashMap<>();
    put(geometry, "inclination", inclination);
    put(geometry, "pos. angle", positionAngle);
    put(geometry, "distance", distance);
    put(geometry, "centre", centre);
    return geometry;
  }

  private static void put(Map<String, String> geometry, String key, String value) {
    if (value != null) {
      geometry.put(key, value);
    }
  }

  private ParameterException fault(String message) {
    return new ParameterException(spec.commandLine(), message);
  }
}
