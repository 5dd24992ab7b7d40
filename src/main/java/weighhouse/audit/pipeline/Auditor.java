package weighhouse.audit.pipeline;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import weighhouse.audit.AuditOptions;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Brief;
import weighhouse.audit.Finding;
import weighhouse.audit.probe.Ledger;
import weighhouse.audit.probe.Observation;
import weighhouse.audit.probe.Observer;
import weighhouse.formula.ShapeIndex;
import weighhouse.formula.Shapes;
import weighhouse.quantity.Outcome;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.inference.Inference;
import weighhouse.recalculate.Recalculation;
import weighhouse.recalculate.Values;
import weighhouse.recalculate.engine.Recalculations;
import weighhouse.rules.RuleBook;
import weighhouse.rules.Subject;
import weighhouse.workbook.UnreadableWorkbookException;
import weighhouse.workbook.Workbook;
import weighhouse.workbook.file.WorkbookReader;

/**
 * The audit as one pure call from bytes and brief to result. Rules are loaded once; one auditor may
 * serve several threads.
 */
public final class Auditor {
  private final AuditOptions options;
  private final RuleBook rules;

  /** Loads the shipped rules and the house's own. */
  public Auditor(AuditOptions options) {
    this.options = options;
    this.rules = RuleBook.load(options.houseRules());
  }

  /** Audits a file; the file is only read. */
  public AuditResult audit(Path workbook) throws UnreadableWorkbookException, IOException {
    return audit(Files.readAllBytes(workbook), workbook.getFileName().toString());
  }

  /** Audits a workbook's bytes; the file name is only shown. */
  public AuditResult audit(byte[] bytes, String fileName) throws UnreadableWorkbookException {
    return audit(subject(WorkbookReader.read(bytes, fileName)));
  }

  private Subject subject(Workbook workbook) {
    Shapes shapes = ShapeIndex.of(workbook);
    Recalculation recalculation = Recalculations.compile(workbook, shapes);
    Values values = recalculation.base();
    Quantities quantities =
        Inference.infer(workbook, shapes, values::number, Declared.in(workbook, options.brief()));
    return new Subject(workbook, shapes, quantities, recalculation);
  }

  private AuditResult audit(Subject subject) {
    Brief brief = options.brief();
    Ledger ledger = new Ledger(subject, subject.recalculation().base());
    List<Observation> observations = new Observer(subject).observe(ledger.entries());
    List<Suspect> read = new Grouping(subject).group(rules.match(subject));
    List<Suspect> suspects =
        Yielding.settle(new Witnesses(subject, rules).join(read, observations), rules);

    List<Outcome> outcomes = Declared.outcomes(subject, brief);
    double threshold = Declared.threshold(subject, brief);
    Scales scales =
        new Scales(subject, outcomes, new Decision(outcomes, threshold), brief.tolerance());
    List<Weighed> weighed = new ArrayList<>(suspects.parallelStream().map(scales::weigh).toList());
    weighed.sort(FindingWriter::order);

    Values corrected = scales.correctedAll(suspects);
    FindingWriter writer = new FindingWriter(subject, rules, new Trust(subject), brief);
    List<Finding> findings = weighed.stream().map(writer::write).toList();
    return new AuditResult(
        subject.workbook(),
        subject.shapes().all().size(),
        Verdicts.of(findings),
        findings,
        observations.stream().map(o -> Measures.of(subject, o)).toList(),
        scales.outcomes(corrected),
        scales.decisionDiffers(corrected),
        threshold,
        Declared.cycleInWords(subject.quantities().cycle()),
        CoverageCount.of(subject),
        QuantityRows.of(subject.quantities()),
        List.of());
  }
}
