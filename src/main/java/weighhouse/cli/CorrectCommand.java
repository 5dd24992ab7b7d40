package weighhouse.cli;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.report.copy.CorrectedCopy;
import weighhouse.report.copy.edit.EditMaker;
import weighhouse.report.copy.edit.Edits;
import weighhouse.report.file.WholeFile;
import weighhouse.report.text.Visible;
import weighhouse.workbook.CellAddress;

/** Writes a corrected, annotated copy for the author. */
@Command(
    name = "correct",
    description = "Writes a copy of a workbook with the findings corrected, commented and listed.",
    mixinStandardHelpOptions = true)
final class CorrectCommand implements Callable<Integer> {
  private final Setting setting;

  @Parameters(paramLabel = "WORKBOOK", description = "The workbook; it is only read.")
  private Path workbook;

  @Option(names = "--out", required = true, paramLabel = "COPY", description = "The file to write.")
  private Path out;

  @Option(
      names = "--only",
      arity = "1..*",
      split = ",",
      paramLabel = "ID",
      description = "Corrects these findings only; all that are not accepted, if not given.")
  private Set<String> only = new LinkedHashSet<>();

  @Option(
      names = "--comments-only",
      description = "Leaves the formulas, adds comments and the list.")
  private boolean commentsOnly;

  @Mixin private AuditInputs inputs;

  CorrectCommand(Setting setting) {
    this.setting = setting;
  }

  @Override
  public Integer call() throws Exception {
    refuseSameFile();
    AuditResult result =
        setting.audits().apply(inputs.options(inputs.brief(), 0, 1)).audit(workbook);
    refuseUnknown(result);
    Edits edits = EditMaker.make(result, only, commentsOnly, Map.of());
    byte[] file = Files.readAllBytes(workbook);
    Set<CellAddress> written = new HashSet<>();
    WholeFile.write(out, stream -> written.addAll(CorrectedCopy.write(file, edits, stream)));
    say(edits, written);
    return Status.PASS;
  }

  private void refuseSameFile() throws Exception {
    if (Files.exists(out) && Files.isSameFile(workbook, out)) {
      throw new UnusableException(
          "The copy would replace the workbook itself: give another name with --out.");
    }
  }

  private void refuseUnknown(AuditResult result) throws UnusableException {
    Set<String> known = result.findings().stream().map(Finding::id).collect(Collectors.toSet());
    Set<String> unknown = new LinkedHashSet<>(only);
    unknown.removeAll(known);
    if (!unknown.isEmpty()) {
      throw new UnusableException(
          "No finding has the id "
              + Visible.text(String.join(", ", unknown))
              + ": take ids from the report of this workbook.");
    }
  }

  private void say(Edits edits, Set<CellAddress> written) {
    Console console = setting.console();
    console.say(
        written.size()
            + " formulas corrected, "
            + edits.comments().size()
            + " cells commented: "
            + Visible.text(out.toString()));
    int left = edits.formulas().size() - written.size();
    if (left > 0) {
      console.say(left + " cells were left: they are part of an array formula or a data table.");
    }
    console.say("Findings are listed on the sheet \"" + Edits.REVIEW_SHEET + "\".");
  }
}
