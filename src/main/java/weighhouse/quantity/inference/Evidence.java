package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.List;
import weighhouse.quantity.Basis;
import weighhouse.quantity.Inferred;
import weighhouse.quantity.Kind;
import weighhouse.quantity.algebra.Demand;
import weighhouse.quantity.algebra.Spans;
import weighhouse.quantity.vocabulary.Strength;
import weighhouse.workbook.Workbook;

/** Says for people what a unit is taken for, and what speaks against it. */
final class Evidence {
  private final Workbook workbook;
  private final Unit unit;
  private final List<String> agreeing = new ArrayList<>();
  private final List<String> contradicting = new ArrayList<>();

  private Evidence(Workbook workbook, Unit unit) {
    this.workbook = workbook;
    this.unit = unit;
  }

  static Inferred of(Workbook workbook, Unit unit) {
    Evidence evidence = new Evidence(workbook, unit);
    evidence.gather();
    Basis basis = unit.verdict.source().basis();
    return new Inferred(unit.quantity(), basis, evidence.agreeing, evidence.contradicting);
  }

  private void gather() {
    if (unit.declared != null) {
      agreeing.add("declared as " + unit.declared.kind().text());
    }
    if (unit.structural != Kind.UNKNOWN) {
      say(unit.structural, unit.structure, true);
    }
    for (String sentence : unit.guess.evidence()) {
      say(unit.guess.kind(), sentence, unit.guess.known(Strength.FAIR));
    }
    if (unit.up.kind() != Kind.UNKNOWN) {
      say(unit.up.kind(), "its formula gives a " + unit.up.kind().text(), true);
    }
    for (Demand demand : unit.demands) {
      String usage = "used as " + demand.usage() + " in " + workbook.show(demand.host());
      say(demand.kind(), usage, demand.firm());
    }
    spans();
  }

  private void say(Kind kind, String sentence, boolean serious) {
    if (kind == unit.kind()) {
      agreeing.add(sentence);
    } else if (serious && kind != Kind.UNKNOWN && unit.kind() != Kind.UNKNOWN) {
      contradicting.add(sentence + ", which makes it a " + kind.text());
    }
  }

  private void spans() {
    boolean both = unit.guess.quantity().span() != null && unit.up.span() != null;
    if (both
        && unit.up.kind() == unit.kind()
        && !Spans.same(unit.guess.quantity().span(), unit.up.span())) {
      contradicting.add("label and formula speak of different lengths of time");
    }
  }
}
