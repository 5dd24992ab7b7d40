package weighhouse.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Option;
import weighhouse.audit.AuditOptions;
import weighhouse.audit.Brief;
import weighhouse.report.text.Visible;

/** Options that every command takes that audits. */
final class AuditInputs {
  @Option(
      names = "--rules",
      paramLabel = "DIR",
      description = "A folder of the house's own rules, beside the shipped ones.")
  private List<Path> rules = new ArrayList<>();

  Brief brief() throws IOException, UnusableException {
    return Brief.NONE;
  }

  AuditOptions options(Brief read, int draws, long seed) throws UnusableException {
    for (Path folder : rules) {
      if (!Files.isDirectory(folder)) {
        throw new UnusableException(
            Visible.text(folder.toString()) + " is no folder: --rules takes a folder of rules.");
      }
    }
    return new AuditOptions(rules, read, draws, seed);
  }
}
