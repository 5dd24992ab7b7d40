package weighhouse.generator.layout;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;

/**
 * A trace sheet for each arm whose formulas call other columns of their row by names at the scope
 * of the sheet, bound to whole columns: implicit intersection.
 */
final class ColumnNameTraces implements Placement {
  @Override
  public void place(ModelDraft draft) {
    for (int arm = 0; arm < 2; arm++) {
      SheetDraft sheet = draft.book().sheet(arm == 0 ? "Comparator" : "Treatment");
      sheet.at(0, 0).label(draft.words().arm(arm));
      List<Line> lines = TraceLines.of(draft, arm);
      Map<String, String> names = new HashMap<>();
      for (int i = 0; i < lines.size(); i++) {
        String name = "c_" + lines.get(i).key().replace('.', '_');
        String column = CellAt.fixed(0, i).replaceAll("[0-9$]", "");
        names.put(lines.get(i).key(), name);
        draft.book().nameOn(sheet.name(), name, "%1$s!$%2$s:$%2$s".formatted(sheet.name(), column));
      }
      new TraceGrid(draft, sheet, 2, 0, false)
          .named(names)
          .write(lines, draft.model().cycles(), arm);
    }
  }
}
