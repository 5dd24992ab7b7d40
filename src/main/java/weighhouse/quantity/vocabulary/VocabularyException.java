package weighhouse.quantity.vocabulary;

import java.util.List;

/** A vocabulary file with faults; all of them, each with file, line and column. */
public final class VocabularyException extends Exception {
  private static final long serialVersionUID = 1L;

  private final List<String> faults;

  VocabularyException(List<String> faults) {
    super(String.join("\n", faults));
    this.faults = List.copyOf(faults);
  }

  /** One line a fault: {@code vocabulary.yaml:12:5: no such kind: hazzard ratio}. */
  public List<String> faults() {
    return faults;
  }
}
