package weighhouse.quantity.vocabulary;

import java.util.ArrayList;
import java.util.List;
import org.snakeyaml.engine.v2.nodes.Node;

/** Reads one group of signs of a field. */
final class FieldGroup {
  private final YamlNodes yaml;
  private final int side;
  private String sign = "";
  private int points = 1;
  private final List<String> words = new ArrayList<>();

  /**
   * @param side 1 for signs of a health-economic model, -1 for signs of something else
   */
  FieldGroup(YamlNodes yaml, int side) {
    this.yaml = yaml;
    this.side = side;
  }

  void read(Node item, FieldWords field) {
    yaml.entries(item, this::entry);
    FieldWords.Group group = new FieldWords.Group(sign, side * points);
    words.forEach(word -> field.add(group, word));
  }

  private void entry(Node key, Node value) {
    switch (yaml.text(key)) {
      case "sign" -> sign = yaml.text(value);
      case "points" -> points(value);
      case "words" -> words.addAll(yaml.texts(value));
      default -> yaml.fault(key, "expected sign, points or words");
    }
  }

  private void points(Node value) {
    String text = yaml.text(value);
    if (text.matches("[1-9]")) {
      points = Integer.parseInt(text);
    } else {
      yaml.fault(value, "expected 1 to 9");
    }
  }
}
