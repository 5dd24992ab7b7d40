package weighhouse.formula;

import java.util.IdentityHashMap;
import java.util.List;
import java.util.Optional;

/**
 * A formula's text with its tree and the place of every node in the text. Places are kept as
 * numbers in the order of {@link Trees#walk}: a workbook may hold a million of these.
 */
public final class ParsedFormula {
  private static final int NOWHERE = -1;

  private final String text;
  private final Expr tree;
  private final int[] places;

  /**
   * @param text as parsed, without the equals sign
   * @param tree the tree, relative to the host cell it was parsed for
   * @param spans place of each node, by identity of the node; may lack some
   */
  public ParsedFormula(String text, Expr tree, IdentityHashMap<Expr, SourceSpan> spans) {
    this.text = text;
    this.tree = tree;
    List<Expr> nodes = Trees.walk(tree);
    places = new int[2 * nodes.size()];
    for (int i = 0; i < nodes.size(); i++) {
      SourceSpan span = spans.get(nodes.get(i));
      places[2 * i] = span == null ? NOWHERE : span.start();
      places[2 * i + 1] = span == null ? NOWHERE : span.end();
    }
  }

  public String text() {
    return text;
  }

  public Expr tree() {
    return tree;
  }

  /** Where that very node of the tree stands in the text. */
  @SuppressWarnings("ReferenceEquality") // equal nodes may stand in several places
  public Optional<SourceSpan> span(Expr node) {
    List<Expr> nodes = Trees.walk(tree);
    for (int i = 0; i < nodes.size(); i++) {
      if (nodes.get(i) == node && places[2 * i] != NOWHERE) {
        return Optional.of(new SourceSpan(places[2 * i], places[2 * i + 1]));
      }
    }
    return Optional.empty();
  }
}
