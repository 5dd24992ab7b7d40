package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.SequenceNode;

/** The fields of one YAML mapping; whatever is not as asked is a fault and reads as empty. */
final class Fields {
  private final Node self;
  private final Faults faults;
  private final Map<String, Node> values = new LinkedHashMap<>();
  private final Map<String, Node> keys = new LinkedHashMap<>();

  Fields(Node node, Faults faults) {
    this.self = node;
    this.faults = faults;
    if (node instanceof MappingNode mapping) {
      for (NodeTuple tuple : mapping.getValue()) {
        String key = text(tuple.getKeyNode());
        if (values.put(key, tuple.getValueNode()) != null) {
          faults.add(tuple.getKeyNode(), "field '" + key + "' is given twice");
        }
        keys.put(key, tuple.getKeyNode());
      }
    } else {
      faults.add(node, "fields expected here");
    }
  }

  Node node() {
    return self;
  }

  boolean has(String key) {
    return values.containsKey(key);
  }

  /** The value's node, or this mapping's own where the field is missing. */
  Node at(String key) {
    return values.getOrDefault(key, self);
  }

  List<String> names() {
    return List.copyOf(values.keySet());
  }

  /** Reports every field that is not one of these. */
  void only(Set<String> known) {
    keys.forEach(
        (key, node) -> {
          if (!known.contains(key)) {
            faults.add(node, "unknown field '" + key + "'");
          }
        });
  }

  /** The text of a field that must be there. */
  String required(String key) {
    if (!has(key)) {
      faults.add(self, "field '" + key + "' is missing");
      return "";
    }
    return text(values.get(key)).strip();
  }

  String optional(String key) {
    return has(key) ? text(values.get(key)).strip() : null;
  }

  /** The elements of a list; a single value counts as a list of one. */
  List<Node> list(String key) {
    Node value = values.get(key);
    if (value == null) {
      return List.of();
    }
    return value instanceof SequenceNode sequence ? sequence.getValue() : List.of(value);
  }

  List<String> texts(String key) {
    List<String> texts = new ArrayList<>();
    list(key).forEach(node -> texts.add(text(node)));
    return texts;
  }

  Fields fields(String key) {
    return new Fields(values.get(key), faults);
  }

  String text(Node node) {
    if (node instanceof ScalarNode scalar) {
      return scalar.getValue();
    }
    faults.add(node, "a single value expected here");
    return "";
  }
}
