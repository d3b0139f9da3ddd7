package org.archspan.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.modelfile.Model;
import org.archspan.report.EnsembleFiles;
import org.archspan.report.EnsembleJson;
import org.archspan.report.EnsembleText;
import org.archspan.table.DrawFolder;
import org.archspan.table.DrawTable;
import org.archspan.table.ReadException;
import org.archspan.table.WriteException;
import org.archspan.uncertainty.DrawDesign;
import org.archspan.uncertainty.DrawRow;
import org.archspan.uncertainty.EnsembleRun;
import org.archspan.uncertainty.EnsembleSummary;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** Many draws from the uncertainties of a model. */
@Command(name = "ensemble", mixinStandardHelpOptions = true,
    description = "Many draws from the uncertainties given in the model: distribution of spacing, growth time and"
        + " mass, how many draws are stable or held by the lid, and which input drives the spacing. Exit status 4"
        + " says that some draws have no answer.")
final class EnsembleCommand extends ModelCommand {
  @Option(names = "--draws", paramLabel = "N|FIRST:END", defaultValue = "4096", converter = DrawRange.Converter.class,
      description = "how many draws, or which (default ${DEFAULT-VALUE}); a draw depends on the seed and its index"
          + " alone")
  DrawRange draws;

  @Option(names = "--seed", paramLabel = "N", defaultValue = "1",
      description = "of the draws (default ${DEFAULT-VALUE})")
  long seed;

  @Option(names = "--part", paramLabel = "K/N", converter = DrawRange.Part.Converter.class,
      description = "solve one of N parts of the draws and write its tables, for --merge; needs --out")
  DrawRange.Part part;

  @Option(names = "--resume", description = "keep the blocks of draws that --out holds and solve the others")
  boolean resume;

  @Option(names = "--merge", paramLabel = "DIR",
      description = "solve nothing: read the draws in this folder, of one run or of all parts")
  Path merge;

  @Option(names = "--without-lid-test", description = "do not ask what holds the mode, which saves time")
  boolean withoutLidTest;

  @Option(names = "--without-sensitivities", description = "independent draws only, for a finer distribution")
  boolean withoutSensitivities;

  private EnsembleSummary summary;

  @Override
  void solve(Model model) throws IOException {
    refuseContradictions(model);
    DrawDesign design = new DrawDesign(model.uncertain().inputs(), seed, !withoutSensitivities);
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    summary = new EnsembleSummary(design);
    boolean width = model.arm().width().isPresent();
    String title = "draws of an ensemble with seed " + seed + " of the model " + identity(model, design);
    DrawTable table = new DrawTable(title, design.inputs(), model.units(), width);
    if (merge != null) {
      merge(new DrawFolder(merge, table, title));
    } else {
      run(model, design, common.out == null ? null : new DrawFolder(common.out.resolve("draws"), table, title));
    }
    if (common.out != null && part == null) {
      EnsembleFiles.write(summary, model.units(), width, echo(model),
          EnsembleJson.text(echo(model), summary, model.units(), width),
          EnsembleText.text(model.title(), model.disk(), equilibrium, summary, model.units(), width, 88), common.out,
          common.overwrite || resume);
    }
    print(() -> EnsembleJson.text(echo(model), summary, model.units(), width), () -> EnsembleText.text(model.title(),
        model.disk(), equilibrium, summary, model.units(), width, width()));
  }

  @Override
  int status() {
    return summary.failed() == 0 ? ExitStatus.SOLVED : ExitStatus.UNSOLVED;
  }

  private void refuseContradictions(Model model) {
    if (model.uncertain().inputs().isEmpty()) {
      throw new ModelFault(model.source() + ": no input is uncertain; write for example strength = { value = \"3"
          + " uG\", normal = \"1 uG\" } under [field], or add --set field.strength.normal=1uG");
    }
    if (merge != null && (part != null || resume)) {
      throw new ParameterException(spec.commandLine(), "--merge solves nothing: it goes with neither --part nor"
          + " --resume");
    }
    if (common.out == null && (part != null || resume)) {
      throw new ParameterException(spec.commandLine(), (part != null ? "--part" : "--resume") + " needs --out DIR");
    }
    if (common.out != null && !common.overwrite && !resume && Files.exists(common.out.resolve("summary.json"))) {
      throw new ParameterException(spec.commandLine(), common.out + " holds an ensemble already; use --resume to go"
          + " on with it, --overwrite to replace it, or another folder");
    }
  }

