package weighhouse.rules.check.ratio;

import weighhouse.workbook.CellAddress;

/** A ratio with the limits of its interval. */
public record Estimate(CellAddress cell, CellAddress lower, CellAddress upper) {}
