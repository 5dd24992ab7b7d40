package weighhouse.audit.pipeline;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import weighhouse.audit.Certainty;
import weighhouse.formula.Expr;
import weighhouse.quantity.Basis;
import weighhouse.recalculate.Replay;
import weighhouse.rules.Match;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;

/** How far a suspect can be trusted: whether its cells replay and what its operands rest on. */
final class Trust {
  private final Subject subject;
  private final Set<Integer> doubtfulShapes = new HashSet<>();

  Trust(Subject subject) {
    this.subject = subject;
    for (Replay.Difference difference : subject.recalculation().replay().differing()) {
      var shape = subject.shapes().at(difference.cell());
      if (shape != null) {
        doubtfulShapes.add(shape.id());
      }
    }
  }

  Certainty certainty(Weighed weighed) {
    Suspect suspect = weighed.suspect();
    if (!replays(suspect)) {
      return Certainty.POSSIBLE;
    }
    if (suspect.proven()) {
      return Certainty.PROVEN;
    }
    boolean recomputed = !weighed.values().isEmpty() && weighed.weight().value() > 0;
    return recomputed && operandsKnown(suspect.first())
        ? Certainty.PROVEN
        : operandsKnown(suspect.first()) ? Certainty.LIKELY : Certainty.POSSIBLE;
  }

  List<String> remarks(Suspect suspect) {
    List<String> remarks = new ArrayList<>();
    if (!replays(suspect)) {
      remarks.add(
          "The engine does not reproduce the stored value here, so the finding is less certain.");
    }
    return remarks;
  }

  private boolean replays(Suspect suspect) {
    return suspect.matches().stream()
        .map(match -> subject.shapes().at(match.host()))
        .noneMatch(shape -> shape != null && doubtfulShapes.contains(shape.id()));
  }

  /** Whether every operand rests on more than its number's range. */
  private boolean operandsKnown(Match match) {
    for (Expr operand : match.operands().values()) {
      var cell = Operands.cellOf(subject, operand, match.host());
      if (cell.isPresent() && !known(cell.get())) {
        return false;
      }
    }
    return true;
  }

  private boolean known(CellAddress cell) {
    Basis basis = subject.quantities().inferred(cell).basis();
    return basis != Basis.NONE && basis != Basis.RANGE;
  }
}
