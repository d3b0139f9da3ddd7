package org.archspan.modelfile;

import static org.archspan.modelfile.KeySpec.Kind.CHOICE;
import static org.archspan.modelfile.KeySpec.Kind.DENSITY;
import static org.archspan.modelfile.KeySpec.Kind.HEIGHT;
import static org.archspan.modelfile.KeySpec.Kind.INTEGER;
import static org.archspan.modelfile.KeySpec.Kind.NUMBER;
import static org.archspan.modelfile.KeySpec.Kind.QUANTITY;
import static org.archspan.modelfile.KeySpec.Kind.TEXT;
import static org.archspan.modelfile.KeySpec.Range.ANY;
import static org.archspan.modelfile.KeySpec.Range.COUNT;
import static org.archspan.modelfile.KeySpec.Range.INDEX;
import static org.archspan.modelfile.KeySpec.Range.NOT_NEGATIVE;
import static org.archspan.modelfile.KeySpec.Range.POSITIVE;
import static org.archspan.modelfile.KeySpec.Range.SPEED;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.archspan.gravity.GravityLawKind;
import org.archspan.gravity.GravityLaws;
import org.archspan.gravity.LawInput;

/** Every key of the model file. */
public final class Schema {
  /** Arrays of tables; a single gravity table may stand without a number. */
  static final List<String> ARRAYS = List.of("gas.component", "gas.stratum", "gas.layer", "gravity", "interface");
  private static final Map<String, KeySpec> KEYS = keys();

  private Schema() {
  }

  /** All keys, in the order of the guide. */
  public static List<KeySpec> all() {
    return List.copyOf(KEYS.values());
  }

  /** The specification of a key as it stands in a file, numbers of tables included. */
  static Optional<KeySpec> of(String key) {
    return Optional.ofNullable(KEYS.get(pattern(key)));
  }

  /** Whether a key as it stands in a file is that of a table. */
  static boolean isTable(String key) {
    String prefix = pattern(key + ".");
    return KEYS.keySet().stream().anyMatch(known -> known.startsWith(prefix));
  }

  /** The header of the table that a key names. */
  static String header(String key) {
    return ARRAYS.contains(key) && !key.equals("gravity") ? "[[" + key + "]]" : "[" + key + "]";
  }

  /** The array whose number a key lacks: {@code gas.component} for {@code gas.component.name}. */
  static Optional<String> arrayOf(String key) {
    return ARRAYS.stream().filter(array -> key.startsWith(array + ".")
        && KEYS.containsKey(array + ".#" + key.substring(array.length()))).findFirst();
  }

  /** The key with numbers of tables replaced; a single gravity table counts as the first of several. */
  static String pattern(String key) {
    String numbered = key.replaceAll("\\.[0-9]+(?=\\.)", ".#");
    return numbered.startsWith("gravity.") && !numbered.startsWith("gravity.#.") ? "gravity.#" + numbered.substring(7)
        : numbered;
  }

  private static Map<String, KeySpec> keys() {
    List<KeySpec> specs = new ArrayList<>();
    specs.add(new KeySpec("title", TEXT, "", ANY, List.of(), "none", "what the model is"));
    gas(specs);
    field(specs);
    gravity(specs);
    surroundings(specs);
    rivals(specs);
    Map<String, KeySpec> keys = new LinkedHashMap<>();
    specs.forEach(spec -> keys.merge(spec.key(), spec, (first, second) -> first));
    return keys;
  }

  private static KeySpec quantity(String key, String unit, KeySpec.Range range, String standard, String meaning) {
    return new KeySpec(key, QUANTITY, unit, range, List.of(), standard, meaning);
  }

  private static KeySpec number(String key, KeySpec.Range range, String standard, String meaning) {
    return new KeySpec(key, NUMBER, "", range, List.of(), standard, meaning);
  }

  private static KeySpec height(String key, String standard, String meaning) {
    return new KeySpec(key, HEIGHT, "pc", POSITIVE, List.of(), standard, meaning);
  }

  private static KeySpec choice(String key, String standard, String meaning, String... choices) {
    return new KeySpec(key, CHOICE, "", ANY, List.of(choices), standard, meaning);
  }

  private static KeySpec density(String key) {
    return density(key, "density at the midplane or on the floor: hydrogen nuclei or mass in a volume");
  }

