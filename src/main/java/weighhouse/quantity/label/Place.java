package weighhouse.quantity.label;

/** Where a text stands towards the number that it may label. */
public enum Place {
  NAME("name", 0, 0),
  LEFT("label", 0, 0),
  RIGHT("label on the right", 0, 0),
  ABOVE("heading", 1, 0),
  DESCRIPTION("description", 1, 0),
  KEY("key", 1, 0),
  COMMENT("comment", 3, 0),
  /** A short text behind the number that tells its unit. */
  UNIT("unit", 4, 1),
  /** A heading with the title of another section between: its figures count, its kinds hardly. */
  FAR_HEADING("heading", 7, 2),
  SECTION("section title", 6, 1),
  SHEET("sheet name", 8, 2);

  private final String words;
  private final int remoteness;
  private final int discount;

  Place(String words, int remoteness, int discount) {
    this.words = words;
    this.remoteness = remoteness;
    this.discount = discount;
  }

  /** What people call a text there. */
  String words() {
    return words;
  }

  /** The more, the less it tells of this very number; orders texts of equal strength. */
  int remoteness() {
    return remoteness;
  }

  /** Steps by which words there are weaker. */
  int discount() {
    return discount;
  }
}
