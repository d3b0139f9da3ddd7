package org.archspan.modelfile;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;

/** Reads text files with limits, so that no input can exhaust the reader. */
final class SourceText {
  /** A model is a page of text; this is a hundred times that. */
  static final int LARGEST_MODEL = 256 * 1024;
  /** Rows of a table. */
  static final int LARGEST_TABLE = 16 * 1024 * 1024;
  private static final int DEEPEST_NESTING = 40;

  private SourceText() {
  }

  /** The bytes of a file, or nothing when it is larger than a limit. */
  static Optional<byte[]> bytes(Path file, int limit) throws UnreadableFileException {
    if (Files.isDirectory(file)) {
      throw new UnreadableFileException(file + " is a directory; give a file");
    }
    if (!Files.exists(file)) {
      throw new UnreadableFileException(file + " does not exist");
    }
    try (var stream = Files.newInputStream(file)) {
      byte[] bytes = stream.readNBytes(limit + 1);
      return bytes.length > limit ? Optional.empty() : Optional.of(bytes);
    } catch (AccessDeniedException denied) {
      throw new UnreadableFileException(file + " cannot be read: permission denied");
    } catch (IOException reason) {
      throw new UnreadableFileException(file + " cannot be read: " + reason.getMessage());
    }
  }

  /** The text, when the bytes are UTF-8 without NUL; a byte-order mark is dropped. */
  static Optional<String> text(byte[] bytes) {
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return text.indexOf('\0') >= 0 ? Optional.empty()
          : Optional.of(text.startsWith("\ufeff") ? text.substring(1) : text);
    } catch (CharacterCodingException notUtf8) {
      return Optional.empty();
    }
  }

  /** Line at which brackets nest more deeply than any model does; 0 where they do not. */
  static int overnestedLine(String text) {
    int depth = 0;
    int line = 1;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c == '\n') {
        line++;
      } else if (c == '[' || c == '{') {
        depth++;
      } else if (c == ']' || c == '}') {
        depth = Math.max(0, depth - 1);
      }
      if (depth > DEEPEST_NESTING) {
        return line;
      }
    }
    return 0;
  }
}
