package weighhouse.recalculate.functions;

import java.util.List;
import weighhouse.workbook.CellRange;

/** What a reference points at: one rectangle, or several of a union or a 3-D reference. */
public record Reference(List<CellRange> areas) {
  public Reference {
    areas = List.copyOf(areas);
  }

  public static Reference of(CellRange area) {
    return new Reference(List.of(area));
  }

  /** The only rectangle; several are {@code #VALUE!} to whoever needs one. */
  public CellRange area() {
    if (areas.size() != 1) {
      throw Fault.VALUE.exception();
    }
    return areas.get(0);
  }
}
