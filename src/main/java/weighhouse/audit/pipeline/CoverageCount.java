package weighhouse.audit.pipeline;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.audit.Coverage;
import weighhouse.recalculate.Replay;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.Workbook;

/** Counts what was and was not analysed. */
final class CoverageCount {
  private static final int MOST_PROBLEMS = 200;

  private CoverageCount() {}

  static Coverage of(Subject subject) {
    Workbook workbook = subject.workbook();
    Replay replay = subject.recalculation().replay();
    int unparsed = subject.shapes().unparsed().size();
    return new Coverage(
        replay.formulaCells(),
        replay.formulaCells() - unparsed,
        replay.recalculated(),
        replay.reproduced(),
        replay.differing().stream()
            .map(
                d ->
                    new Coverage.Difference(
                        d.cell(), Figures.of(d.stored()), Figures.of(d.recalculated())))
            .toList(),
        new LinkedHashMap<>(replay.unsupported()),
        workbook.macros(),
        workbook.externalLinks(),
        hidden(workbook),
        problems(subject));
  }

  private static List<String> hidden(Workbook workbook) {
    List<String> hidden = new ArrayList<>();
    for (Sheet sheet : workbook.sheets()) {
      if (sheet.visibility() != Visibility.VISIBLE) {
        String how = sheet.visibility() == Visibility.HIDDEN ? "hidden" : "very hidden";
        hidden.add("Sheet " + sheet.name() + " is " + how + ".");
      }
      count(hidden, sheet.name(), sheet.hiddenRows().cardinality(), "row");
      count(hidden, sheet.name(), sheet.hiddenColumns().cardinality(), "column");
    }
    return hidden;
  }

  private static void count(List<String> into, String sheet, int number, String what) {
    if (number > 0) {
      into.add(
          "Sheet " + sheet + " has " + number + " hidden " + what + (number == 1 ? "." : "s."));
    }
  }

  private static List<String> problems(Subject subject) {
    List<String> problems = new ArrayList<>(subject.workbook().problems());
    for (Map.Entry<CellAddress, String> cell : subject.shapes().unparsed().entrySet()) {
      if (problems.size() >= MOST_PROBLEMS) {
        problems.add("More cells could not be read; the counts above hold all.");
        break;
      }
      problems.add(subject.workbook().show(cell.getKey()) + ": " + cell.getValue());
    }
    return problems;
  }
}
