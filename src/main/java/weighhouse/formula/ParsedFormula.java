package weighhouse.formula;

import java.util.IdentityHashMap;
import java.util.Optional;

/**
 * A formula's text with its tree and the place of every node in the text.
 *
 * @param text as parsed, without the equals sign
 * @param tree the tree, relative to the host cell it was parsed for
 * @param spans place of each node, by identity of the node
 */
public record ParsedFormula(String text, Expr tree, IdentityHashMap<Expr, SourceSpan> spans) {
  public ParsedFormula {
    spans = new IdentityHashMap<>(spans);
  }

  /** Where that very node of the tree stands in the text. */
  public Optional<SourceSpan> span(Expr node) {
    return Optional.ofNullable(spans.get(node));
  }
}
