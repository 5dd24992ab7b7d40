package weighhouse.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import weighhouse.audit.Brief;
import weighhouse.report.format.Format;

/** Audits workbooks and writes their reports. */
@Command(
    name = "audit",
    description = "Audits workbooks and writes a report of each.",
    mixinStandardHelpOptions = true,
    footer = {
      "",
      "Exit status: 0 audited; 2 wrong use or a file that cannot be read; 3 less was analysed than",
      "the brief demands."
    })
final class AuditCommand implements Callable<Integer> {
  private final Setting setting;

  @Parameters(
      arity = "1..*",
      paramLabel = "WORKBOOK",
      description = "Workbooks (.xlsx, .xlsm, .xls), or folders of them.")
  private List<Path> workbooks = new ArrayList<>();

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "Folder for the reports; the current one if not given.")
  private Path out = Path.of("");

  @Option(
      names = "--format",
      split = ",",
      paramLabel = "FORMAT",
      description =
          "Any of html, json, sarif, junit, csv, separated by commas; html,json if not given.")
  private List<Format> formats = List.of(Format.HTML, Format.JSON);

  @Mixin private AuditInputs inputs;

  @Option(
      names = "--draws",
      paramLabel = "N",
      description = "Runs the model on N probabilistic draws, as it is and corrected.")
  private int draws;

  @Option(names = "--seed", paramLabel = "N", description = "Seed of the draws; 1 if not given.")
  private long seed = 1;

  @Option(names = "--open", description = "Opens the report when it is written.")
  private boolean open;

  @Option(names = "--quiet", description = "Prints faults only.")
  private boolean quiet;

  AuditCommand(Setting setting) {
    this.setting = setting;
  }

  @Override
  public Integer call() throws Exception {
    Brief brief = inputs.brief();
    Map<String, Path> files = Workbooks.find(workbooks);
    Setting.Audits audits = setting.audits().apply(inputs.options(brief, draws, seed));
    AuditRun run = new AuditRun(audits, new Reports(out, formats), brief, setting.console(), quiet);
    int status = run.audit(files);
    if (open) {
      run.firstPage().ifPresent(page -> Opener.open(page, setting.console()));
    }
    return status;
  }
}
