package weighhouse.quantity.label;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.formula.ReferenceResolver;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Workbook;

/** Which defined names are bound to a cell, or to the row or column of cells that it stands in. */
final class NamedCells {
  private final Map<CellAddress, List<String>> ofCell = new HashMap<>();
  private final List<Bound> ofLines = new ArrayList<>();

  private record Bound(CellRange range, String name) {}

  NamedCells(Workbook workbook) {
    ReferenceResolver resolver = new ReferenceResolver(workbook);
    for (DefinedName name : workbook.names()) {
      if (!name.hidden() && !name.name().startsWith("_xlnm")) {
        bind(resolver, name);
      }
    }
  }

  private void bind(ReferenceResolver resolver, DefinedName name) {
    try {
      CellAddress host = new CellAddress(Math.max(0, name.scope()), 0, 0);
      resolver
          .range(FormulaParser.parse(name.formula(), 0, 0).tree(), host)
          .ifPresent(range -> bind(name.name(), range));
    } catch (FormulaSyntaxException e) {
      // a name that stands for no cell labels none
    }
  }

  private void bind(String name, CellRange range) {
    if (range.size() == 1) {
      ofCell.computeIfAbsent(range.first(), cell -> new ArrayList<>(1)).add(name);
    } else if (range.rows() == 1 || range.columns() == 1) {
      ofLines.add(new Bound(range, name));
    }
  }

  List<String> of(CellAddress cell) {
    List<String> own = ofCell.getOrDefault(cell, List.of());
    if (ofLines.isEmpty()) {
      return own;
    }
    List<String> all = new ArrayList<>(own);
    ofLines.stream().filter(line -> line.range().contains(cell)).forEach(l -> all.add(l.name()));
    return all;
  }

  /** Whether a name stands for that cell alone, which so is a number of its own. */
  boolean isNamed(CellAddress cell) {
    return ofCell.containsKey(cell);
  }
}
