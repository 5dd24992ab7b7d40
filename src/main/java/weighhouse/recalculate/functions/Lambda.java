package weighhouse.recalculate.functions;

import java.util.List;
import weighhouse.recalculate.Value;

/** A function made by LAMBDA. */
public interface Lambda {
  Value call(List<Value> arguments);
}
