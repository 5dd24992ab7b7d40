package weighhouse.generator.layout;

import java.util.List;
import weighhouse.generator.book.SheetDraft;

/** Both traces below each other on one sheet, states down, cycles across. */
final class AcrossTraces implements Placement {
  private final String sheetName;
  private final int row;

  AcrossTraces(String sheetName, int row) {
    this.sheetName = sheetName;
    this.row = row;
  }

  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet(draft.words().of(sheetName));
    int at = row;
    for (int arm = 0; arm < 2; arm++) {
      List<Line> lines = TraceLines.of(draft, arm);
      sheet.at(at, 0).label(draft.words().arm(arm));
      new TraceGrid(draft, sheet, at + 2, 0, true).write(lines, draft.model().cycles(), arm);
      at += lines.size() + 4;
    }
  }
}
