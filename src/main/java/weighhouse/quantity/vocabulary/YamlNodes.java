package weighhouse.quantity.vocabulary;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiConsumer;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.SequenceNode;

/** Walks a YAML document and keeps the place of what does not belong there. */
final class YamlNodes {
  private final String file;
  private final List<String> faults = new ArrayList<>();

  YamlNodes(String file) {
    this.file = file;
  }

  List<String> faults() {
    return faults;
  }

  Optional<Node> compose(String yaml) {
    try {
      return new Compose(LoadSettings.builder().setLabel(file).build()).composeString(yaml);
    } catch (MarkedYamlEngineException e) {
      fault(e.getProblemMark(), e.getProblem());
    } catch (YamlEngineException e) {
      fault(Optional.empty(), e.getMessage());
    }
    return Optional.empty();
  }

  /** Every key with its value; a fault where the node has none. */
  void entries(Node node, BiConsumer<Node, Node> each) {
    if (node instanceof MappingNode mapping) {
      for (NodeTuple entry : mapping.getValue()) {
        each.accept(entry.getKeyNode(), entry.getValueNode());
      }
    } else {
      fault(node, "expected keys with values");
    }
  }

  /** The items of a list; a fault where the node is none. */
  List<Node> items(Node node) {
    if (node instanceof SequenceNode sequence) {
      return sequence.getValue();
    }
    fault(node, "expected a list");
    return List.of();
  }

  /** The text of a scalar; a fault and an empty text where the node is none, or blank. */
  String text(Node node) {
    if (node instanceof ScalarNode scalar && !scalar.getValue().isBlank()) {
      return scalar.getValue();
    }
    fault(node, "expected a word or phrase");
    return "";
  }

  List<String> texts(Node node) {
    return items(node).stream().map(this::text).filter(text -> !text.isEmpty()).toList();
  }

  void fault(Node node, String message) {
    fault(node.getStartMark(), message);
  }

  private void fault(Optional<Mark> mark, String message) {
    String place = mark.map(m -> (m.getLine() + 1) + ":" + (m.getColumn() + 1) + ":").orElse("");
    faults.add(file + ":" + place + " " + message);
  }
}
