package weighhouse.audit.pipeline;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import weighhouse.audit.CellFigures;
import weighhouse.audit.Figure;
import weighhouse.audit.OutcomeFigures;
import weighhouse.audit.Severity;
import weighhouse.audit.correction.Composer;
import weighhouse.audit.correction.Correction;
import weighhouse.audit.probe.CellsOf;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Outcome;
import weighhouse.recalculate.Values;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Weighs a suspect: runs the model with its correction and compares. */
final class Scales {
  /** Root cells compared in each range when looking for the worst. */
  private static final int COMPARED = 500;

  private final Subject subject;
  private final List<Outcome> outcomes;
  private final Decision decision;
  private final double tolerance;
  private final Values now;

  Scales(Subject subject, List<Outcome> outcomes, Decision decision, double tolerance) {
    this.subject = subject;
    this.outcomes = outcomes;
    this.decision = decision;
    this.tolerance = tolerance;
    this.now = subject.recalculation().base();
  }

  Weighed weigh(Suspect suspect) {
    List<Correction> corrections = suspect.corrections(subject);
    boolean correctable = !corrections.isEmpty();
    Values then = correctable ? corrected(corrections) : now;
    List<CellAddress> cells = compared(suspect);
    Weighed.Weight weight =
        correctable
            ? new Weighed.Weight(largestOutcomeChange(then), largestChange(cells, then))
            : new Weighed.Weight(0, 0);
    boolean flips = correctable && decision.differs(now, then);
    return new Weighed(
        suspect,
        severity(suspect, correctable, weight, flips),
        values(cells, then, correctable),
        correctable ? outcomes(then) : List.of(),
        flips,
        correctable && weight.outcome() == 0 && weight.value() == 0,
        weight);
  }

  /**
   * The model with every suspect's corrections together; queries are questions and correct nothing.
   */
  Values correctedAll(List<Suspect> suspects) {
    List<Correction> all = new ArrayList<>();
    for (Suspect suspect : suspects) {
      if (!suspect.rule().level().equals("query")) {
        all.addAll(suspect.corrections(subject));
      }
    }
    return all.isEmpty() ? now : corrected(all);
  }

  boolean decisionDiffers(Values then) {
    return decision.differs(now, then);
  }

  private Values corrected(List<Correction> corrections) {
    return subject.recalculation().whatIf(Composer.compose(corrections));
  }

  List<OutcomeFigures> outcomes(Values then) {
    return outcomes.stream()
        .map(
            o ->
                new OutcomeFigures(
                    o.cell(),
                    o.label(),
                    Figures.of(now.at(o.cell())),
                    Figures.of(then.at(o.cell()))))
        .toList();
  }

  private Severity severity(
      Suspect suspect, boolean correctable, Weighed.Weight weight, boolean flips) {
    Severity level = Severity.valueOf(suspect.rule().level().toUpperCase(Locale.ROOT));
    if (level == Severity.QUERY) {
      return level;
    }
    if (flips || leavesUnitInterval(suspect)) {
      return Severity.CRITICAL;
    }
    boolean small = weight.outcome() < tolerance && weight.value() < tolerance;
    return correctable && small ? Severity.MINOR : level;
  }

  private boolean leavesUnitInterval(Suspect suspect) {
    for (CellAddress cell : compared(suspect)) {
      Kind kind = subject.quantities().at(cell).kind();
      double value = now.number(cell);
      if ((kind == Kind.PROBABILITY || kind == Kind.SURVIVAL)
          && (value > 1 + 1e-9 || value < -1e-9)) {
        return true;
      }
    }
    return false;
  }

  private static List<CellAddress> compared(Suspect suspect) {
    List<CellAddress> cells = new ArrayList<>();
    for (CellRange range : suspect.cells()) {
      cells.addAll(CellsOf.spread(range, COMPARED));
    }
    return cells;
  }

  private List<CellFigures> values(List<CellAddress> cells, Values then, boolean correctable) {
    Set<CellAddress> told = new LinkedHashSet<>();
    told.add(cells.get(0));
    told.add(cells.get(cells.size() - 1));
    CellAddress worst = cells.get(0);
    for (CellAddress cell : cells) {
      if (change(cell, then) > change(worst, then)) {
        worst = cell;
      }
    }
    told.add(worst);
    return told.stream()
        .map(
            cell ->
                new CellFigures(
                    cell,
                    Figures.of(now.at(cell)),
                    correctable ? Figures.of(then.at(cell)) : new Figure(Double.NaN, null)))
        .toList();
  }

  private double largestChange(List<CellAddress> cells, Values then) {
    return cells.stream().mapToDouble(cell -> change(cell, then)).max().orElse(0);
  }

  private double largestOutcomeChange(Values then) {
    return outcomes.stream().mapToDouble(o -> change(o.cell(), then)).max().orElse(0);
  }

  /** Relative change of a cell; infinite when it turns from or into an error. */
  private double change(CellAddress cell, Values then) {
    double a = now.number(cell);
    double b = then.number(cell);
    if (Double.isNaN(a) || Double.isNaN(b)) {
      return Double.isNaN(a) && Double.isNaN(b) ? 0 : Double.POSITIVE_INFINITY;
    }
    double difference = Math.abs(b - a);
    return difference <= 1e-14 * Math.abs(a) ? 0 : difference / Math.max(Math.abs(a), 1e-300);
  }
}