  private static KeySpec density(String key, String meaning) {
    return new KeySpec(key, DENSITY, "cm^-3", POSITIVE, List.of(), "none", meaning);
  }

  private static void gas(List<KeySpec> specs) {
    specs.add(quantity("gas.dispersion", "km/s", SPEED, "none", "isothermal speed, thermal and turbulent"));
    specs.add(quantity("gas.temperature", "K", POSITIVE, "none", "instead of the dispersion"));
    specs.add(number("gas.mean-molecular-weight", POSITIVE, "none", "mean mass of a particle in atomic mass units"));
    specs.add(number("gas.adiabatic-index", INDEX, "1", "of the perturbations"));
    specs.add(density("gas.midplane-density"));
    specs.add(quantity("gas.surface-density", "Msun/pc^2", POSITIVE, "none", "instead of the midplane density"));
    specs.add(number("gas.mass-per-hydrogen", POSITIVE, "1.4", "mass for each hydrogen nucleus, in hydrogen masses"));
    specs.add(quantity("gas.cooling-time", "Myr", POSITIVE, "none",
        "Newtonian cooling of the perturbations towards the first temperature"));
    specs.add(choice("gas.self-gravity", "off", "the gas's own gravity: nowhere, in the base state, or there and on the"
        + " perturbations", "off", "equilibrium", "full"));
    specs.add(new KeySpec("gas.component.#.name", TEXT, "", ANY, List.of(), "none", "name of a component"));
    specs.add(quantity("gas.component.#.dispersion", "km/s", SPEED, "none", "of the component"));
    specs.add(density("gas.component.#.midplane-density"));
    specs.add(choice("gas.stratum.#.shape", "none", "law of a prescribed stratum", "gaussian", "exponential", "sech2"));
    specs.add(density("gas.stratum.#.midplane-density"));
    specs.add(quantity("gas.stratum.#.height", "pc", POSITIVE, "none", "scale of the stratum"));
    specs.add(quantity("gas.layer.#.from", "Mm", ANY, "none", "lower end of a layer"));
    specs.add(quantity("gas.layer.#.temperature", "K", POSITIVE, "none", "of the layer"));
    specs.add(quantity("gas.layer.#.dispersion", "km/s", SPEED, "none", "of the layer"));
    specs.add(quantity("gas.layer.#.blend", "Mm", POSITIVE, "none", "tanh half-width to the layer below"));
  }

  private static void field(List<KeySpec> specs) {
    specs.add(number("field.pressure-ratio", NOT_NEGATIVE, "0", "alpha, magnetic over gas pressure"));
    specs.add(number("field.plasma-beta", POSITIVE, "none", "gas over magnetic pressure: instead of the pressure ratio"));
    specs.add(quantity("field.strength", "uG", NOT_NEGATIVE, "none", "at the midplane or on the floor; in the middle of a flux sheet"));
    specs.add(choice("field.shape", "constant-ratio", "how the field falls with height", "constant-ratio", "balance",
        "sheet", "table"));
    specs.add(quantity("field.bottom", "Mm", ANY, "none", "lower end of a flux sheet"));
    specs.add(quantity("field.top", "Mm", ANY, "none", "upper end of a flux sheet; none: it fills the space above"));
    specs.add(quantity("field.edge", "Mm", POSITIVE, "none", "half-width of its edges"));
    specs.add(new KeySpec("field.file", TEXT, "", ANY, List.of(), "none", "table of the field"));
    specs.add(quantity("field.turn", "rad/kpc", ANY, "none", "rate at which the direction turns with height"));
    specs.add(number("cosmic-rays.pressure-ratio", NOT_NEGATIVE, "0", "beta, cosmic-ray over gas pressure"));
    specs.add(quantity("cosmic-rays.pressure", "erg/cm^3", NOT_NEGATIVE, "none", "at the midplane or on the floor"));
    specs.add(number("cosmic-rays.adiabatic-index", NOT_NEGATIVE, "4/3", "of the cosmic rays"));
    specs.add(quantity("cosmic-rays.diffusivity", "cm^2/s", NOT_NEGATIVE, "infinite",
        "along the field; or \"infinite\""));
  }

