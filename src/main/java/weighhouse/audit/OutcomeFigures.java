package weighhouse.audit;

import weighhouse.workbook.CellAddress;

/** An outcome of the model now and with corrections. */
public record OutcomeFigures(CellAddress cell, String label, Figure now, Figure corrected) {}
