package weighhouse.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import weighhouse.report.Samples;
import weighhouse.workbook.UnreadableWorkbookException;

class GateCommandTest {
  private final Terminal terminal =
      new Terminal(
          file ->
              switch (file.toString()) {
                case "held.xlsx" -> Samples.held();
                case "right.xlsx" -> Samples.passed();
                default -> throw new UnreadableWorkbookException(file + " is no workbook.");
              });

  @ParameterizedTest
  @CsvSource({
    "held.xlsx, major, 1",
    "held.xlsx, critical, 1",
    "right.xlsx, query, 0",
    "other.txt, major, 2",
  })
  void statusTellsTheDecision(String file, String level, int status) {
    assertEquals(status, terminal.run("gate", file, "--hold-at", level));
  }

  @Test
  void heldWorkbookNamesWhatHoldsIt() {
    assertEquals(1, terminal.run("gate", "held.xlsx"));
    String said = terminal.out.toString();
    assertTrue(said.startsWith("HELD  cohort model.xlsm"), said);
    assertTrue(said.contains("'Model B'!D5:D484"), said);
    assertTrue(said.contains("[3fa1c09b7e]"), said);
  }

  @Test
  void severalGiveTheWorstStatus() {
    assertEquals(1, terminal.run("gate", "right.xlsx", "held.xlsx"));
    assertEquals(2, terminal.run("gate", "right.xlsx", "other.txt", "held.xlsx"));
  }

  @Test
  void unknownLevelIsWrongUse() {
    assertEquals(2, terminal.run("gate", "held.xlsx", "--hold-at", "grave"));
  }
}
