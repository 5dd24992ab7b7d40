package weighhouse.recalculate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import weighhouse.workbook.CellRange;

/** Whatever the order of cells in the file, each is calculated after what it reads. */
class OrderTest {

  @Test
  void sumsRunDownAHundredThousandRows() {
    Book book = new Book().set("A1", 1).set("B1", "=A1");
    for (int row = 2; row <= 100_000; row++) {
      book.set("A" + row, 1).set("B" + row, "=B" + (row - 1) + "+A" + row);
    }
    assertEquals(100_000, book.number("B100000"));
    Values changed = book.recalculation().whatIf(Change.of(book.address("A2"), 11));
    assertEquals(100_010, book.number(changed, "B100000"));
  }

  @Test
  void aChainRunsUpwardsAndAcrossSheets() {
    Book book = new Book().sheet("Other").sheet("Sheet1");
    int length = 5000;
    for (int i = 1; i < length; i++) {
      book.sheet(i % 2 == 0 ? "Sheet1" : "Other");
      String next = (i % 2 == 0 ? "Other" : "Sheet1") + "!" + (i % 7 == 0 ? "B" : "A");
      String cell = ((i - 1) % 7 == 0 ? "B" : "A") + i;
      book.set(cell, "=" + next + (i + 1) + "+1");
    }
    book.sheet((length - 1) % 2 == 0 ? "Other" : "Sheet1");
    book.set(((length - 1) % 7 == 0 ? "B" : "A") + length, 0);
    assertEquals(length - 1, book.number("Other!B1"));
  }

  @Test
  void statesThatReadEachOtherAreWoven() {
    Book book = new Book().set("A1", 0.9).set("B1", 0.1);
    for (int row = 2; row <= 50; row++) {
      book.set("A" + row, "=A" + (row - 1) + "*0.8+B" + row + "*0.1");
      book.set("B" + row, "=B" + (row - 1) + "*0.7+A" + (row - 1) + "*0.05");
    }
    double a = 0.9;
    double b = 0.1;
    for (int row = 2; row <= 50; row++) {
      b = b * 0.7 + a * 0.05;
      a = a * 0.8 + b * 0.1;
    }
    assertEquals(a, book.number("A50"), 1e-15);
  }

  @Test
  void circularCellsKeepWhatIsStoredAndAreCounted() {
    Book book = new Book().set("A1", "=B1+1", 7).set("B1", "=A1*2", 5).set("C1", "=A1+B1", 12);
    assertEquals(7, book.number("A1"));
    assertEquals(12, book.number("C1"));
    assertEquals(Map.of("circular reference", 2), book.recalculation().replay().unsupported());
    assertEquals(1, book.recalculation().replay().recalculated());
  }

  @Test
  void aBranchNotTakenClosesNoCircle() {
    Book book = new Book().set("A1", 1).set("B1", "=IF(A1=1,2,C1)").set("C1", "=B1+1");
    assertEquals(3, book.number("C1"));
    assertEquals(Map.of(), book.recalculation().replay().unsupported());
  }

  @Test
  void replacedFormulasRunInTheirNewOrder() {
    Book book = new Book().set("A1", 2).set("A2", "=A1+1").set("A3", "=A2*10").set("A4", 5);
    assertEquals(70, book.number(book.whatIf(Map.of("A2", "A4+A1")), "A3"));
    assertEquals(30, book.number("A3"));
    Change both =
        new Change(
            Map.of(book.address("A4"), new Value.Num(8), book.address("A2"), new Value.Num(1)),
            Map.of());
    assertEquals(10, book.number(book.recalculation().whatIf(both), "A3"));
  }

  @Test
  void computedReferencesMayMove() {
    Book book = new Book().set("A1", 1).set("B1", "=OFFSET(C1,A1,0)+1");
    book.set("C2", "=A1*10").set("C3", "=D3+A1").set("D3", "=A1*100");
    assertEquals(11, book.number("B1"));
    assertEquals(203, book.number(book.whatIf("A1", 2), "B1"));
  }

  @Test
  void dependentsAndPrecedents() {
    Book book = new Book().set("A1", 2).set("A2", "=A1+1").set("A3", "=A2*10").set("B1", "=A9");
    Set<CellRange> expected =
        Set.of(CellRange.of(book.address("A2")), CellRange.of(book.address("A3")));
    assertEquals(expected, Set.copyOf(book.recalculation().dependents(Set.of(book.address("A1")))));
    assertEquals(
        List.of(CellRange.of(book.address("A2"))),
        book.recalculation().precedents(book.address("A3")));
  }

  @Test
  void aShapeThatDoesNotReplayKeepsItsStoredValues() {
    Book book = new Book().set("A1", 2).set("A2", "=A1+1", 9).set("A3", "=A2*10", 90);
    assertEquals(90, book.number("A3"));
    Replay replay = book.recalculation().replay();
    assertEquals(1, replay.reproduced());
    assertEquals(
        List.of(new Replay.Difference(book.address("A2"), new Value.Num(9), new Value.Num(3))),
        replay.differing());
  }
}
