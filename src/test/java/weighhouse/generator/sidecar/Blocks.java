package weighhouse.generator.sidecar;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** All blocks by the rule that they break. */
public final class Blocks {
  private Blocks() {}

  /** Blocks by rule. */
  public static Map<String, List<Block>> byRule() {
    return Stream.of(UncertaintyBlocks.all(), SynthesisBlocks.all())
        .flatMap(List::stream)
        .collect(Collectors.groupingBy(Block::rule, TreeMap::new, Collectors.toList()));
  }
}
