package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;

/** All ways in which a pattern's metavariables can stand for parts of one formula. */
final class Bindings {
  /** Formulas with more operands of the right kinds than this are totals, not steps of a model. */
  private static final int MOST = 600;

  private final List<String> names;
  private final List<List<Bound>> candidates = new ArrayList<>();
  private int tried;

  Bindings(TypedPattern typed, FormulaView view) {
    this.names = typed.pattern().variables();
    Candidates source = new Candidates(view);
    for (String name : names) {
      List<Bound> bounds = source.of(typed.where().get(name));
      candidates.add(bounds);
      if (bounds.isEmpty()) {
        break;
      }
    }
  }

  void forEach(Consumer<Map<String, Bound>> action) {
    if (candidates.size() == names.size()) {
      extend(0, new LinkedHashMap<>(), action);
    }
  }

  private void extend(int index, Map<String, Bound> bound, Consumer<Map<String, Bound>> action) {
    if (index == names.size()) {
      if (tried++ < MOST) {
        action.accept(new LinkedHashMap<>(bound));
      }
      return;
    }
    for (Bound next : candidates.get(index)) {
      if (bound.values().stream().noneMatch(other -> overlap(other, next))) {
        bound.put(names.get(index), next);
        extend(index + 1, bound, action);
        bound.remove(names.get(index));
      }
    }
  }

  private static boolean overlap(Bound a, Bound b) {
    return a.term().contains(b.term()) || b.term().contains(a.term());
  }
}
