package weighhouse.generator.sidecar;

import java.util.List;

/**
 * A block of items; the last item is the effect that the model uses.
 *
 * @param rule the rule that its fault breaks
 * @param note the disguise
 * @param title what stands above it
 */
public record Block(String rule, String note, String title, List<Item> items) {
  static Block of(String rule, String note, String title, Item... items) {
    return new Block(rule, note, title, List.of(items));
  }

  /** Whether it starts from the effect on the input sheet rather than replacing it. */
  public boolean usesInput() {
    return items.stream().anyMatch(item -> item.right().contains("{in}"));
  }
}
