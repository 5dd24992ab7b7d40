package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.Grid;
import weighhouse.recalculate.functions.Powers;

/** An arithmetic operator on two numbers. */
abstract class Arithmetic extends Node {
  final Node left;
  final Node right;

  private Arithmetic(Node left, Node right) {
    this.left = left;
    this.right = right;
  }

  /** The result, or NaN or an infinity where it is an error. */
  abstract double apply(double a, double b);

  Value failure(double a, double b) {
    return Fault.NUM.value();
  }

  @Override
  public final double plain(Frame frame) {
    return number(frame);
  }

  @Override
  public final Value value(Frame frame) {
    return Broadcast.pairs(left.value(frame), right.value(frame), this::single);
  }

  private Value single(Value a, Value b) {
    double x = Coerce.number(a);
    double y = Coerce.number(b);
    double result = apply(x, y);
    return Math.abs(result) <= Double.MAX_VALUE ? new Value.Num(result) : failure(x, y);
  }

  @Override
  public final Grid grid(Frame frame) {
    return PairedGrid.of(left.grid(frame), right.grid(frame), this::apply, this::single);
  }

  /** An infinity is no number in a cell: NaN, so that the error is found. */
  private static double finite(double number) {
    return Math.abs(number) <= Double.MAX_VALUE ? number : Double.NaN;
  }

  static final class Add extends Arithmetic {
    Add(Node left, Node right) {
      super(left, right);
    }

    @Override
    public double number(Frame frame) {
      return left.number(frame) + right.number(frame);
    }

    @Override
    double apply(double a, double b) {
      return a + b;
    }
  }

  static final class Subtract extends Arithmetic {
    Subtract(Node left, Node right) {
      super(left, right);
    }

    @Override
    public double number(Frame frame) {
      return left.number(frame) - right.number(frame);
    }

    @Override
    double apply(double a, double b) {
      return a - b;
    }
  }

  static final class Multiply extends Arithmetic {
    Multiply(Node left, Node right) {
      super(left, right);
    }

    @Override
    public double number(Frame frame) {
      return finite(left.number(frame) * right.number(frame));
    }

    @Override
    double apply(double a, double b) {
      return a * b;
    }
  }

  static final class Divide extends Arithmetic {
    Divide(Node left, Node right) {
      super(left, right);
    }

    @Override
    public double number(Frame frame) {
      return finite(left.number(frame) / right.number(frame));
    }

    @Override
    double apply(double a, double b) {
      return a / b;
    }

    @Override
    Value failure(double a, double b) {
      return b == 0 ? Fault.DIV0.value() : Fault.NUM.value();
    }
  }

  static final class Power extends Arithmetic {
    Power(Node left, Node right) {
      super(left, right);
    }

    @Override
    public double number(Frame frame) {
      return finite(Powers.of(left.number(frame), right.number(frame)));
    }

    @Override
    double apply(double a, double b) {
      return Powers.of(a, b);
    }

    @Override
    Value failure(double a, double b) {
      return a == 0 && b < 0 ? Fault.DIV0.value() : Fault.NUM.value();
    }
  }
}
