package weighhouse.formula.normal;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.workbook.CellAddress;

/** Which parts of formulas became which sums, products and atoms. */
public final class Origins {
  private final Map<String, List<Hosted>> byKey = new HashMap<>();

  void add(Poly poly, Hosted part) {
    byKey.computeIfAbsent(poly.key(), key -> new ArrayList<>(2)).add(part);
  }

  /** All parts that mean this, an operand before the wrappers around it. */
  public List<Hosted> of(Poly poly) {
    return Collections.unmodifiableList(byKey.getOrDefault(poly.key(), List.of()));
  }

  /** All parts that mean this atom, an operand before the wrappers around it. */
  public List<Hosted> of(Atom atom) {
    return of(Poly.of(atom));
  }

  /** The outermost part of that very cell's formula that means this. */
  public Optional<Hosted> in(CellAddress host, Poly poly) {
    List<Hosted> parts = of(poly);
    for (int i = parts.size() - 1; i >= 0; i--) {
      if (parts.get(i).host().equals(host)) {
        return Optional.of(parts.get(i));
      }
    }
    return Optional.empty();
  }
}
