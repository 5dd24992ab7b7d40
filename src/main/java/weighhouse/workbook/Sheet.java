package weighhouse.workbook;

import java.util.BitSet;
import java.util.List;
import java.util.Map;

/**
 * One worksheet of the snapshot.
 *
 * @param name as shown on its tab
 * @param visibility whether it shows
 * @param cells the stored cells
 * @param arrays ranges of array formulas (first cell is the anchor)
 * @param merged merged ranges
 * @param comments text of cell comments and notes
 * @param hiddenRows rows that do not show
 * @param hiddenColumns columns that do not show
 * @param tables structured tables on the sheet
 */
public record Sheet(
    String name,
    Visibility visibility,
    CellStore cells,
    List<CellRange> arrays,
    List<CellRange> merged,
    Map<CellAddress, String> comments,
    BitSet hiddenRows,
    BitSet hiddenColumns,
    List<Table> tables) {}
