package weighhouse.generator.sidecar;

/**
 * A labelled cell of a block. Templates call other items <code>{:name}</code>, the event's printed
 * figures <code>{value}</code>, <code>{lower}</code>, <code>{upper}</code>, <code>{se}</code>.
 *
 * @param right content of the twin: a formula after {@code =}, else a number
 * @param wrong content of the faulty workbook, or null where they are alike
 * @param root whether the cell belongs to the fault although it is alike in both
 */
record Item(String name, String label, String right, String wrong, boolean root) {
  static Item of(String name, String label, String right) {
    return new Item(name, label, right, null, false);
  }

  static Item of(String name, String label, String right, String wrong) {
    return new Item(name, label, right, wrong, true);
  }

  /** The same as a part of the fault. */
  Item asRoot() {
    return new Item(name, label, right, wrong, true);
  }

  String content(boolean faulty) {
    return faulty && wrong != null ? wrong : right;
  }
}
