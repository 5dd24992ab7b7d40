package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.quantity.Kind;
import weighhouse.rules.pattern.Condition;
import weighhouse.rules.pattern.Metavariable;
import weighhouse.rules.pattern.SpanCondition;

/** Reads the declarations of a rule's metavariables. */
final class WhereReader {
  /** Not a metavariable of patterns but the cell that holds the formula. */
  static final String CELL = "cell";

  private static final Set<String> FIELDS =
      Set.of("kind", "number", "joins", "span", "value", "includes", "fixed", "plain");

  private final Faults faults;
  private final ConditionReader conditions;

  WhereReader(Faults faults) {
    this.faults = faults;
    this.conditions = new ConditionReader(faults);
  }

  Map<String, Metavariable> read(Fields rule) {
    Map<String, Metavariable> declared = new LinkedHashMap<>();
    if (!rule.has("where")) {
      return declared;
    }
    Fields where = rule.fields("where");
    for (String name : where.names()) {
      declared.put(name, metavariable(name, where));
    }
    declared.values().forEach(m -> m.conditions().forEach(c -> check(c, declared, where)));
    return declared;
  }

  private Metavariable metavariable(String name, Fields where) {
    Node node = where.at(name);
    if (!name.matches("[a-z_]+")) {
      faults.add(node, "metavariable '" + name + "' must have small letters only");
    }
    if (!(node instanceof MappingNode)) {
      Set<Kind> kinds = Kinds.read(where, name, faults);
      return new Metavariable(name, kinds, List.of(), false, List.of());
    }
    Fields fields = new Fields(node, faults);
    fields.only(FIELDS);
    Set<Kind> kinds = Kinds.read(fields, "kind", faults);
    List<Double> numbers = numbers(fields);
    if (kinds.isEmpty() && numbers.isEmpty()) {
      faults.add(node, "metavariable '" + name + "' has neither kind nor number");
    }
    boolean joins = "true".equals(fields.optional("joins"));
    return new Metavariable(name, kinds, numbers, joins, conditions.read(fields));
  }

  private List<Double> numbers(Fields fields) {
    List<Double> numbers = new ArrayList<>();
    for (Node node : fields.list("number")) {
      String text = fields.text(node);
      if (text.matches("[0-9.]+")) {
        numbers.add(Double.valueOf(text));
      } else {
        faults.add(node, "'" + text + "' is no number");
      }
    }
    return numbers;
  }

  private void check(Condition condition, Map<String, Metavariable> declared, Fields where) {
    String other = condition.other();
    if (other != null && !other.equals(SpanCondition.CYCLE) && !declared.containsKey(other)) {
      faults.add(where.node(), "'" + other + "' in a span is neither cycle nor declared");
    }
  }
}
