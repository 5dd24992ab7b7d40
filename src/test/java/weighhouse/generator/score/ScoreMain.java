package weighhouse.generator.score;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import weighhouse.generator.Manifest;

/**
 * {@code ScoreMain DIR [AUDITS] [--kept-apart | --open]}: DIR holds the manifest, AUDITS (DIR where
 * it is not given) the audits. Cases kept apart are for measuring; tune on the open ones.
 */
public final class ScoreMain {
  private ScoreMain() {}

  /** Runs it. */
  public static void main(String[] args) throws IOException {
    List<String> options = Arrays.stream(args).filter(arg -> arg.startsWith("--")).toList();
    List<String> folders = Arrays.stream(args).filter(arg -> !arg.startsWith("--")).toList();
    Path cases = Path.of(folders.get(0));
    Path audits = folders.size() > 1 ? Path.of(folders.get(1)) : cases;
    Score score =
        Scorer.score(
            Manifest.read(cases),
            audits,
            one -> options.isEmpty() || one.keptApart() == options.contains("--kept-apart"));
    System.out.print(score.text());
  }
}
