package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.quantity.Span;

/** Reads the examples of a rule file. */
final class ExampleReader {
  private static final Set<String> FIELDS =
      Set.of("cells", "at", "formula", "finds", "value", "cycle", "note");
  private static final String HOST = "H2";

  private final Faults faults;
  private final ExampleCells cells;

  ExampleReader(Faults faults) {
    this.faults = faults;
    this.cells = new ExampleCells(faults);
  }

  List<Example> read(Fields rule) {
    List<Example> examples = new ArrayList<>();
    rule.list("examples").forEach(node -> examples.add(example(node)));
    if (examples.stream().noneMatch(Example::isFound)) {
      faults.add(rule.at("examples"), "no example in which the rule finds something");
    }
    if (examples.stream().allMatch(Example::isFound)) {
      faults.add(rule.at("examples"), "no example that the rule leaves alone");
    }
    return examples;
  }

  private Example example(Node node) {
    Fields fields = new Fields(node, faults);
    fields.only(FIELDS);
    String at = fields.has("at") ? fields.required("at") : HOST;
    String finds = fields.required("finds");
    return new Example(
        cells(fields),
        at,
        cells.read(fields.required("formula"), fields.at("formula")),
        finds.equals("nothing") ? null : finds,
        number(fields, "value"),
        cycle(fields),
        fields.optional("note"),
        node.getStartMark().map(Mark::getLine).orElse(0) + 1);
  }

  private Map<String, Example.Cell> cells(Fields example) {
    Map<String, Example.Cell> read = new LinkedHashMap<>();
    if (example.has("cells")) {
      Fields fields = example.fields("cells");
      for (String address : fields.names()) {
        read.put(address, cells.read(fields.required(address), fields.at(address)));
      }
    }
    return read;
  }

  private double number(Fields fields, String key) {
    String text = fields.optional(key);
    try {
      return text == null ? Double.NaN : Double.parseDouble(text);
    } catch (NumberFormatException e) {
      faults.add(fields.at(key), "'" + text + "' is no number");
      return Double.NaN;
    }
  }

  private double cycle(Fields fields) {
    String text = fields.optional("cycle");
    if (text == null) {
      return Double.NaN;
    }
    return SpanText.of(text)
        .map(Span::years)
        .orElseGet(
            () -> {
              faults.add(fields.at("cycle"), "'" + text + "' is no length of time");
              return Double.NaN;
            });
  }
}
