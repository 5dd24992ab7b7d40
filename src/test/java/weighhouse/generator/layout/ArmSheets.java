package weighhouse.generator.layout;

import weighhouse.generator.book.SheetDraft;

/** A trace sheet for each arm, cycles down, states across, explicit products. */
final class ArmSheets implements Placement {
  @Override
  public void place(ModelDraft draft) {
    for (int arm = 0; arm < 2; arm++) {
      SheetDraft sheet =
          draft.book().sheet(draft.words().of("trace") + " " + draft.words().arm(arm));
      sheet.at(0, 0).label(draft.words().of("trace") + ": " + draft.words().arm(arm));
      new TraceGrid(draft, sheet, 3, 0, false)
          .write(TraceLines.of(draft, arm), draft.model().cycles(), arm);
    }
  }
}
