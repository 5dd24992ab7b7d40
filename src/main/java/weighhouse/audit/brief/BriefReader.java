package weighhouse.audit.brief;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.audit.Brief;
import weighhouse.audit.Severity;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.TimeUnit;

/** Reads a brief. */
public final class BriefReader {
  private static final Pattern RANGE =
      Pattern.compile(".+!\\$?[A-Za-z]{1,3}\\$?[0-9]{1,7}(:\\$?[A-Za-z]{1,3}\\$?[0-9]{1,7})?");
  private static final Set<String> FIELDS =
      Set.of(
          "workbook",
          "cycle",
          "threshold",
          "tolerance",
          "outcomes",
          "quantities",
          "accepted",
          "gate");

  private final BriefNodes nodes = new BriefNodes();

  private BriefReader() {}

  /**
   * Reads a brief from the text of its file.
   *
   * @throws BriefFaultsException with every fault of it
   */
  public static Brief read(String yaml) throws BriefFaultsException {
    BriefReader reader = new BriefReader();
    Brief brief = reader.brief(root(yaml));
    reader.nodes.throwIfAny();
    return brief;
  }

  private static Node root(String yaml) throws BriefFaultsException {
    LoadSettings settings = LoadSettings.builder().setMaxAliasesForCollections(10).build();
    try {
      return new Compose(settings).composeString(yaml).orElse(null);
    } catch (MarkedYamlEngineException e) {
      var mark = e.getProblemMark();
      int line = mark.map(m -> m.getLine() + 1).orElse(1);
      int column = mark.map(m -> m.getColumn() + 1).orElse(1);
      throw new BriefFaultsException(
          List.of(new BriefFaultsException.Fault(line, column, "no YAML: " + e.getProblem())));
    } catch (YamlEngineException e) {
      throw new BriefFaultsException(
          List.of(new BriefFaultsException.Fault(1, 1, "no YAML: " + e.getMessage())));
    }
  }

  private Brief brief(Node root) {
    Map<String, Node> fields = nodes.fields(root, "a brief", FIELDS);
    return new Brief(
        quantities(fields.get("quantities")),
        nodes.value(fields.get("cycle"), "cycle", Double.NaN, BriefReader::years),
        outcomes(fields.get("outcomes")),
        nodes.value(fields.get("threshold"), "threshold", Double.NaN, BriefReader::notNegative),
        nodes.value(
            fields.get("tolerance"),
            "tolerance",
            Brief.DEFAULT_TOLERANCE,
            BriefReader::notNegative),
        accepted(fields.get("accepted")),
        demands(fields.get("gate")));
  }

  private Map<String, Quantity> quantities(Node node) {
    Map<String, Quantity> quantities = new LinkedHashMap<>();
    nodes
        .entries(node, "quantities")
        .forEach(
            (range, text) -> {
              if (!RANGE.matcher(range).matches()) {
                nodes.fault(text, "'" + range + "' is no range: write it like 'Inputs!C5:C9'");
              }
              Quantity quantity =
                  nodes.value(text, "quantity of " + range, null, QuantityText::parse);
              if (quantity != null) {
                quantities.put(range, quantity);
              }
            });
    return quantities;
  }

  private List<String> outcomes(Node node) {
    List<String> outcomes = new ArrayList<>();
    for (Node item : nodes.list(node, "outcomes")) {
      String cell = nodes.text(item, "an outcome");
      if (cell != null && !RANGE.matcher(cell).matches()) {
        nodes.fault(item, "'" + cell + "' is no cell: write it like 'Results!C10'");
      } else if (cell != null) {
        outcomes.add(cell);
      }
    }
    return outcomes;
  }

  private List<Brief.Accepted> accepted(Node node) {
    List<Brief.Accepted> accepted = new ArrayList<>();
    for (Node item : nodes.list(node, "accepted")) {
      Map<String, Node> fields =
          nodes.fields(item, "an accepted finding", Set.of("finding", "reason", "by", "until"));
      accepted.add(
          new Brief.Accepted(
              required(item, fields, "finding"),
              required(item, fields, "reason"),
              required(item, fields, "by"),
              nodes.value(fields.get("until"), "until", null, BriefReader::date)));
    }
    return accepted;
  }

  private String required(Node item, Map<String, Node> fields, String name) {
    String text = nodes.text(fields.get(name), name);
    if (text == null || text.isBlank()) {
      nodes.fault(item, "an accepted finding needs '" + name + "'");
      return "";
    }
    return text;
  }

  private Brief.Demands demands(Node node) {
    Map<String, Node> fields =
        nodes.fields(node, "gate", Set.of("hold-at", "least-coverage", "least-reproduction"));
    return new Brief.Demands(
        nodes.value(fields.get("hold-at"), "hold-at", Severity.MAJOR, BriefReader::severity),
        nodes.value(fields.get("least-coverage"), "least-coverage", 0.0, BriefReader::share),
        nodes.value(
            fields.get("least-reproduction"), "least-reproduction", 0.0, BriefReader::share));
  }

  private static double years(String text) {
    var span = QuantityText.span(text);
    if (span.unit() == TimeUnit.CYCLE) {
      throw new IllegalArgumentException("give its length in days, weeks, months or years");
    }
    return span.years();
  }

  private static double notNegative(String text) {
    double number = number(text);
    if (!(number >= 0)) {
      throw new IllegalArgumentException("must be 0 or more");
    }
    return number;
  }

  private static double share(String text) {
    double number = number(text);
    if (!(number >= 0 && number <= 1)) {
      throw new IllegalArgumentException("must be a share from 0 to 1");
    }
    return number;
  }

  private static double number(String text) {
    try {
      return Double.parseDouble(text);
    } catch (NumberFormatException e) {
      throw new IllegalArgumentException("'" + text + "' is no number", e);
    }
  }

  private static LocalDate date(String text) {
    try {
      return LocalDate.parse(text);
    } catch (DateTimeParseException e) {
      throw new IllegalArgumentException("write the date like 2027-01-31", e);
    }
  }

  private static Severity severity(String text) {
    for (Severity severity : Severity.values()) {
      if (severity.text().equals(text.toLowerCase(Locale.ROOT))) {
        return severity;
      }
    }
    throw new IllegalArgumentException("must be critical, major, minor or query");
  }
}
