package weighhouse.audit.pipeline;

import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import weighhouse.audit.Brief;
import weighhouse.audit.Finding;
import weighhouse.audit.Severity;
import weighhouse.audit.correction.TreePath;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.formula.ParsedFormula;
import weighhouse.formula.Shape;
import weighhouse.formula.SourceSpan;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.RuleBook;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;

/** Puts a weighed suspect into the words of a finding. */
final class FindingWriter {
  private final Subject subject;
  private final RuleBook rules;
  private final Trust trust;
  private final Brief brief;
  private final FindingIds ids;
  private final FlowPath flow;

  FindingWriter(Subject subject, RuleBook rules, Trust trust, Brief brief) {
    this.subject = subject;
    this.rules = rules;
    this.trust = trust;
    this.brief = brief;
    this.ids = new FindingIds(subject);
    this.flow = new FlowPath(subject);
  }

  Finding write(Weighed weighed) {
    Suspect suspect = weighed.suspect();
    Match match = suspect.first();
    Rule rule = suspect.rule();
    String id = ids.next(suspect);
    List<Finding.Operand> operands = Operands.of(subject, match, subject.recalculation().base());
    return new Finding(
        id,
        new Finding.RuleText(rule.id(), rule.family(), rule.title(), sources(rule)),
        weighed.severity(),
        trust.certainty(weighed),
        suspect.cells(),
        match.host(),
        formula(match.host()),
        offending(match),
        match.suggestion() == null ? null : text(match.suggestion(), match.host()),
        weighed.values(),
        weighed.outcomes(),
        weighed.flips(),
        weighed.silent(),
        message(weighed),
        rule.explain(),
        question(rule, match),
        operands,
        path(match),
        notes(weighed),
        acceptance(id));
  }

  /** From the first operand that is a cell of its own to the root, then to the first outcome. */
  private List<CellAddress> path(Match match) {
    List<CellAddress> path = new ArrayList<>();
    match.operands().values().stream()
        .flatMap(operand -> Operands.cellOf(subject, operand, match.host()).stream())
        .filter(cell -> subject.shapes().at(cell) == null)
        .reduce((first, second) -> second)
        .ifPresent(input -> path.addAll(flow.between(input, match.host())));
    subject.quantities().outcomes().stream()
        .findFirst()
        .ifPresent(
            outcome -> {
              List<CellAddress> rest = flow.between(match.host(), outcome.cell());
              path.addAll(path.isEmpty() || rest.isEmpty() ? rest : rest.subList(1, rest.size()));
            });
    return path;
  }

  /** The formula as Excel shows it, or what is typed in the cell. */
  private String formula(CellAddress cell) {
    Shape shape = subject.shapes().at(cell);
    return shape == null ? typed(cell) : text(shape.tree(), cell);
  }

  private String typed(CellAddress cell) {
    double number = subject.recalculation().base().number(cell);
    return Double.isNaN(number) ? "" : Double.toString(number);
  }

  private static String text(Expr tree, CellAddress host) {
    return "=" + FormulaPrinter.print(tree, host.row(), host.column());
  }

  /** Where the offending part stands in the printed formula, counting its equals sign. */
  private SourceSpan offending(Match match) {
    Shape shape = subject.shapes().at(match.host());
    if (shape == null || match.offending() == null) {
      return null;
    }
    return TreePath.to(shape.tree(), match.offending())
        .flatMap(path -> place(path, shape.tree(), match.host()))
        .orElse(null);
  }

  private static Optional<SourceSpan> place(TreePath path, Expr tree, CellAddress host) {
    try {
      String text = FormulaPrinter.print(tree, host.row(), host.column());
      ParsedFormula printed = FormulaParser.parse(text, host.row(), host.column());
      return path.in(printed.tree())
          .flatMap(printed::span)
          .map(span -> new SourceSpan(span.start() + 1, span.end() + 1));
    } catch (FormulaSyntaxException e) {
      // a mark is a help, not a result: without one the whole formula is shown
      return Optional.empty();
    }
  }

  private List<Finding.Source> sources(Rule rule) {
    return rule.sources().stream()
        .map(
            citation -> {
              RuleBook.Source source = rules.source(citation.key());
              return new Finding.Source(
                  citation.key(), source.citation(), citation.at(), source.doi());
            })
        .toList();
  }

  private String message(Weighed weighed) {
    Suspect suspect = weighed.suspect();
    String where = subject.workbook().show(suspect.first().host());
    String label = subject.quantities().label(suspect.first().host());
    StringBuilder message = new StringBuilder(suspect.rule().title()).append(" in ").append(where);
    if (!label.isBlank()) {
      message.append(" (").append(label).append(')');
    }
    if (weighed.silent()) {
      message.append("; it makes no difference at present inputs");
    } else if (weighed.flips()) {
      message.append("; correcting it changes the decision at the threshold");
    } else if (weighed.weight().outcome() > 0) {
      message.append(
          String.format(
              Locale.ROOT,
              "; correcting it moves an outcome by up to %.3g %%",
              100 * weighed.weight().outcome()));
    }
    return message.append('.').toString();
  }

  private String question(Rule rule, Match match) {
    String question = rule.ask();
    for (Map.Entry<String, Expr> operand : match.operands().entrySet()) {
      String words =
          Operands.cellOf(subject, operand.getValue(), match.host())
              .map(subject.quantities()::label)
              .filter(label -> !label.isBlank())
              .orElseGet(() -> text(operand.getValue(), match.host()).substring(1));
      question = question.replace("{" + operand.getKey() + "}", words);
    }
    return question;
  }

  private List<String> notes(Weighed weighed) {
    List<String> notes = new ArrayList<>();
    weighed.suspect().matches().forEach(match -> notes.addAll(match.notes()));
    notes.addAll(trust.remarks(weighed.suspect()));
    return notes.stream().distinct().toList();
  }

  private Finding.Acceptance acceptance(String id) {
    return brief.accepted().stream()
        .filter(accepted -> accepted.finding().equals(id))
        .filter(
            accepted ->
                accepted.until() == null
                    || !accepted.until().isBefore(LocalDate.now(ZoneId.systemDefault())))
        .findFirst()
        .map(
            a ->
                new Finding.Acceptance(
                    a.reason(), a.by(), a.until() == null ? null : a.until().toString()))
        .orElse(null);
  }

  /** Graver first, then by consequence; accepted ones keep their place. */
  static int order(Weighed a, Weighed b) {
    Severity one = a.severity();
    Severity other = b.severity();
    int bySeverity = one.compareTo(other);
    return bySeverity != 0 ? bySeverity : b.weight().compareTo(a.weight());
  }
}