  private static void gravity(List<KeySpec> specs) {
    List<String> names = new ArrayList<>(GravityLaws.all().stream().map(GravityLawKind::name).toList());
    names.add(GravityLaws.TABLE);
    specs.add(choice("gravity.#.law", "none", "law of the external gravity", names.toArray(String[]::new)));
    for (GravityLawKind kind : GravityLaws.all()) {
      for (LawInput input : kind.inputs()) {
        KeySpec.Range range = KeySpec.Range.valueOf(input.range().name());
        String key = "gravity.#." + input.key();
        specs.add(input.unit().isEmpty() ? number(key, range, "none", input.meaning())
            : quantity(key, input.unit(), range, "none", input.meaning()));
      }
    }
    specs.add(new KeySpec("gravity.#.file", TEXT, "", ANY, List.of(), "none",
        "table of height and acceleration, units in its header"));
  }

  private static void surroundings(List<KeySpec> specs) {
    specs.add(quantity("rotation.angular-speed", "km/s/kpc", NOT_NEGATIVE, "none", "of the disk at this radius"));
    specs.add(quantity("rotation.epicyclic-frequency", "km/s/kpc", POSITIVE, "twice the angular speed", "kappa"));
    specs.add(new KeySpec("domain.bottom", HEIGHT, "pc", NOT_NEGATIVE, List.of("midplane"), "midplane",
        "or the height of a rigid floor"));
    specs.add(height("domain.top", "automatic", "upper end of the domain"));
    specs.add(choice("domain.top-boundary", "open where the atmosphere above is uniform, otherwise lid",
        "what bounds the gas above", "open", "lid", "free"));
    specs.add(new KeySpec("waves.cross-wavelength", HEIGHT, "pc", POSITIVE, List.of("infinite", "arm-width"), "infinite",
        "wavelength across the field; arm-width: half a wave across the arm"));
    specs.add(quantity("waves.direction", "deg", ANY, "searched", "of the wavevector from the field at the lower end, where"
        + " the field turns"));
    specs.add(choice("waves.parity", "both", "symmetry about the midplane", "mirror", "flexing", "both"));
    specs.add(height("waves.shortest", "found automatically", "shortest wave to search"));
    specs.add(height("waves.longest", "found automatically", "longest wave to search"));
    specs.add(height("waves.gathering-height", "2 scale-heights about a midplane, none above a floor",
        "greatest centroid height of a mode that gathers the disk's own gas"));
    specs.add(new KeySpec("waves.branches", INTEGER, "", COUNT, List.of(), "6", "branches reported for each parity"));
    specs.add(quantity("arm.width", "pc", POSITIVE, "none", "width of the spiral arm"));
    specs.add(quantity("arm.crossing-time", "Myr", POSITIVE, "none", "time the gas spends in the arm"));
    specs.add(new KeySpec("output.length", TEXT, "", ANY, List.of(), "pc", "unit of length in results"));
    specs.add(new KeySpec("output.time", TEXT, "", ANY, List.of(), "Myr", "unit of time in results"));
  }

  private static void rivals(List<KeySpec> specs) {
    specs.add(quantity("rotation.lag", "km/s/kpc", POSITIVE, "none", "loss of rotation speed with height"));
    specs.add(quantity("stars.surface-density", "Msun/pc^2", POSITIVE, "of the isothermal sheet",
        "of the stellar disk"));
    specs.add(quantity("stars.dispersion", "km/s", SPEED, "of the isothermal sheet", "of the stars along the radius"));
    specs.add(quantity("stars.height", "pc", POSITIVE, "of an isothermal sheet",
        "surface density over twice the midplane density of the stars"));
    specs.add(new KeySpec("interface.#.name", TEXT, "", ANY, List.of(), "its number", "of an interface of two layers"));
    specs.add(density("interface.#.density-below", "hydrogen nuclei or mass in a volume"));
    specs.add(density("interface.#.density-above", "hydrogen nuclei or mass in a volume"));
    specs.add(quantity("interface.#.field-below", "uG", NOT_NEGATIVE, "0", "horizontal field in the layer below"));
    specs.add(quantity("interface.#.field-above", "uG", NOT_NEGATIVE, "0", "in the layer above, parallel to it"));
    specs.add(quantity("interface.#.shear", "km/s", NOT_NEGATIVE, "0", "difference of velocity along the field"));
    specs.add(quantity("interface.#.gravity", "cm/s^2", ANY, "none", "or deceleration, towards the layer below"));
    specs.add(quantity("interface.#.depth-below", "pc", POSITIVE, "infinite", "of the layer below"));
    specs.add(quantity("interface.#.depth-above", "pc", POSITIVE, "infinite", "of the layer above"));
  }
}
