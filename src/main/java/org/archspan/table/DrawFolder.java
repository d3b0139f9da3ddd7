package org.archspan.table;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.archspan.uncertainty.DrawRow;

/**
 * The draws of an ensemble on the disk: whole blocks, each a table of its own, so that a run may end at any instant.
 */
public final class DrawFolder {
  /** Draws in a block; blocks begin at multiples of it. */
  public static final int BLOCK = 2048;
  private static final Pattern NAME = Pattern.compile("draws-([0-9]{12})-([0-9]{12})\\.ecsv");

  /** A block, or what was being written of one. */
  private static final Pattern PART = Pattern.compile("(\\.)?draws-([0-9]{12})-([0-9]{12})\\.ecsv(?:\\..*\\.part)?");

  /**
   * One block.
   *
   * @param file  where it lies
   * @param first index of its first draw
   * @param last  index of its last
   */
  public record Block(Path file, long first, long last) {
  }

  private final Path folder;
  private final DrawTable table;
  private final String title;

  /**
   * A folder for the draws of one ensemble.
   *
   * @param title what tells it from every other
   */
  public DrawFolder(Path folder, DrawTable table, String title) {
    this.folder = folder;
    this.table = table;
    this.title = title;
  }

  /** All blocks in the folder and the folders in it, by their first draws. */
  public List<Block> blocks() throws ReadException {
    return blocks(Files::walk);
  }

  /** The blocks in the folder itself; other runs may be writing into it meanwhile. */
  public List<Block> ownBlocks() throws ReadException {
    return blocks(Files::list);
  }

  /** A way to go through a folder. */
  private interface Listing {
    Stream<Path> of(Path folder) throws IOException;
  }

  private List<Block> blocks(Listing listing) throws ReadException {
    if (!Files.isDirectory(folder)) {
      return List.of();
    }
    try (Stream<Path> files = listing.of(folder)) {
      return files.flatMap(file -> block(file).stream())
          .sorted(Comparator.comparingLong(Block::first).thenComparingLong(Block::last)).toList();
    } catch (IOException | UncheckedIOException fault) {
      throw new ReadException(folder + " cannot be read: " + fault.getMessage());
    }
  }

  private static Optional<Block> block(Path file) {
    Matcher matcher = NAME.matcher(file.getFileName().toString());
    return matcher.matches()
        ? Optional.of(new Block(file, Long.parseLong(matcher.group(1)), Long.parseLong(matcher.group(2))))
        : Optional.empty();
  }

  /** The place of a block. */
  private Path file(long first, long last) {
    return folder.resolve(String.format(Locale.ROOT, "draws-%012d-%012d.ecsv", first, last));
  }

  /** The block of exactly these draws, where it was finished. */
  public Optional<Block> finished(long first, long last) {
    return Optional.of(new Block(file(first, last), first, last)).filter(block -> Files.exists(block.file()));
  }

  /** Writes a block, whole or not at all. */
  public void write(List<DrawRow> rows) throws WriteException {
    Path file = file(rows.get(0).draw(), rows.get(rows.size() - 1).draw());
    WholeFile.write(file, Ecsv.text(table.of(rows)).getBytes(StandardCharsets.UTF_8), false);
  }

  /**
   * Reads a block, row by row.
   *
   * @throws ReadException when it is not a block of this ensemble
   */
  public void read(Block block, Consumer<DrawRow> sink) throws ReadException {
    try {
      String text = Files.readString(block.file());
      if (!text.contains("# meta: {title: '" + title + "'}\n")) {
        throw new ReadException(block.file() + " holds draws of another ensemble (model, seed or version differ);"
            + " choose another folder");
      }
      List<DrawRow> rows = new ArrayList<>();
      CSVFormat format =
          CSVFormat.DEFAULT.builder().setCommentMarker('#').setHeader().setSkipHeaderRecord(true).build();
      for (CSVRecord line : format
          .parse(new java.io.StringReader(text))) {
        rows.add(table.row(line.stream().toList()));
      }
      if (rows.size() != block.last() - block.first() + 1 || rows.get(0).draw() != block.first()) {
        throw new ReadException(block.file() + " does not hold the draws that its name says");
      }
      rows.forEach(sink);
    } catch (IllegalArgumentException broken) {
      throw new ReadException(block.file() + " is damaged: " + broken.getMessage() + "; remove it and use --resume");
    } catch (ReadException known) {
      throw known;
    } catch (IOException fault) {
      throw new ReadException(block.file() + " cannot be read: " + fault.getMessage());
    }
  }

  /** Removes a block. */
  public void remove(Block block) throws WriteException {
    try {
      Files.deleteIfExists(block.file());
    } catch (IOException fault) {
      throw new WriteException(block.file() + " cannot be removed: " + fault.getMessage());
    }
  }

  /**
   * Removes what a run over these draws left unfinished when it was cut off; finished blocks too where they are to
   * be replaced. Other runs may be writing other draws into the same folder: theirs are left alone.
   *
   * @param end index after the last draw
   */
  public void clear(long first, long end, boolean finished) throws WriteException {
    if (!Files.isDirectory(folder)) {
      return;
    }
    try (Stream<Path> files = Files.list(folder)) {
      for (Path file : files.toList()) {
        Matcher matcher = PART.matcher(file.getFileName().toString());
        if (matcher.matches() && (finished || matcher.group(1) != null) && Long.parseLong(matcher.group(2)) >= first
            && Long.parseLong(matcher.group(2)) < end) {
          Files.deleteIfExists(file);
        }
      }
    } catch (IOException fault) {
      throw new WriteException(folder + " cannot be tidied: " + fault.getMessage());
    }
  }
}
