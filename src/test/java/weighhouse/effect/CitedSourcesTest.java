package weighhouse.effect;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Every source that the Javadoc names by key is listed among the sources. */
class CitedSourcesTest {
  private static final Pattern KEY =
      Pattern.compile("\\b(?:[a-z]+-)+(?:19|20)\\d\\d(?:-[a-z]+)?\\b|\\btsd-\\d+\\b");

  @Test
  void everyKeyHasItsCitation() throws IOException {
    String sources = Files.readString(Path.of("rules/sources.yaml"));
    Set<String> cited;
    try (Stream<Path> files = Files.walk(Path.of("src/main/java/weighhouse/effect"))) {
      cited =
          files
              .filter(Files::isRegularFile)
              .flatMap(file -> KEY.matcher(read(file)).results())
              .map(MatchResult::group)
              .collect(Collectors.toCollection(TreeSet::new));
    }
    assertTrue(cited.contains("zhang-yu-1998"), cited::toString);
    cited.removeIf(key -> sources.contains("\n" + key + ":"));
    assertEquals(Set.of(), cited);
  }

  private static String read(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