  /** What decides the answers of the draws: the inputs, the tables that they name, and how they are solved. */
  private String identity(Model model, DrawDesign design) throws IOException {
    String all = model.inputs() + " " + common.tolerance + " " + design.sensitivities() + " " + !withoutLidTest;
    try {
      MessageDigest digest = MessageDigest.getInstance("SHA-256");
      digest.update(all.getBytes(StandardCharsets.UTF_8));
      for (Map.Entry<String, String> input : model.inputs().entrySet()) {
        if (input.getKey().endsWith(".file")) {
          digest.update(Files.readAllBytes(common.model.resolveSibling(input.getValue())));
        }
      }
      return HexFormat.of().formatHex(digest.digest(), 0, 8);
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException("every Java has SHA-256", impossible);
    }
  }

  private void run(Model model, DrawDesign design, DrawFolder folder) throws IOException {
    DrawRange range = part == null ? draws : draws.part(part, design.groupSize());
    if (folder != null) {
      prepare(folder, range);
    }
    try (DrawProgress progress = new DrawProgress(range.end() - range.first(), common.quiet, err());
        EnsembleRun run = new EnsembleRun(design, new ModelDraws(model, !withoutLidTest), common.threads)) {
      for (long first = range.first(); first < range.end();) {
        long end = blockEnd(first, range);
        block(first, end, run, folder, progress);
        first = end;
      }
    }
  }

  private void prepare(DrawFolder folder, DrawRange range) throws IOException {
    folder.clear(range.first(), range.end(), common.overwrite);
    for (DrawFolder.Block block : folder.ownBlocks()) {
      if (block.first() < range.end() && block.last() >= range.first()) {
        keepOrRemove(folder, block, range);
      }
    }
  }

  /** A shorter run ended within a block, which a longer one replaces. */
  private void keepOrRemove(DrawFolder folder, DrawFolder.Block block, DrawRange range) throws IOException {
    if (!resume) {
      throw new WriteException(common.out + " holds some of these draws already; use --resume to go on with them,"
          + " --overwrite to replace them, or another folder");
    }
    if (block.first() < range.first() || block.last() >= range.end()) {
      throw new WriteException(block.file() + " holds draws beyond those asked for as well; ask for all of them, or"
          + " use another folder");
    }
    if (block.first() != Math.max(range.first(), block.first() / DrawFolder.BLOCK * DrawFolder.BLOCK)
        || block.last() != blockEnd(block.first(), range) - 1) {
      folder.remove(block);
    }
  }

  private static long blockEnd(long first, DrawRange range) {
    return Math.min(range.end(), (first / DrawFolder.BLOCK + 1) * DrawFolder.BLOCK);
  }

  private void block(long first, long end, EnsembleRun run, DrawFolder folder, DrawProgress progress)
      throws IOException {
    Optional<DrawFolder.Block> finished = folder == null ? Optional.empty() : folder.finished(first, end - 1);
    if (finished.isPresent()) {
      folder.read(finished.get(), row -> take(row, progress));
      return;
    }
    List<DrawRow> rows = new ArrayList<>();
    run.solve(first, end, row -> {
      take(row, progress);
      if (folder != null) {
        rows.add(row);
      }
    });
    if (folder != null) {
      folder.write(rows);
    }
  }

  private void take(DrawRow row, DrawProgress progress) {
    summary.add(row);
    progress.step();
  }

  private void merge(DrawFolder folder) throws ReadException {
    List<DrawFolder.Block> blocks = folder.blocks();
    if (blocks.isEmpty()) {
      throw new ReadException(merge + " holds no draws (files such as draws-000000000000-000000002047.ecsv)");
    }
    for (int i = 1; i < blocks.size(); i++) {
      long next = blocks.get(i - 1).last() + 1;
      if (blocks.get(i).first() != next) {
        throw new ReadException(merge + (blocks.get(i).first() > next ? " lacks the draws " + next + " to "
            + (blocks.get(i).first() - 1) + ": has that part finished?" : " holds the draws " + blocks.get(i).first()
            + " to " + (next - 1) + " twice"));
      }
    }
    for (DrawFolder.Block block : blocks) {
      folder.read(block, summary::add);
    }
  }
}
