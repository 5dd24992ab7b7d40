package weighhouse.rules.file;

import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.quantity.Kind;

/** Kinds by the names that rule files write. */
final class Kinds {
  private static final Map<String, Kind> BY_TEXT =
      Stream.of(Kind.values()).collect(Collectors.toMap(Kind::text, Function.identity()));

  private Kinds() {}

  static Optional<Kind> of(String text) {
    return Optional.ofNullable(BY_TEXT.get(text.strip()));
  }

  /** The kinds of a list; unknown ones are faults. */
  static Set<Kind> read(Fields fields, String key, Faults faults) {
    return read(fields, fields.list(key), faults);
  }

  static Set<Kind> read(Fields fields, List<Node> nodes, Faults faults) {
    Set<Kind> kinds = EnumSet.noneOf(Kind.class);
    for (Node node : nodes) {
      String text = fields.text(node);
      of(text)
          .ifPresentOrElse(
              kinds::add, () -> faults.add(node, "unknown kind of quantity '" + text + "'"));
    }
    return kinds;
  }
}
