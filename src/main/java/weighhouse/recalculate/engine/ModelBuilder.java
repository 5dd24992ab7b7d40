package weighhouse.recalculate.engine;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.formula.Shapes;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.cells.Layout;
import weighhouse.recalculate.cells.LayoutBuilder;
import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Compiler;
import weighhouse.recalculate.program.Footprint;
import weighhouse.recalculate.program.Names;
import weighhouse.recalculate.program.Program;
import weighhouse.recalculate.program.UnsupportedFormulaException;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.FormulaRole;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Table;
import weighhouse.workbook.Workbook;

/** Compiles the shapes of a workbook and lays out its cells. */
final class ModelBuilder {
  /** A shape is compiled once for each sheet, and for each table that it stands in. */
  private record Key(int shape, int sheet, Table table) {}

  private final Workbook workbook;
  private final Shapes shapes;
  private final Names names;
  private final boolean[] across;

  /** Ranges of array formulas of more than one cell. */
  private final Set<CellRange> arrays = new HashSet<>();

  private final Map<Key, Object> programs = new HashMap<>();
  private final Map<String, Integer> refused = new TreeMap<>();

  ModelBuilder(Workbook workbook, Shapes shapes) {
    this.workbook = workbook;
    this.shapes = shapes;
    this.names = new Names(workbook);
    for (Sheet sheet : workbook.sheets()) {
      sheet.arrays().stream().filter(range -> range.size() > 1).forEach(arrays::add);
    }
    this.across = Orientation.of(workbook.sheets().size(), shapes.regions());
  }

  Model build() {
    LayoutBuilder slots = new LayoutBuilder(across);
    List<Region> runnable = new ArrayList<>();
    List<Program> compiled = new ArrayList<>();
    for (int sheet = 0; sheet < workbook.sheets().size(); sheet++) {
      addStored(sheet, slots);
    }
    for (Region region : shapes.regions()) {
      Object program = program(region);
      if (program instanceof Program runs) {
        runnable.add(region);
        compiled.add(runs);
        addReads(region, runs, slots);
      } else {
        refused.merge((String) program, (int) region.range().size(), Integer::sum);
      }
    }
    if (!shapes.unparsed().isEmpty()) {
      refused.merge("formula that cannot be read", shapes.unparsed().size(), Integer::sum);
    }
    Layout layout = slots.build();
    List<Unit> units = new ArrayList<>();
    for (int i = 0; i < runnable.size(); i++) {
      units.add(unit(runnable.get(i), compiled.get(i), layout));
    }
    return new Model(workbook, shapes, names, layout, units, stored(layout), refused);
  }

  private void addStored(int sheet, LayoutBuilder slots) {
    CellStore cells = workbook.sheet(sheet).cells();
    for (int i = 0; i < cells.size(); i++) {
      slots.add(sheet, cells.row(i), cells.column(i));
      if (cells.role(i) == FormulaRole.DATA_TABLE) {
        refused.merge("data table", 1, Integer::sum);
      }
    }
  }

  private void addReads(Region region, Program program, LayoutBuilder slots) {
    CellRange hosts = region.range();
    slots.add(hosts);
    CellRange seenFrom = arrays.contains(hosts) ? CellRange.of(hosts.first()) : hosts;
    for (Footprint read : program.cells()) {
      if (!read.wraps(seenFrom)) {
        slots.add(read.hull(seenFrom));
      }
    }
  }

  /** The program, or the reason why there is none. */
  private Object program(Region region) {
    CellAddress host = region.range().first();
    Key key = new Key(region.shape(), host.sheet(), names.tableAt(host));
    return programs.computeIfAbsent(key, k -> compile(shapes.all().get(k.shape()), host));
  }

  private Object compile(Shape shape, CellAddress host) {
    try {
      return Compiler.compile(shape.tree(), host, shape.array(), across[host.sheet()], names);
    } catch (UnsupportedFormulaException e) {
      return e.getMessage();
    }
  }

  private Unit unit(Region region, Program program, Layout layout) {
    CellRange hosts = region.range();
    return new Unit(region.shape(), program, hosts, arrays.contains(hosts), layout);
  }

  private CellState stored(Layout layout) {
    CellState state = new CellState(layout.slots());
    for (int sheet = 0; sheet < workbook.sheets().size(); sheet++) {
      CellStore cells = workbook.sheet(sheet).cells();
      for (int i = 0; i < cells.size(); i++) {
        int slot = layout.slot(sheet, cells.row(i), cells.column(i));
        state.set(slot, StoredValues.at(cells, i));
      }
    }
    assert state.get(Layout.NOWHERE) instanceof Value.Blank;
    return state;
  }
}
