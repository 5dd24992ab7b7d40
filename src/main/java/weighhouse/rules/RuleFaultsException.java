package weighhouse.rules;

import java.util.List;
import java.util.stream.Collectors;
import weighhouse.rules.file.Fault;

/** Rule files that cannot be used, with everything that is wrong with them. */
public class RuleFaultsException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<Fault> faults;

  public RuleFaultsException(List<Fault> faults) {
    super(faults.stream().map(Fault::toString).collect(Collectors.joining("\n")));
    this.faults = List.copyOf(faults);
  }

  public List<Fault> faults() {
    return faults;
  }
}
