package weighhouse.workbook.ooxml;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.xml.stream.XMLStreamException;
import org.codehaus.stax2.XMLStreamReader2;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellsBuilder;
import weighhouse.workbook.FormulaRole;

/** The formulas of a sheet: {@code f} elements, of their own, shared, array or data table. */
final class SheetFormulas {
  private final XMLStreamReader2 xml;
  private final CellsBuilder cells;
  private final int sheet;
  private final Letters letters = new Letters();
  private final Map<String, Integer> shared = new HashMap<>();
  private final List<CellRange> arrays = new ArrayList<>();

  SheetFormulas(XMLStreamReader2 xml, CellsBuilder cells, int sheet) {
    this.xml = xml;
    this.cells = cells;
    this.sheet = sheet;
  }

  /** Ranges of the array formulas met so far. */
  List<CellRange> arrays() {
    return arrays;
  }

  /**
   * Reads the {@code f} element at hand for the cell at hand.
   *
   * @param dynamic whether the cell's metadata let an array spill
   */
  void read(boolean dynamic) throws XMLStreamException {
    String type = null;
    String index = null;
    String ref = null;
    for (int i = 0; i < xml.getAttributeCount(); i++) {
      switch (xml.getAttributeLocalName(i)) {
        case "t" -> type = xml.getAttributeValue(i);
        case "si" -> index = xml.getAttributeValue(i);
        case "ref" -> ref = xml.getAttributeValue(i);
        default -> {
          // hints for recalculation
        }
      }
    }
    letters.read(xml);
    if (type == null) {
      plain();
      return;
    }
    switch (type) {
      case "shared" -> shared(index, ref);
      case "array" -> array(ref, dynamic);
      case "dataTable" -> Ranges.parse(ref, sheet).ifPresent(cells::dataTable);
      default -> plain();
    }
  }

  private void plain() {
    int start = letters.formulaStart();
    if (start < letters.length) {
      cells.formula(letters.array, start, letters.length - start);
    }
  }

  /** The first member carries text and range; a member with text but no range stands alone. */
  private void shared(String index, String ref) {
    int start = letters.formulaStart();
    boolean hasText = start < letters.length;
    if (index == null || (hasText && ref == null && shared.containsKey(index))) {
      plain();
      return;
    }
    Integer group = shared.get(index);
    if (group == null || (hasText && cells.isDefined(group))) {
      group = cells.newGroup();
      shared.put(index, group);
    }
    if (hasText) {
      cells.define(group, letters.array, start, letters.length - start);
    }
    cells.member(group, FormulaRole.PLAIN);
  }

  private void array(String ref, boolean dynamic) {
    int start = letters.formulaStart();
    if (start == letters.length) {
      return;
    }
    int group = cells.newGroup();
    cells.define(group, letters.array, start, letters.length - start);
    cells.member(group, dynamic ? FormulaRole.DYNAMIC_ARRAY : FormulaRole.ARRAY_ANCHOR);
    Optional<CellRange> range = Ranges.parse(ref, sheet);
    range.ifPresent(
        area -> {
          cells.array(area, group);
          arrays.add(area);
        });
  }
}
