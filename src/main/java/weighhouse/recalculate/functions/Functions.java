package weighhouse.recalculate.functions;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;

/** The one table of worksheet functions: each topic enters its own. */
public final class Functions {
  private static final List<Consumer<Entries>> TOPICS =
      List.of(
          MathFunctions::enter,
          RoundingFunctions::enter,
          LogicFunctions::enter,
          InformationFunctions::enter,
          SumFunctions::enter,
          TextFunctions::enter,
          LookupFunctions::enter,
          ReferenceFunctions::enter,
          ConditionalSums::enter,
          Subtotals::enter,
          StatisticsFunctions::enter,
          RegressionFunctions::enter,
          Matrices::enter,
          Normal::enter,
          Distributions::enter,
          DiscreteDistributions::enter,
          FinanceFunctions::enter,
          DateFunctions::enter,
          ArrayFunctions::enter,
          LambdaFunctions::enter,
          RandomFunctions::enter);

  private static final Map<String, Function> TABLE = table();

  private Functions() {}

  private static Map<String, Function> table() {
    Entries entries = new Entries();
    TOPICS.forEach(topic -> topic.accept(entries));
    return entries.all();
  }

  /** The function of an upper-case name without vendor prefix, or null. */
  public static Function find(String name) {
    return TABLE.get(name);
  }

  /** Names of all functions. */
  public static Set<String> names() {
    return TABLE.keySet();
  }
}
