package weighhouse.recalculate.functions;

import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;
import weighhouse.recalculate.Value;

/** A worksheet function; the kinds differ in how fast and how lazily they can be called. */
public sealed interface Function {
  Signature signature();

  /** One number to one number; NaN or an infinity is {@code #NUM!}. */
  record OfNumber(DoubleUnaryOperator operator) implements Function {
    private static final Signature SIGNATURE = Signature.of("V");

    @Override
    public Signature signature() {
      return SIGNATURE;
    }
  }

  /** Two numbers to one number; NaN or an infinity is {@code #NUM!}. */
  record OfNumbers(DoubleBinaryOperator operator) implements Function {
    private static final Signature SIGNATURE = Signature.of("VV");

    @Override
    public Signature signature() {
      return SIGNATURE;
    }
  }

  /** The numbers of all arguments folded into one. */
  record Folding(Fold fold) implements Function {
    private static final Signature SIGNATURE = Signature.of("R+");

    @Override
    public Signature signature() {
      return SIGNATURE;
    }
  }

  /** Any other that answers with a value; may throw {@link FaultException}. */
  record General(Signature signature, Body body) implements Function {}

  /** Chooses one of its arguments; only that one is then evaluated, a reference stays one. */
  record Selecting(Signature signature, Selector selector) implements Function {}

  /**
   * Answers with a reference where it can, else (by null) with the value of its body.
   *
   * @param anywhere whether it may point beyond its arguments
   */
  record Locating(Signature signature, Locator locator, Body body, boolean anywhere)
      implements Function {}

  /** Draws a random number or reads the clock; runs only when a draw is asked for. */
  record Drawing(Signature signature, Body body) implements Function {}

  /** What a function answers. */
  @FunctionalInterface
  interface Body {
    Value call(Arguments arguments);
  }

  /** Index of the argument chosen; {@link #NONE} is {@code #N/A} and {@link #FALSE} FALSE. */
  @FunctionalInterface
  interface Selector {
    int NONE = -1;
    int FALSE = -2;

    int choose(Arguments arguments);
  }

  /** What the call points at, or null. */
  @FunctionalInterface
  interface Locator {
    Reference locate(Arguments arguments);
  }
}
