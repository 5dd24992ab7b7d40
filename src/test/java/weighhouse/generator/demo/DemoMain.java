package weighhouse.generator.demo;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedSet;
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
  private DemoMain() {}

  /** Runs it. */
  public static void main(String[] args) throws IOException, InterruptedException {
    Path folder = Files.createDirectories(Path.of(args[0]));
    Layout cohort = Layouts.named("wide-table");
    ModelDraft faulty = draft(CohortDemo.model(), true, cohort);
    ModelDraft right = draft(CohortDemo.model(), false, cohort);
    List<Path> files =
        List.of(folder.resolve("cohort-faulty.xlsx"), folder.resolve("cohort-right.xlsx"));
    BookWriter.write(faulty.book(), files.get(0));
    BookWriter.write(right.book(), files.get(1));
    Recalculation.inPlace(Path.of(args[1]), files);
    Files.writeString(folder.resolve("README.md"), readme(faulty, right, files));
  }

  private static ModelDraft draft(Model model, boolean faulty, Layout layout) {
    ModelDraft draft = new ModelDraft(model, faulty, 1);
    layout.lay(draft);
    return draft;
  }

  private static String readme(ModelDraft faulty, ModelDraft right, List<Path> files)
      throws IOException {
    List<String> text = new ArrayList<>();
    text.add("# Demo workbooks\n");
    text.add("An invented chronic condition and invented figures. Made by `DemoMain` in the test");
    text.add("tree, then opened, calculated and saved by LibreOffice.\n");
    text.add("| workbook | what | formulas |\n| --- | --- | --- |");
    List<String> what =
        List.of("monthly cohort model with the faults below", "the same model done right");
    for (int i = 0; i < files.size(); i++) {
      Path name = files.get(i).getFileName();
      int formulas = StoredValues.of(files.get(i)).formulas();
      text.add("| `%s` | %s | %d |".formatted(name, what.get(i), formulas));
    }
    text.add("\n## Faults in `cohort-faulty.xlsx`\n");
    text.add("| cells | rule | formula at the first cell | right formula |");
    text.add("| --- | --- | --- | --- |");
    for (Map.Entry<String, SortedSet<CellAt>> root : faulty.roots().entrySet()) {
      text.add(row(root.getKey(), root.getValue(), faulty, right));
    }
    return String.join("\n", text) + "\n";
  }

  private static String row(
      String event, SortedSet<CellAt> cells, ModelDraft faulty, ModelDraft right) {
    CellAt first = cells.first();
    return "| %s | `%s` | `%s` | `%s` |"
        .formatted(
            String.join(", ", Ranges.of(cells)),
            faulty.model().event(event).form().rule(),
            faulty.book().formulaAt(first),
            right.book().formulaAt(first));
  }
}
