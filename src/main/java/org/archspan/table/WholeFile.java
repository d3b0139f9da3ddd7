package org.archspan.table;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
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
    Path temporary = null;
    try {
      Path folder = folderOf(file);
      if (!overwrite && Files.exists(file)) {
        throw exists(file);
      }
      temporary = folder.resolve(temporaryName(file));
      flush(temporary, content);
      move(temporary, file, overwrite);
    } catch (FileAlreadyExistsException taken) {
      throw exists(file);
    } catch (WriteException known) {
      throw known;
    } catch (IOException fault) {
      throw new WriteException(file + " cannot be written: " + reason(fault));
    } finally {
      remove(temporary);
    }
  }

  /** The folder of a file, made where it is missing. */
  private static Path folderOf(Path file) throws IOException {
    Path folder = file.toAbsolutePath().getParent();
    try {
      return Files.createDirectories(folder);
    } catch (FileAlreadyExistsException notAFolder) {
      throw new WriteException(file + " cannot be written: " + folder + " is not a folder");
    }
  }

  private static String temporaryName(Path file) {
    return "." + file.getFileName() + "." + ProcessHandle.current().pid() + "-" + Thread.currentThread().getId()
        + ".part";
  }

  private static void flush(Path temporary, byte[] content) throws IOException {
    try (FileChannel channel =
        FileChannel.open(temporary, StandardOpenOption.WRITE, StandardOpenOption.CREATE_NEW)) {
      ByteBuffer buffer = ByteBuffer.wrap(content);
      while (buffer.hasRemaining()) {
        channel.write(buffer);
      }
      channel.force(true);
    }
  }

  private static void move(Path temporary, Path file, boolean overwrite) throws IOException {
    if (!overwrite) {
      moveBesideOthers(temporary, file);
      return;
    }
    try {
      Files.move(temporary, file, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException | FileAlreadyExistsException notInOneStep) {
      Files.move(temporary, file, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  /** A link fails where a file has come into being meanwhile; a move only looks beforehand. Not all disks have links. */
  private static void moveBesideOthers(Path temporary, Path file) throws IOException {
    try {
      Files.createLink(file, temporary);
    } catch (FileAlreadyExistsException taken) {
      throw taken;
    } catch (FileSystemException | UnsupportedOperationException noLinks) {
      Files.move(temporary, file);
    }
  }

  private static WriteException exists(Path file) {
    return new WriteException(file + " exists; nothing was changed (use --overwrite to replace it)");
  }

  /** Some faults of the file system carry no words of their own. */
  private static String reason(IOException fault) {
    if (fault instanceof AccessDeniedException denied) {
      return "permission denied on " + denied.getFile();
    }
    if (fault instanceof NoSuchFileException missing) {
      return missing.getFile() + " does not exist and cannot be made";
    }
    return fault instanceof FileSystemException known && known.getReason() != null ? known.getReason()
        : fault.getMessage();
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
