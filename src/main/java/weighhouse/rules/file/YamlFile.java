package weighhouse.rules.file;

import java.util.Optional;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.nodes.Node;

/** A YAML text as nodes that know their place. */
final class YamlFile {
  private YamlFile() {}

  /** The document's root; empty, with the fault told, where it is no YAML. */
  static Optional<Node> root(String text, Faults faults) {
    LoadSettings settings = LoadSettings.builder().setUseMarks(true).build();
    try {
      Optional<Node> root = new Compose(settings).composeString(text);
      if (root.isEmpty()) {
        faults.add(Optional.empty(), "the file is empty");
      }
      return root;
    } catch (MarkedYamlEngineException e) {
      faults.add(e.getProblemMark(), "not valid YAML: " + e.getProblem());
    } catch (YamlEngineException e) {
      faults.add(Optional.empty(), "not valid YAML: " + e.getMessage());
    }
    return Optional.empty();
  }
}
