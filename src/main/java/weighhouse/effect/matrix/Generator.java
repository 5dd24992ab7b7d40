package weighhouse.effect.matrix;

/**
 * Generators: rates of moving between states per unit of time, rows summing to 0.
 *
 * <p>Sources: welton-ades-2005, jones-epstein-garcia-mochon-2017.
 */
public final class Generator {
  private Generator() {}

  /**
   * Transition probabilities over a span: {@code exp(Q * span)}. Ways through several states within
   * the span are counted.
   *
   * @param rates generator per unit of time
   * @param span length of time, at least 0
   */
  public static double[][] probabilities(double[][] rates, double span) {
    return MatrixExponential.of(Square.of(rates).scalarMultiply(span)).getData();
  }

  /**
   * The generator with a ratio on the rates of entering one state, the diagonal made good.
   *
   * @param to the state entered
   * @param ratio hazard, rate or mortality ratio, at least 0
   */
  public static double[][] scaleEntering(double[][] rates, int to, double ratio) {
    double[][] scaled = Square.of(rates).getData();
    for (int from = 0; from < scaled.length; from++) {
      if (from != to) {
        double more = scaled[from][to] * (ratio - 1);
        scaled[from][to] += more;
        scaled[from][from] -= more;
      }
    }
    return scaled;
  }

  /**
   * Probability of being in the second state of a chain 1 to 2 to 3, with 1 to 3 too, after one
   * unit of time: {@code a/(a+b-c) * (exp(-c) - exp(-(a+b)))}, with the limit {@code a*exp(-c)}
   * where {@code a + b = c}. All rates at least 0.
   *
   * @param a rate from 1 to 2
   * @param b rate from 1 to 3
   * @param c rate from 2 to 3
   */
  public static double secondOfThree(double a, double b, double c) {
    double difference = a + b - c;
    double factor = difference == 0 ? 1 : -Math.expm1(-difference) / difference;
    return a * Math.exp(-c) * factor;
  }
}
