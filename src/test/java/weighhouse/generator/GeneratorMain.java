package weighhouse.generator;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.generator.book.BookWriter;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.Recalculation;
import weighhouse.generator.book.StoredValues;

/** {@code GeneratorMain DIR N SEED [--recalculate]} writes N cases and their manifest. */
public final class GeneratorMain {
  private GeneratorMain() {}

  /** Runs it. */
  public static void main(String[] args) throws IOException, InterruptedException {
    boolean recalculate = Arrays.asList(args).contains("--recalculate");
    List<GeneratedCase> cases = Generator.cases(Integer.parseInt(args[1]), Long.parseLong(args[2]));
    Path soffice = recalculate ? soffice() : null;
    write(Path.of(args[0]), Long.parseLong(args[2]), cases, soffice);
    System.out.println(cases.size() + " cases written to " + args[0]);
  }

  private static Path soffice() {
    return Arrays.stream(System.getenv("PATH").split(java.io.File.pathSeparator))
        .map(folder -> Path.of(folder, "soffice"))
        .filter(Files::isExecutable)
        .findFirst()
        .orElseThrow(() -> new IllegalStateException("soffice is not installed"));
  }

  /**
   * Writes cases into a folder.
   *
   * @param soffice LibreOffice, to store values; or null to write formulas without values
   */
  public static Manifest write(Path folder, long seed, List<GeneratedCase> cases, Path soffice)
      throws IOException, InterruptedException {
    Files.createDirectories(folder);
    List<Path> runnable = new ArrayList<>();
    for (GeneratedCase one : cases) {
      Path file = folder.resolve(one.name() + ".xlsx");
      BookWriter.write(one.workbook(), file);
      if (one.runsInLibreOffice()) {
        runnable.add(file);
      }
      if (one.twin() != null) {
        Path twin = folder.resolve(one.name() + "-twin.xlsx");
        BookWriter.write(one.twin(), twin);
        runnable.add(twin);
      }
    }
    if (soffice != null) {
      Recalculation.inPlace(soffice, runnable);
    }
    List<CaseRecord> records = new ArrayList<>();
    for (GeneratedCase one : cases) {
      records.add(record(folder, one, soffice != null));
    }
    Manifest manifest = new Manifest(seed, soffice != null, records);
    manifest.write(folder);
    return manifest;
  }

  private static CaseRecord record(Path folder, GeneratedCase one, boolean values)
      throws IOException {
    String twin = one.twin() == null ? null : one.name() + "-twin.xlsx";
    Map<String, String> outcomes = new LinkedHashMap<>();
    one.outcomes().forEach((name, at) -> outcomes.put(name, at.text()));
    Map<String, Double> expected = new LinkedHashMap<>();
    List<SeededFault> faults = one.faults();
    if (values && twin != null) {
      StoredValues stored = StoredValues.of(folder.resolve(twin));
      one.outcomes()
          .forEach((name, at) -> stored.number(at).ifPresent(it -> expected.put(name, it)));
      faults = withValues(one, stored);
    }
    return new CaseRecord(
        one.name(),
        one.kind(),
        one.layout(),
        one.seed(),
        one.keptApart(),
        one.name() + ".xlsx",
        twin,
        faults,
        outcomes,
        expected);
  }

  private static List<SeededFault> withValues(GeneratedCase one, StoredValues stored) {
    List<SeededFault> faults = new ArrayList<>();
    for (int i = 0; i < one.faults().size(); i++) {
      SeededFault fault = one.faults().get(i);
      List<CellAt> roots = one.roots().get(i);
      List<SeededFault.CellValue> values = new ArrayList<>();
      for (int at : new int[] {0, roots.size() / 2, roots.size() - 1}) {
        CellAt cell = roots.get(at);
        stored.number(cell).ifPresent(it -> values.add(new SeededFault.CellValue(cell.text(), it)));
      }
      faults.add(
          new SeededFault(
              fault.rule(),
              fault.note(),
              fault.cells(),
              fault.formula(),
              fault.expectedFormula(),
              values.stream().distinct().toList()));
    }
    return faults;
  }
}
