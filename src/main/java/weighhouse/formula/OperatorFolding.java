package weighhouse.formula;

import java.util.ArrayDeque;
import java.util.Deque;

/**
 * Folds a flat list of operands and operators into a tree by {@link BinaryOp#binding()}; operators
 * of one strength group from the left, {@code ^} as well.
 */
final class OperatorFolding {
  private final TreeBuilder builder;
  private final Deque<Expr> operands = new ArrayDeque<>(4);
  private final Deque<BinaryOp> operators = new ArrayDeque<>(4);

  OperatorFolding(TreeBuilder builder) {
    this.builder = builder;
  }

  boolean isEmpty() {
    return operands.isEmpty();
  }

  void operand(Expr operand) {
    operands.push(operand);
  }

  void operator(BinaryOp operator) {
    while (!operators.isEmpty() && operators.peek().binding() >= operator.binding()) {
      reduce();
    }
    operators.push(operator);
  }

  Expr result() {
    while (!operators.isEmpty()) {
      reduce();
    }
    return operands.pop();
  }

  private void reduce() {
    Expr right = operands.pop();
    Expr left = operands.pop();
    operands.push(builder.join(operators.pop(), left, right));
  }
}
