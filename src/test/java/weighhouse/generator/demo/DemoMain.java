package weighhouse.generator.demo;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import weighhouse.generator.Ranges;
import weighhouse.generator.book.BookWriter;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.Recalculation;
import weighhouse.generator.book.StoredValues;
import weighhouse.generator.layout.Layout;
import weighhouse.generator.layout.Layouts;
import weighhouse.generator.layout.ModelDraft;
import weighhouse.generator.model.Model;

/** {@code DemoMain FOLDER SOFFICE} makes the demo workbooks and their README. */
public final class DemoMain {
  private final Path folder;
  private final List<String> text = new ArrayList<>();

  private DemoMain(Path folder) {
    this.folder = folder;
  }

  /** A demo workbook, and its fault-free twin to read right formulas from. */
  private record Demo(String file, String what, ModelDraft draft, ModelDraft twin) {
    static Demo of(String file, String what, Model model, boolean faulty, String layoutName) {
      Layout layout = Layouts.named(layoutName);
      ModelDraft draft = new ModelDraft(model, faulty, 1);
      ModelDraft twin = new ModelDraft(model, false, 1);
      layout.lay(draft);
      layout.lay(twin);
      return new Demo(file, what, draft, twin);
    }
  }

  /** Runs it. */
  public static void main(String[] args) throws IOException, InterruptedException {
    new DemoMain(Files.createDirectories(Path.of(args[0]))).make(Path.of(args[1]));
  }

  private void make(Path soffice) throws IOException, InterruptedException {
    Model cohort = CohortDemo.model();
    List<Demo> demos =
        List.of(
            Demo.of(
                "cohort-faulty.xlsx",
                "monthly cohort model, with faults",
                cohort,
                true,
                "wide-table"),
            Demo.of("cohort-right.xlsx", "the same model done right", cohort, false, "wide-table"),
            Demo.of(
                "partitioned-survival.xlsx",
                "monthly partitioned-survival model, with faults",
                PartitionedDemo.model(),
                true,
                "heading-above"));
    List<Path> files = demos.stream().map(demo -> folder.resolve(demo.file())).toList();
    for (Demo demo : demos) {
      BookWriter.write(demo.draft().book(), folder.resolve(demo.file()));
    }
    Recalculation.inPlace(soffice, files);
    introduce(demos);
    demos.forEach(this::faults);
    Files.writeString(folder.resolve("README.md"), String.join("\n", text) + "\n");
  }

  private void introduce(List<Demo> demos) throws IOException {
    text.add("# Demo workbooks\n");
    text.add("An invented chronic condition and invented figures. Made by `DemoMain` in the test");
    text.add("tree, then opened, calculated and saved by LibreOffice.\n");
    text.add("| workbook | what | formulas |\n| --- | --- | --- |");
    for (Demo demo : demos) {
      int formulas = StoredValues.of(folder.resolve(demo.file())).formulas();
      text.add("| `%s` | %s | %d |".formatted(demo.file(), demo.what(), formulas));
    }
  }

  private void faults(Demo demo) {
    if (!demo.draft().faulty()) {
      return;
    }
    text.add("\n## Faults in `" + demo.file() + "`\n");
    text.add("| cells | rule | formula at the first cell | right formula |");
    text.add("| --- | --- | --- | --- |");
    demo.draft()
        .roots()
        .forEach(
            (event, cells) -> {
              CellAt first = cells.first();
              text.add(
                  "| %s | `%s` | `%s` | `%s` |"
                      .formatted(
                          String.join(", ", Ranges.of(cells)),
                          demo.draft().model().event(event).form().rule(),
                          demo.draft().book().formulaAt(first),
                          demo.twin().book().formulaAt(first)));
            });
  }
}
