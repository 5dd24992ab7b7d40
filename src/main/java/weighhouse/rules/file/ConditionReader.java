package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.rules.pattern.Condition;
import weighhouse.rules.pattern.FixedCondition;
import weighhouse.rules.pattern.IncludesCondition;
import weighhouse.rules.pattern.PlainCondition;
import weighhouse.rules.pattern.SpanCondition;
import weighhouse.rules.pattern.ValueCondition;

/** Reads what a metavariable's declaration asks beyond its kind. */
final class ConditionReader {
  private static final Map<String, SpanCondition.Relation> RELATIONS =
      Map.of(
          "same as", SpanCondition.Relation.SAME_AS,
          "differs from", SpanCondition.Relation.DIFFERS_FROM,
          "longer than", SpanCondition.Relation.LONGER_THAN,
          "shorter than", SpanCondition.Relation.SHORTER_THAN);
  private static final Map<String, ValueCondition.Comparison> COMPARISONS =
      Map.of(
          "above", ValueCondition.Comparison.ABOVE,
          "below", ValueCondition.Comparison.BELOW,
          "at most", ValueCondition.Comparison.AT_MOST,
          "at least", ValueCondition.Comparison.AT_LEAST);
  private static final Pattern WORDS = Pattern.compile("([a-z]+(?: [a-z]+)?) (\\S+)");

  private final Faults faults;

  ConditionReader(Faults faults) {
    this.faults = faults;
  }

  List<Condition> read(Fields fields) {
    List<Condition> conditions = new ArrayList<>();
    if (fields.has("span")) {
      span(fields, conditions);
    }
    if (fields.has("value")) {
      value(fields, conditions);
    }
    if (fields.has("includes")) {
      conditions.add(new IncludesCondition(Kinds.read(fields, "includes", faults)));
    }
    if (fields.has("fixed")) {
      conditions.add(new FixedCondition("true".equals(fields.optional("fixed"))));
    }
    if ("true".equals(fields.optional("plain"))) {
      conditions.add(new PlainCondition());
    }
    return conditions;
  }

  private void span(Fields fields, List<Condition> conditions) {
    Matcher words = WORDS.matcher(fields.required("span"));
    if (words.matches() && RELATIONS.containsKey(words.group(1))) {
      conditions.add(new SpanCondition(RELATIONS.get(words.group(1)), words.group(2)));
    } else {
      faults.add(fields.at("span"), "a span is " + RELATIONS.keySet() + " the cycle or another");
    }
  }

  private void value(Fields fields, List<Condition> conditions) {
    Matcher words = WORDS.matcher(fields.required("value"));
    if (words.matches()
        && COMPARISONS.containsKey(words.group(1))
        && words.group(2).matches("-?[0-9.]+")) {
      double limit = Double.parseDouble(words.group(2));
      conditions.add(new ValueCondition(COMPARISONS.get(words.group(1)), limit));
    } else {
      faults.add(fields.at("value"), "a value is " + COMPARISONS.keySet() + " a number");
    }
  }
}
