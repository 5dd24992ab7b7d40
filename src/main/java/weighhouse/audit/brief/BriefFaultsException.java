package weighhouse.audit.brief;

import java.util.List;

/** A brief that cannot be used; every fault of it, in the order of its lines. */
public final class BriefFaultsException extends Exception {
  private static final long serialVersionUID = 1L;

  @SuppressWarnings("serial") // never serialised
  private final List<Fault> faults;

  /** A fault at a line and column, both counted from 1. */
  public record Fault(int line, int column, String message) {}

  BriefFaultsException(List<Fault> faults) {
    super(faults.size() + " faults");
    this.faults = List.copyOf(faults);
  }

  public List<Fault> faults() {
    return faults;
  }
}
