package weighhouse.audit;

import weighhouse.workbook.CellAddress;

/** A cell's value now and with the correction. */
public record CellFigures(CellAddress cell, Figure now, Figure correct) {}
