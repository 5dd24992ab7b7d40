package weighhouse.cli;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import weighhouse.audit.AuditResult;
import weighhouse.audit.brief.BriefDraft;
import weighhouse.report.file.WholeFile;
import weighhouse.report.text.Visible;

/** Drafts a brief from what a workbook tells. */
@Command(
    name = "draft",
    description = "Writes a brief of what was inferred from a workbook, for you to correct.",
    mixinStandardHelpOptions = true)
final class DraftCommand implements Callable<Integer> {
  private final Setting setting;

  @Parameters(paramLabel = "WORKBOOK", description = "The workbook; it is only read.")
  private Path workbook;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description = "The file to write; the workbook's name with .brief.yaml, if not given.")
  private Path out;

  @Option(names = "--force", description = "Replaces a brief that is there already.")
  private boolean force;

  @Mixin private AuditInputs inputs;

  DraftCommand(Setting setting) {
    this.setting = setting;
  }

  @Override
  public Integer call() throws Exception {
    Path file = out != null ? out : Path.of(workbook.getFileName() + ".brief.yaml");
    String shown = Visible.text(file.toString());
    if (Files.exists(file) && !force) {
      throw new UnusableException(
          shown + " is there already: give another name with --out, or --force to replace it.");
    }
    AuditResult result =
        setting.audits().apply(inputs.options(inputs.brief(), 0, 1)).audit(workbook);
    WholeFile.write(file, stream -> stream.write(BriefDraft.of(result).getBytes(UTF_8)));
    setting.console().say("Brief: " + shown);
    setting.console().say("Correct it, then audit with --brief " + shown);
    return Status.PASS;
  }
}
