package weighhouse.generator.book;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/** Has LibreOffice open workbooks, calculate them and save them again, many in one process. */
public final class Recalculation {
  private static final int BATCH = 60;

  private Recalculation() {}

  /**
   * Replaces each .xlsx by LibreOffice's own copy of it, with stored values.
   *
   * @param soffice the program
   * @param files workbooks in one folder or several, with different names
   */
  public static void inPlace(Path soffice, List<Path> files)
      throws IOException, InterruptedException {
    Path scratch = Files.createTempDirectory("weighhouse-recalculation");
    try {
      for (int from = 0; from < files.size(); from += BATCH) {
        batch(soffice, scratch, files.subList(from, Math.min(files.size(), from + BATCH)));
      }
    } finally {
      delete(scratch);
    }
  }

  private static void batch(Path soffice, Path scratch, List<Path> files)
      throws IOException, InterruptedException {
    Path out = scratch.resolve("out");
    List<String> command =
        new ArrayList<>(
            List.of(
                soffice.toString(),
                "-env:UserInstallation=" + scratch.resolve("profile").toUri(),
                "--headless",
                "--convert-to",
                "xlsx:Calc MS Excel 2007 XML",
                "--outdir",
                out.toString()));
    files.forEach(file -> command.add(file.toString()));
    Process process =
        new ProcessBuilder(command)
            .redirectErrorStream(true)
            .redirectOutput(scratch.resolve("log.txt").toFile())
            .start();
    if (!process.waitFor(20L + 10L * files.size(), TimeUnit.SECONDS)) {
      process.destroyForcibly();
      throw new IOException("LibreOffice took too long over " + files.size() + " workbooks");
    }
    for (Path file : files) {
      Files.move(out.resolve(file.getFileName()), file, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  private static void delete(Path folder) throws IOException {
    try (Stream<Path> all = Files.walk(folder)) {
      for (Path path : all.sorted(java.util.Comparator.reverseOrder()).toList()) {
        Files.delete(path);
      }
    }
  }
}
