package weighhouse.cli;

import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import picocli.CommandLine.Option;
import weighhouse.audit.AuditOptions;
import weighhouse.audit.Brief;
import weighhouse.audit.brief.BriefFaultsException;
import weighhouse.audit.brief.BriefReader;
import weighhouse.report.text.Visible;

/** Options that every command takes that audits. */
final class AuditInputs {
  @Option(
      names = "--brief",
      paramLabel = "FILE",
      description = "What the reviewer declares, accepts and demands (see draft).")
  private Path brief;

  @Option(
      names = "--rules",
      paramLabel = "DIR",
      description = "A folder of the house's own rules, beside the shipped ones.")
  private List<Path> rules = new ArrayList<>();

  Brief brief() throws IOException, UnusableException {
    if (brief == null) {
      return Brief.NONE;
    }
    if (!Files.isRegularFile(brief)) {
      throw new UnusableException(
          Visible.text(brief.toString()) + " is no file: --brief takes a brief (see draft).");
    }
    try {
      return BriefReader.read(Files.readString(brief));
    } catch (CharacterCodingException e) {
      throw new UnusableException(Visible.text(brief.toString()) + " is no UTF-8 text.");
    } catch (BriefFaultsException e) {
      throw new UnusableException(faults(e.faults()));
    }
  }

  private String faults(List<BriefFaultsException.Fault> faults) {
    String file = Visible.text(brief.toString());
    return faults.stream()
        .map(f -> file + ":" + f.line() + ":" + f.column() + ": " + Visible.text(f.message()))
        .collect(Collectors.joining(System.lineSeparator()));
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
