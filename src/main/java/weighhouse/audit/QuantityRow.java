package weighhouse.audit;

import java.util.List;
import weighhouse.workbook.CellRange;

/** A range with what was inferred of it, in words; {@code span} may be null. */
public record QuantityRow(
    CellRange range, String label, String kind, String span, List<String> evidence, String basis) {}
