package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.quantity.Kind;
import weighhouse.rules.pattern.Metavariable;
import weighhouse.rules.pattern.TypedPattern;

/** Reads one rule file and reports every fault in it. */
public final class RuleFileReader {
  private static final Set<String> FIELDS =
      Set.of(
          "rule",
          "title",
          "severity",
          "where",
          "match",
          "unless",
          "not-beside",
          "correct",
          "check",
          "yields-to",
          "explain",
          "ask",
          "sources",
          "examples");
  private static final Set<String> SEVERITIES = Set.of("critical", "major", "minor", "query");
  private static final Pattern LETTER = Pattern.compile("\\{([a-z_]+)}");

  private final Set<String> sourceKeys;

  /** Reads files that may cite these sources. */
  public RuleFileReader(Set<String> sourceKeys) {
    this.sourceKeys = Set.copyOf(sourceKeys);
  }

  /** A rule file, where it could be read as one, with its faults. */
  public record Result(Optional<RuleFile> file, List<Fault> faults) {}

  /**
   * Reads a rule file.
   *
   * @param text the YAML
   * @param family the folder it stands in
   * @param name the file's name without its ending
   * @param path as faults are to show it
   */
  public Result read(String text, String family, String name, String path) {
    Faults faults = new Faults(path);
    Optional<RuleFile> file =
        YamlFile.root(text, faults)
            .map(root -> file(new Fields(root, faults), faults, family, name, path));
    return new Result(faults.all().isEmpty() ? file : Optional.empty(), faults.all());
  }

  private RuleFile file(Fields fields, Faults faults, String family, String name, String path) {
    fields.only(FIELDS);
    String id = fields.required("rule");
    if (!id.equals(name)) {
      faults.add(fields.at("rule"), "the rule is named '" + id + "' but its file '" + name + "'");
    }
    Map<String, Metavariable> where = new WhereReader(faults).read(fields);
    PatternReader patterns = new PatternReader(faults, where);
    List<TypedPattern> match = patterns.read(fields);
    if (fields.has("match") == fields.has("check")) {
      faults.add(fields.at("match"), "a rule has either match or check");
    }
    Map<String, String> parameters = parameters(fields);
    return new RuleFile(
        path,
        id,
        family,
        fields.required("title"),
        oneOf(SEVERITIES, fields, faults),
        where,
        match,
        gives(fields, faults),
        fields.has("correct") ? fields.fields("correct").optional("assumes") : null,
        parameters.remove("name"),
        parameters,
        fields.texts("yields-to"),
        fields.required("explain"),
        question(fields, where, faults),
        sources(fields, faults),
        new ExampleReader(faults).read(fields),
        fields.at("correct").getStartMark().map(Mark::getLine).orElse(0) + 1);
  }

  private static String oneOf(Set<String> values, Fields fields, Faults faults) {
    String value = fields.required("severity");
    if (!values.contains(value)) {
      faults.add(fields.at("severity"), "severity is one of " + values);
    }
    return value;
  }

  private static Map<String, String> parameters(Fields fields) {
    Map<String, String> parameters = new LinkedHashMap<>();
    if (fields.has("check")) {
      Fields check = fields.fields("check");
      check.required("name");
      check.names().forEach(name -> parameters.put(name, check.required(name)));
    }
    return parameters;
  }

  private static Kind gives(Fields fields, Faults faults) {
    if (!fields.has("correct")) {
      return null;
    }
    Fields correct = fields.fields("correct");
    correct.only(Set.of("formula", "gives", "assumes"));
    String text = correct.required("gives");
    Optional<Kind> kind = Kinds.of(text);
    if (kind.isEmpty()) {
      faults.add(correct.at("gives"), "unknown kind of quantity '" + text + "'");
    }
    return kind.orElse(null);
  }

  private static String question(Fields fields, Map<String, Metavariable> where, Faults faults) {
    String ask = fields.required("ask");
    Matcher letters = LETTER.matcher(ask);
    while (letters.find()) {
      if (!where.containsKey(letters.group(1))) {
        faults.add(
            fields.at("ask"),
            "metavariable '" + letters.group(1) + "' is not declared under where");
      }
    }
    return ask;
  }

  private List<RuleFile.CitedSource> sources(Fields fields, Faults faults) {
    List<RuleFile.CitedSource> sources = new ArrayList<>();
    for (Node node : fields.list("sources")) {
      Fields source = new Fields(node, faults);
      source.only(Set.of("key", "at"));
      String key = source.required("key");
      if (!sourceKeys.contains(key)) {
        faults.add(source.at("key"), "unknown source '" + key + "'");
      }
      sources.add(new RuleFile.CitedSource(key, source.optional("at")));
    }
    if (sources.isEmpty()) {
      faults.add(fields.at("sources"), "a rule cites at least one published source");
    }
    return sources;
  }
}
