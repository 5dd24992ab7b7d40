package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.nodes.Node;

/** Collects the faults of one file. */
final class Faults {
  private final String file;
  private final List<Fault> all = new ArrayList<>();

  Faults(String file) {
    this.file = file;
  }

  void add(Node at, String message) {
    add(at == null ? Optional.empty() : at.getStartMark(), message);
  }

  void add(Optional<Mark> at, String message) {
    int line = at.map(Mark::getLine).orElse(0) + 1;
    int column = at.map(Mark::getColumn).orElse(0) + 1;
    all.add(new Fault(file, line, column, message));
  }

  List<Fault> all() {
    return all;
  }
}
