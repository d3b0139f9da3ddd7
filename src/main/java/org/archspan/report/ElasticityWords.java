package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.archspan.spacing.Elasticities;
import org.archspan.stability.PeakElasticity;

/** Elasticities in the summary and in JSON. */
final class ElasticityWords {
  private ElasticityWords() {
  }

  static void write(Elasticities answers, TextBlock block) {
    block.heading("What decides it");
    if (answers.inputs().isEmpty()) {
      block.sentence("No elasticities: " + answers.remark());
      return;
    }
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("one per cent more", "growth rate", "wavelength"));
    answers.inputs().forEach(input -> rows.add(List.of(input.key(),
        input.value().map(value -> percent(value.growthRate(), value.growthRateError())).orElse("-"),
        input.value().map(value -> percent(value.wavelength(), value.wavelengthError())).orElse("-"))));
    block.table(rows).sentence(("Per cent of change, from exact derivatives. " + answers.remark()).strip());
    answers.inputs().stream().filter(input -> input.value().isEmpty())
        .forEach(input -> block.sentence(input.key() + " " + input.why() + "."));
  }

  /** With three decimals, or as many as its error leaves. */
  private static String percent(double value, double error) {
    int decimals = (int) Math.max(0, Math.min(3, Math.floor(-Math.log10(Math.max(error, 1e-300)))));
    String written = String.format(Locale.ROOT, "%+." + decimals + "f", value);
    return written.matches("[-+][0.]*") ? "0" : written;
  }

  static Json json(Elasticities answers) {
    return new Json().put("remark", answers.remark()).put("inputs", answers.inputs().stream().map(input -> {
      Json json = new Json().put("input", input.key());
      return input.value().map(value -> numbers(json, value)).orElseGet(() -> json.put("why-not", input.why()));
    }).toList());
  }

  private static Json numbers(Json json, PeakElasticity value) {
    return json.put("growth-rate", value.growthRate()).put("growth-rate-error", value.growthRateError())
        .put("wavelength", value.wavelength()).put("wavelength-error", value.wavelengthError());
  }
}
