package weighhouse.audit.pipeline;

import weighhouse.audit.Measure;
import weighhouse.audit.probe.Ledger;
import weighhouse.audit.probe.Observation;
import weighhouse.rules.Subject;

/** Ledger entries with what the probe saw, as a report tells them. */
final class Measures {
  private Measures() {}

  static Measure of(Subject subject, Observation seen) {
    Ledger.Entry entry = seen.entry();
    return new Measure(
        entry.cell(),
        subject.quantities().label(entry.cell()),
        entry.kind(),
        entry.value(),
        entry.lower(),
        entry.upper(),
        seen.effective(),
        seen.actsOn(),
        seen.reaches(),
        seen.series());
  }
}
