package weighhouse.support;

import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;

/** Programs that some checks need: their tests skip where one is missing, and fail in CI. */
public final class Programs {
  private Programs() {}

  /** The program's path; skips the test, or fails it in CI, where it is not installed. */
  public static Path require(String program) {
    Optional<Path> found = find(program);
    if (System.getenv("WEIGHHOUSE_REQUIRE_PROGRAMS") != null) {
      assertTrue(found.isPresent(), program + " must be installed in CI");
    }
    assumeTrue(found.isPresent(), program + " is not installed here: check skipped");
    return found.orElseThrow();
  }

  private static Optional<Path> find(String program) {
    return Arrays.stream(System.getenv("PATH").split(java.io.File.pathSeparator))
        .map(folder -> Path.of(folder, program))
        .filter(Files::isExecutable)
        .findFirst();
  }
}
