package weighhouse.audit.brief;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.SequenceNode;

/** Reads values from a YAML tree and notes every fault instead of stopping at the first. */
final class BriefNodes {
  private final List<BriefFaultsException.Fault> faults = new ArrayList<>();

  void fault(Node node, String message) {
    int line = node == null ? 1 : node.getStartMark().map(m -> m.getLine() + 1).orElse(1);
    int column = node == null ? 1 : node.getStartMark().map(m -> m.getColumn() + 1).orElse(1);
    faults.add(new BriefFaultsException.Fault(line, column, message));
  }

  void throwIfAny() throws BriefFaultsException {
    if (!faults.isEmpty()) {
      faults.sort(
          Comparator.comparingInt(BriefFaultsException.Fault::line)
              .thenComparingInt(BriefFaultsException.Fault::column));
      throw new BriefFaultsException(faults);
    }
  }

  /** The fields of a mapping; unknown and repeated ones are faults. An absent node has none. */
  Map<String, Node> fields(Node node, String what, Set<String> known) {
    Map<String, Node> fields = entries(node, what);
    Map<String, Node> kept = new LinkedHashMap<>(fields);
    for (Map.Entry<String, Node> field : fields.entrySet()) {
      if (!known.contains(field.getKey())) {
        String all = String.join(", ", known.stream().sorted().toList());
        fault(
            field.getValue(), "unknown field '" + field.getKey() + "': " + what + " takes " + all);
        kept.remove(field.getKey());
      }
    }
    return kept;
  }

  /** The entries of a mapping whose keys are free. */
  Map<String, Node> entries(Node node, String what) {
    Map<String, Node> entries = new LinkedHashMap<>();
    if (node == null || isNothing(node)) {
      return entries;
    }
    if (!(node instanceof MappingNode mapping)) {
      fault(node, what + " must be fields with values");
      return entries;
    }
    Set<String> seen = new HashSet<>();
    for (NodeTuple tuple : mapping.getValue()) {
      String key = tuple.getKeyNode() instanceof ScalarNode scalar ? scalar.getValue() : "?";
      if (!seen.add(key)) {
        fault(tuple.getKeyNode(), "'" + key + "' stands here twice");
      }
      entries.put(key, tuple.getValueNode());
    }
    return entries;
  }

  List<Node> list(Node node, String what) {
    if (node == null || isNothing(node)) {
      return List.of();
    }
    if (node instanceof SequenceNode sequence) {
      return sequence.getValue();
    }
    fault(node, what + " must be a list");
    return List.of();
  }

  /** The text of a node, or null where it is absent or no text. */
  String text(Node node, String what) {
    if (node == null || isNothing(node)) {
      return null;
    }
    if (node instanceof ScalarNode scalar) {
      return scalar.getValue();
    }
    fault(node, what + " must be a text");
    return null;
  }

  /** A text read by a function that throws IllegalArgumentException with a message for people. */
  <T> T value(Node node, String what, T absent, Function<String, T> reader) {
    String text = text(node, what);
    if (text == null) {
      return absent;
    }
    try {
      return reader.apply(text);
    } catch (IllegalArgumentException e) {
      fault(node, what + ": " + e.getMessage());
      return absent;
    }
  }

  private static boolean isNothing(Node node) {
    return node instanceof ScalarNode scalar && scalar.getTag().getValue().endsWith(":null");
  }
}
