package weighhouse.recalculate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.IntStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

/** A what-if gives what the workbook would give if it were changed and calculated anew. */
class WhatIfTest {
  private static final int ROWS = 12;
  private static final int COLUMNS = 5;

  /** Operators and functions that the random formulas are made of; each with two operands. */
  private static final List<String> PATTERNS =
      List.of(
          "%s+%s",
          "%s-%s",
          "%s*0.5+%s",
          "IF(%s>%s,1,2)",
          "MAX(%s,%s)",
          "SUM(%s:%s)",
          "IFERROR(%s/%s,0)",
          "SUMPRODUCT(%s:%s,%2$s:%1$s)",
          "COUNTIF(%s:%s,\">1\")",
          "INDEX($A$1:$E$1,1,1+MOD(INT(ABS(%s)),3))+%s",
          "SUM(OFFSET(%s,0,0,2,1))+%s");

  @Property(tries = 150)
  void equalsAFullCalculation(@ForAll long seed) {
    Random random = new Random(seed);
    String[][] cells = cells(random);
    Book before = book(cells);
    int row = random.nextInt(ROWS);
    int column = random.nextInt(COLUMNS);
    double number = random.nextInt(9);
    Values changed = before.whatIf(name(row, column), number);
    cells[row][column] = String.valueOf(number);
    assertSame(book(cells), before, changed);
  }

  @Property(tries = 150)
  void equalsAFullCalculationWithAnotherFormula(@ForAll long seed) {
    Random random = new Random(seed);
    String[][] cells = cells(random);
    Book before = book(cells);
    int row = 1 + random.nextInt(ROWS - 1);
    int column = random.nextInt(COLUMNS);
    String formula = formula(random, row, column);
    Values changed = before.whatIf(Map.of(name(row, column), formula));
    cells[row][column] = "=" + formula;
    assertSame(book(cells), before, changed);
  }

  private static void assertSame(Book expected, Book before, Values changed) {
    for (int r = 0; r < ROWS; r++) {
      for (int c = 0; c < COLUMNS; c++) {
        String cell = name(r, c);
        Value value = expected.value(cell);
        if (value instanceof Value.Num n) {
          double tolerance = 1e-9 * Math.max(1, Math.abs(n.value()));
          assertEquals(n.value(), before.number(changed, cell), tolerance, cell);
        } else {
          assertEquals(value, before.value(changed, cell), cell);
        }
      }
    }
  }

  /** Numbers in the first row and here and there, elsewhere formulas on cells above. */
  private static String[][] cells(Random random) {
    String[][] cells = new String[ROWS][COLUMNS];
    for (int r = 0; r < ROWS; r++) {
      for (int c = 0; c < COLUMNS; c++) {
        boolean constant = r == 0 || random.nextInt(6) == 0;
        cells[r][c] = constant ? String.valueOf(random.nextInt(9)) : "=" + formula(random, r, c);
      }
    }
    return cells;
  }

  private static String formula(Random random, int row, int column) {
    // the last reads two rows, so there must be two above
    String pattern = PATTERNS.get(random.nextInt(PATTERNS.size() - (row < 3 ? 1 : 0)));
    int above = row >= 3 && pattern.contains("OFFSET") ? row - 2 : row - 1;
    String first = name(random.nextInt(Math.max(1, above)), random.nextInt(COLUMNS));
    String second = name(Math.max(0, above), column);
    return String.format(pattern, first, second);
  }

  private static String name(int row, int column) {
    return (char) ('A' + column) + String.valueOf(row + 1);
  }

  private static Book book(String[][] cells) {
    Book book = new Book();
    for (int r = 0; r < ROWS; r++) {
      for (int c = 0; c < COLUMNS; c++) {
        boolean formula = cells[r][c].startsWith("=");
        book.set(name(r, c), formula ? cells[r][c] : (Object) Double.valueOf(cells[r][c]));
      }
    }
    return book;
  }

  @Test
  void severalRunAtOnce() {
    Book book = new Book().set("A1", 1).set("B1", "=A1");
    for (int row = 2; row <= 200; row++) {
      book.set("B" + row, "=B" + (row - 1) + "+$A$1");
    }
    book.recalculation();
    IntStream.range(0, 500)
        .parallel()
        .forEach(i -> assertEquals(200.0 * i, book.number(book.whatIf("A1", i), "B200")));
    assertEquals(200, book.number("B200"));
  }

  @Test
  void randomNumbersKeepTheirStoredValueUnlessDrawn() {
    Book book = new Book().set("A1", 2).set("B1", "=RAND()*A1", 0.5).set("C1", "=B1+A1", 2.5);
    assertEquals(3.5, book.number(book.whatIf("A1", 3), "C1"));
    Change none = new Change(Map.of(), Map.of());
    double first = book.number(book.recalculation().draw(1, none), "B1");
    assertEquals(first, book.number(book.recalculation().draw(1, none), "B1"));
    assertNotEquals(first, book.number(book.recalculation().draw(2, none), "B1"));
    Values changed = book.recalculation().draw(1, Change.of(book.address("A1"), 4));
    assertEquals(2 * first, book.number(changed, "B1"), 1e-15);
  }
}
