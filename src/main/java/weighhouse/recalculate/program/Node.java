package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;
import weighhouse.recalculate.functions.Grid;
import weighhouse.recalculate.functions.Reference;

/**
 * A part of a compiled formula. Has no state of its own. The two ways to a plain number are quick
 * and answer NaN where only {@link #value} can tell; {@code value} never throws.
 */
public abstract class Node {

  /** What arithmetic sees, or NaN where {@link #value} must be asked. */
  public double number(Frame frame) {
    return value(frame).number();
  }

  /** The value if it is a number or blank, or NaN where {@link #value} must be asked. */
  public double plain(Frame frame) {
    Value value = value(frame);
    return value instanceof Value.Num n ? n.value() : Double.NaN;
  }

  /** The value: an error where evaluation fails, an array where the formula works on arrays. */
  public abstract Value value(Frame frame);

  /** What it points at, or null where it is no reference. */
  public Reference reference(Frame frame) {
    return null;
  }

  /** The value as a rectangle; of a reference its cells. */
  public Grid grid(Frame frame) {
    Reference reference = reference(frame);
    return reference == null ? Grid.of(value(frame)) : frame.cells(reference);
  }

  /** The one value that a formula leaves in its cell. */
  public Value result(Frame frame) {
    Value value = Coerce.single(value(frame));
    return value instanceof Value.Blank ? new Value.Num(0) : value;
  }
}
