package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Arguments;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.Grid;
import weighhouse.recalculate.functions.Lambda;
import weighhouse.recalculate.functions.Reference;
import weighhouse.recalculate.functions.Surroundings;

/** The arguments of one call, evaluated once each when asked for. */
final class CallArguments implements Arguments {
  private final Frame frame;
  private final Node[] nodes;
  private final Value[] values;

  /**
   * @param values those evaluated already; null for the others
   */
  CallArguments(Frame frame, Node[] nodes, Value[] values) {
    this.frame = frame;
    this.nodes = nodes;
    this.values = values;
  }

  @Override
  public int count() {
    return nodes.length;
  }

  @Override
  public boolean missing(int index) {
    return index >= nodes.length || nodes[index] instanceof MissingNode;
  }

  @Override
  public Value value(int index) {
    if (values[index] == null) {
      values[index] = nodes[index].value(frame);
    }
    return values[index];
  }

  @Override
  public Grid grid(int index) {
    return values[index] == null ? nodes[index].grid(frame) : Grid.of(values[index]);
  }

  @Override
  public Reference reference(int index) {
    return nodes[index].reference(frame);
  }

  @Override
  public boolean isRange(int index) {
    if (nodes[index] instanceof CellNode || nodes[index] instanceof AreaNode) {
      return true;
    }
    return reference(index) != null || !(grid(index) instanceof Grid.Single);
  }

  @Override
  public Lambda lambda(int index) {
    if (nodes[index] instanceof LambdaNode lambda) {
      return lambda.bound(frame);
    }
    throw Fault.VALUE.exception();
  }

  @Override
  public Surroundings surroundings() {
    return frame.surroundings;
  }
}
