package weighhouse.audit;

import java.util.List;
import weighhouse.workbook.Workbook;

/**
 * All that one audit found; every report is written from this alone.
 *
 * @param workbook the snapshot that was audited
 * @param formulaShapes number of distinct formulas
 * @param verdict the whole in a word
 * @param findings most consequential first
 * @param measures the ledger
 * @param outcomes now and with all corrections together
 * @param decisionFlips whether all corrections together change the decision at the threshold
 * @param threshold willingness to pay, NaN where the workbook tells none
 * @param cycle the cycle length in words, or null
 * @param coverage what was and was not analysed
 * @param quantities what was inferred and why
 * @param plots figures for the report (proportional hazards, draws)
 */
public record AuditResult(
    Workbook workbook,
    int formulaShapes,
    Verdict verdict,
    List<Finding> findings,
    List<Measure> measures,
    List<OutcomeFigures> outcomes,
    boolean decisionFlips,
    double threshold,
    String cycle,
    Coverage coverage,
    List<QuantityRow> quantities,
    List<Plot> plots) {}
