package weighhouse.workbook;

import static org.junit.jupiter.api.Assertions.assertEquals;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

/** Numbers are read as {@link Double#parseDouble} reads them, to the last bit. */
class NumberReadingTest {

  private static double read(String text) throws Exception {
    CellStore cells =
        RawBook.ofCells("<row><c><v>" + text + "</v></c></row>").read().sheet(0).cells();
    return cells.number(0);
  }

  @Property(tries = 2000)
  void anyNumber(@ForAll double number) throws Exception {
    assertEquals(number, read(Double.toString(number)));
  }

  @Property(tries = 2000)
  void decimals(@ForAll long digits, @ForAll @IntRange(min = 0, max = 30) int decimals)
      throws Exception {
    String text =
        new java.math.BigDecimal(java.math.BigInteger.valueOf(digits), decimals).toPlainString();
    assertEquals(Double.parseDouble(text), read(text));
  }

  @Test
  void waysToWriteThem() throws Exception {
    for (String text :
        new String[] {"0", "-0", ".5", "5.", "+1", "1e5", "1E-7", "00012", "9007199254740993"}) {
      assertEquals(Double.parseDouble(text), read(text), text);
    }
  }
}
