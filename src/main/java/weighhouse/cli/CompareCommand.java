package weighhouse.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import weighhouse.report.compare.Comparison;
import weighhouse.report.file.WholeFile;
import weighhouse.report.html.ComparisonPage;
import weighhouse.report.json.ComparisonJson;
import weighhouse.report.text.Visible;

/** Compares the audits of two versions of a workbook. */
@Command(
    name = "compare",
    description = "Audits two versions of a workbook and writes what changed between them.",
    mixinStandardHelpOptions = true)
final class CompareCommand implements Callable<Integer> {
  private final Setting setting;

  @Parameters(index = "0", paramLabel = "BEFORE", description = "The earlier workbook.")
  private Path before;

  @Parameters(index = "1", paramLabel = "AFTER", description = "The later workbook.")
  private Path after;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "Folder for the pages; the current one if not given.")
  private Path out = Path.of("");

  @Option(names = "--open", description = "Opens the page when it is written.")
  private boolean open;

  @Mixin private AuditInputs inputs;

  CompareCommand(Setting setting) {
    this.setting = setting;
  }

  @Override
  public Integer call() throws Exception {
    Setting.Audits audits = setting.audits().apply(inputs.options(inputs.brief(), 0, 1));
    Comparison comparison = Comparison.of(audits.audit(before), audits.audit(after));
    Path page = out.resolve(after.getFileName() + ".compared.html");
    WholeFile.write(page, stream -> ComparisonPage.write(comparison, stream));
    WholeFile.write(
        out.resolve(after.getFileName() + ".compared.json"),
        stream -> ComparisonJson.write(comparison, stream));
    setting
        .console()
        .say(
            comparison.resolved().size()
                + " findings resolved, "
                + comparison.added().size()
                + " new, "
                + comparison.remaining().size()
                + " still there.");
    setting.console().say("Comparison: " + Visible.text(page.toString()));
    if (open) {
      Opener.open(page, setting.console());
    }
    return Status.PASS;
  }
}
