package weighhouse.quantity.inference;

import java.util.List;
import java.util.Optional;
import weighhouse.quantity.Cycle;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;
import weighhouse.quantity.vocabulary.Reading;
import weighhouse.quantity.vocabulary.Vocabulary;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/** The cycle length told in words: "monthly cycle", "1 cycle = 1 year", "cycle length: 28 days". */
final class CycleWords {
  private static final int LONGEST = 120;

  private final Workbook workbook;
  private final Vocabulary vocabulary;

  CycleWords(Workbook workbook, Vocabulary vocabulary) {
    this.workbook = workbook;
    this.vocabulary = vocabulary;
  }

  Optional<Cycle> find() {
    for (int sheet = 0; sheet < workbook.sheets().size(); sheet++) {
      CellStore cells = workbook.sheet(sheet).cells();
      for (int i = 0; i < cells.size(); i++) {
        if (cells.kind(i) == CellKind.TEXT && cells.text(i).length() <= LONGEST) {
          CellAddress cell = new CellAddress(sheet, cells.row(i), cells.column(i));
          Optional<Cycle> cycle = told(cells.text(i), cell);
          if (cycle.isPresent()) {
            return cycle;
          }
        }
      }
    }
    return Optional.empty();
  }

  private Optional<Cycle> told(String text, CellAddress cell) {
    Reading reading = vocabulary.read(text);
    Span span = reading.span();
    boolean speaksOfCycles = vocabulary.speaksOf(TimeUnit.CYCLE, text);
    boolean length = reading.kind() == Kind.CYCLE_LENGTH;
    if (span != null && span.unit() != TimeUnit.CYCLE && speaksOfCycles) {
      boolean bare = reading.senses().stream().allMatch(s -> isTime(s.kind()));
      if (length || bare) {
        return Optional.of(cycle(span, text, cell));
      }
    }
    return length ? beside(cell, text) : Optional.empty();
  }

  private static boolean isTime(Kind kind) {
    return kind == Kind.TIME || kind == Kind.CYCLE_LENGTH || kind == Kind.COUNT;
  }

  /** The label "cycle length" with a text such as "1 month" or "monthly" beside it. */
  private Optional<Cycle> beside(CellAddress label, String text) {
    CellStore cells = workbook.sheet(label.sheet()).cells();
    int index = cells.find(label.row(), label.column() + 1);
    if (index < 0 || cells.kind(index) != CellKind.TEXT) {
      return Optional.empty();
    }
    Span span = vocabulary.read("in " + cells.text(index)).span();
    return span == null || span.unit() == TimeUnit.CYCLE
        ? Optional.empty()
        : Optional.of(cycle(span, text.strip() + " " + cells.text(index).strip(), label));
  }

  private Cycle cycle(Span span, String text, CellAddress cell) {
    String evidence = "'" + text.strip() + "' in " + workbook.show(cell);
    return new Cycle(span.years(), List.of(), List.of(evidence));
  }
}
