package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.rules.term.Term;
import weighhouse.rules.term.Terms;
import weighhouse.rules.term.Translator;
import weighhouse.workbook.CellAddress;

/** One cell's formula: its tree, the term of every node, and what each term means. */
public final class FormulaView {
  private static final Set<Kind> EVENTS =
      EnumSet.of(Kind.PROBABILITY, Kind.RATE, Kind.CUMULATIVE_HAZARD, Kind.SURVIVAL, Kind.ODDS);

  private final Expr tree;
  private final CellAddress host;
  private final ModelScope scope;
  private final Terms terms = new Terms();
  private final Translator translator;
  private final List<Expr> nodes;
  private final IdentityHashMap<Expr, Expr> parents = new IdentityHashMap<>();
  private final Map<Term, Expr> own = new HashMap<>();
  private final Map<Term, Quantity> quantities = new HashMap<>();
  private final FadedRatios fadedRatios = new FadedRatios(this);

  public FormulaView(Expr tree, CellAddress host, ModelScope scope) {
    this.tree = tree;
    this.host = host;
    this.scope = scope;
    this.translator = new Translator(terms, scope);
    translator.translate(tree, host);
    this.nodes = new ArrayList<>(Trees.walk(tree));
    Collections.reverse(nodes);
    for (Expr node : nodes) {
      Trees.children(node).forEach(child -> parents.put(child, node));
      if (translator.recorded().containsKey(node)) {
        own.putIfAbsent(term(node), node);
      }
    }
  }

  public Expr tree() {
    return tree;
  }

  public CellAddress host() {
    return host;
  }

  public ModelScope scope() {
    return scope;
  }

  Terms terms() {
    return terms;
  }

  /** All nodes of the tree, parts before wholes. */
  List<Expr> nodes() {
    return nodes;
  }

  /** The term of a node; null of nodes inside what is not looked into. */
  Term term(Expr node) {
    return translator.recorded().get(node);
  }

  /** The node that a node is a part of; null of the tree itself. */
  Expr parent(Expr node) {
    return parents.get(node);
  }

  /**
   * The term of the whole formula if some nodes stood for other terms; all nodes on the way too.
   */
  IdentityHashMap<Expr, Term> with(IdentityHashMap<Expr, Term> given) {
    Translator again = new Translator(terms, scope, given);
    again.translate(tree, host);
    return again.recorded();
  }

  /** The terms that were read somewhere in the formula or in its helpers. */
  Iterable<Term> readTerms() {
    return translator.origins().keySet();
  }

  /** Whether the formula itself spells the term out, rather than one of its helpers. */
  boolean spells(Term term) {
    return own.containsKey(term);
  }

  /** The term as an expression for the host. */
  Expr expression(Term term) {
    Expr spelt = own.get(term);
    if (spelt != null) {
      return Trees.inside(spelt);
    }
    Translator.Origin origin = translator.origins().get(term);
    Expr inside = Trees.inside(origin.expression());
    return Moving.move(inside, origin.host(), host, scope.workbook());
  }

  /** Whether a term says how often something happens, whichever way. */
  boolean isEvent(Term term) {
    return EVENTS.contains(quantity(term).kind());
  }

  /** What a term means. */
  Quantity quantity(Term term) {
    Quantity known = quantities.get(term);
    if (known == null) {
      Translator.Origin origin = translator.origins().get(term);
      known =
          origin == null
              ? Quantity.UNKNOWN
              : scope.quantities().of(origin.expression(), origin.host());
      quantities.put(term, known);
      known = fadedRatios.orElse(term, known);
      quantities.put(term, known);
    }
    return known;
  }
}
