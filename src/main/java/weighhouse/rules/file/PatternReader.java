package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.formula.Expr;
import weighhouse.quantity.Kind;
import weighhouse.rules.pattern.CyclesOf;
import weighhouse.rules.pattern.Metavariable;
import weighhouse.rules.pattern.Pattern;
import weighhouse.rules.pattern.TypedPattern;

/** Reads what a rule matches and what should stand instead. */
final class PatternReader {
  private static final Set<String> FIELDS = Set.of("pattern", "formula", "severity");

  /** Where a rule cannot tell what should stand instead. */
  private static final String NO_FORMULA = "none";

  private final Faults faults;
  private final Map<String, Metavariable> where;
  private final Formulas formulas;

  PatternReader(Faults faults, Map<String, Metavariable> where) {
    this.faults = faults;
    this.where = where;
    Set<String> letters = new HashSet<>(where.keySet());
    letters.remove(WhereReader.CELL);
    this.formulas = new Formulas(faults, letters);
  }

  List<TypedPattern> read(Fields rule) {
    List<Pattern> unless = formulas.patterns(rule, "unless");
    Set<Kind> beside = Kinds.read(rule, "not-beside", faults);
    Expr correction = correction(rule);
    List<TypedPattern> patterns = new ArrayList<>();
    for (Node node : rule.list("match")) {
      one(rule, node, correction).map(own -> typed(own, unless, beside)).ifPresent(patterns::add);
    }
    if (rule.has("match")) {
      reportUnused(rule, patterns, unless);
    }
    return patterns;
  }

  /** A pattern with its own correction and severity. */
  private record Own(Pattern pattern, Expr correction, String severity) {}

  private Optional<Own> one(Fields rule, Node node, Expr correction) {
    if (!(node instanceof MappingNode)) {
      return formulas
          .pattern(rule.text(node), node)
          .map(pattern -> checked(new Own(pattern, correction, null), node));
    }
    Fields fields = new Fields(node, faults);
    fields.only(FIELDS);
    Expr own = fields.has("formula") ? formula(fields) : correction;
    return formulas
        .pattern(fields.required("pattern"), fields.at("pattern"))
        .map(pattern -> checked(new Own(pattern, own, fields.optional("severity")), node));
  }

  private Expr formula(Fields fields) {
    String text = fields.required("formula");
    return text.equals(NO_FORMULA) ? null : formulas.tree(text, fields.at("formula")).orElse(null);
  }

  private Own checked(Own own, Node node) {
    if (own.correction() != null) {
      Set<String> unknown = new LinkedHashSet<>(letters(own.correction()));
      own.pattern().variables().forEach(unknown::remove);
      if (!unknown.isEmpty()) {
        faults.add(node, "the correction speaks of " + unknown + ", which the pattern has not");
      }
    }
    return own;
  }

  private static Set<String> letters(Expr correction) {
    Set<String> letters = new LinkedHashSet<>();
    new Pattern("", correction)
        .variables()
        .forEach(name -> letters.add(CyclesOf.metavariable(name)));
    return letters;
  }

  private TypedPattern typed(Own own, List<Pattern> unless, Set<Kind> beside) {
    Metavariable cell = where.get(WhereReader.CELL);
    return new TypedPattern(
        own.pattern(), where, cell, unless, beside, own.correction(), own.severity());
  }

  private Expr correction(Fields rule) {
    if (!rule.has("correct")) {
      return null;
    }
    Fields correct = rule.fields("correct");
    return formula(correct);
  }

  private void reportUnused(Fields rule, List<TypedPattern> patterns, List<Pattern> unless) {
    Set<String> used = new HashSet<>(Set.of(WhereReader.CELL));
    patterns.forEach(typed -> used.addAll(typed.pattern().variables()));
    unless.forEach(pattern -> used.addAll(pattern.variables()));
    for (String name : where.keySet()) {
      if (!used.contains(name) && !patterns.isEmpty()) {
        faults.add(rule.at("where"), "metavariable '" + name + "' is declared but never used");
      }
    }
  }
}
