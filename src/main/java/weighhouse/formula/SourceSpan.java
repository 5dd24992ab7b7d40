package weighhouse.formula;

/**
 * Where a node stands in the formula's text: characters from {@code start} up to, not including,
 * {@code end}.
 */
public record SourceSpan(int start, int end) {}
