package org.archspan.table;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;

/** Writes files that are whole or absent: into a temporary file beside, flushed to the disk, then moved into place. */
public final class WholeFile {
  private WholeFile() {
  }

  /**
   * Writes bytes.
   *
   * @param overwrite whether an existing file may be replaced
   * @throws WriteException when it exists and may not be, or the disk refuses
   */
  public static void write(Path file, byte[] content, boolean overwrite) throws WriteException {
    Path folder = file.toAbsolutePath().getParent();
    Path temporary = null;
    try {
      Files.createDirectories(folder);
      if (!overwrite && Files.exists(file)) {
        throw exists(file);
      }
      temporary = folder.resolve("." + file.getFileName() + "." + ProcessHandle.current().pid() + "-" + Thread.currentThread().getId() + ".part");
      try (FileChannel channel =
          FileChannel.open(temporary, StandardOpenOption.WRITE, StandardOpenOption.CREATE_NEW)) {
        ByteBuffer buffer = ByteBuffer.wrap(content);
        while (buffer.hasRemaining()) {
          channel.write(buffer);
        }
        channel.force(true);
      }
      move(temporary, file, overwrite);
    } catch (FileAlreadyExistsException taken) {
      throw exists(file);
    } catch (WriteException known) {
      throw known;
    } catch (IOException reason) {
      throw new WriteException(file + " cannot be written: " + reason.getMessage());
    } finally {
      remove(temporary);
    }
  }

  private static void move(Path temporary, Path file, boolean overwrite) throws IOException {
    if (!overwrite) {
      Files.createLink(file, temporary);
      return;
    }
    try {
      Files.move(temporary, file, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException plain) {
      Files.move(temporary, file, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  private static WriteException exists(Path file) {
    return new WriteException(file + " exists; nothing was changed (use --overwrite to replace it)");
  }

  private static void remove(Path temporary) {
    try {
      if (temporary != null) {
        Files.deleteIfExists(temporary);
      }
    } catch (IOException stuck) {
      temporary.toFile().deleteOnExit();
    }
  }
}
