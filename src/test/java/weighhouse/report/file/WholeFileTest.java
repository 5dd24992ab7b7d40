package weighhouse.report.file;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WholeFileTest {
  @TempDir private Path folder;

  @Test
  void failureLeavesTheOldFileAndNothingElse() throws Exception {
    Path file = folder.resolve("report.html");
    Files.writeString(file, "old");
    assertThrows(
        IOException.class,
        () ->
            WholeFile.write(
                file,
                out -> {
                  out.write("half".getBytes(UTF_8));
                  throw new IOException("disk full");
                }));
    assertEquals("old", Files.readString(file));
    assertEquals(List.of(file), files());
  }

  @Test
  void makesTheFolder() throws Exception {
    Path file = folder.resolve("a/b/report.json");
    WholeFile.write(file, out -> out.write("{}".getBytes(UTF_8)));
    assertEquals("{}", Files.readString(file));
  }

  @Test
  void writersOfOneFileDoNotMix() throws Exception {
    Path file = folder.resolve("report.json");
    ExecutorService workers = Executors.newFixedThreadPool(4);
    List<Future<?>> all =
        IntStream.range(0, 40)
            .<Future<?>>mapToObj(i -> workers.submit(() -> write(file, i)))
            .toList();
    for (Future<?> one : all) {
      one.get();
    }
    workers.shutdown();
    String text = Files.readString(file);
    assertEquals(10_000, text.length());
    assertTrue(text.chars().allMatch(c -> c == text.charAt(0)));
    assertEquals(List.of(file), files());
  }

  private static Void write(Path file, int i) throws IOException {
    byte[] letter = {(byte) ('A' + i % 26)};
    WholeFile.write(
        file,
        out -> {
          for (int n = 0; n < 10_000; n++) {
            out.write(letter);
          }
        });
    return null;
  }

  private List<Path> files() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.toList();
    }
  }
}
