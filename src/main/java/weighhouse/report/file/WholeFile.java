package weighhouse.report.file;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;

/** Writes a file aside and moves it into place when it is complete. */
public final class WholeFile {
  private WholeFile() {}

  /** What fills the file. */
  @FunctionalInterface
  public interface Content {
    void writeTo(OutputStream out) throws IOException;
  }

  /**
   * Writes the file; an older one is replaced at once. Writers of one file at a time do not disturb
   * each other: the last to finish stays.
   *
   * @throws IOException if it cannot be written; then nothing is left behind
   */
  public static void write(Path file, Content content) throws IOException {
    Path target = file.toAbsolutePath();
    Files.createDirectories(target.getParent());
    Path aside = target.resolveSibling("." + UUID.randomUUID() + ".part");
    try {
      try (OutputStream out =
          new BufferedOutputStream(
              Files.newOutputStream(aside, StandardOpenOption.CREATE_NEW), 1 << 16)) {
        content.writeTo(out);
      }
      move(aside, target);
    } finally {
      Files.deleteIfExists(aside);
    }
  }

  private static void move(Path aside, Path target) throws IOException {
    try {
      Files.move(aside, target, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException e) {
      Files.move(aside, target, StandardCopyOption.REPLACE_EXISTING);
    }
  }
}
