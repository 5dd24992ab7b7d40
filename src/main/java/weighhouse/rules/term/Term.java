package weighhouse.rules.term;

import java.util.BitSet;
import java.util.List;

/** A node of algebra. Within one {@link Terms}, equal algebra is one and the same object. */
public final class Term {
  private final int id;
  private final Operation operation;
  private final List<Term> parts;
  private final double number;
  private final Object symbol;
  private final BitSet below = new BitSet();

  Term(int id, Operation operation, List<Term> parts, double number, Object symbol) {
    this.id = id;
    this.operation = operation;
    this.parts = List.copyOf(parts);
    this.number = number;
    this.symbol = symbol;
    below.set(id);
    parts.forEach(part -> below.or(part.below));
  }

  /** Its place in the order of making; parts come before the whole. */
  public int id() {
    return id;
  }

  public Operation operation() {
    return operation;
  }

  public List<Term> parts() {
    return parts;
  }

  /** The value of a {@link Operation#NUMBER}. */
  public double number() {
    return number;
  }

  /** What a {@link Operation#SYMBOL} stands for. */
  public Object symbol() {
    return symbol;
  }

  public boolean isNumber() {
    return operation == Operation.NUMBER;
  }

  /** Whether the other is this term or any part of it. */
  public boolean contains(Term other) {
    return below.get(other.id);
  }

  /** Whether any of those terms is this one or a part of it. */
  public boolean containsAny(BitSet ids) {
    return below.intersects(ids);
  }

  /** Ids of this term and all its parts. */
  public BitSet below() {
    return (BitSet) below.clone();
  }
}
