package weighhouse.cli;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Brief;
import weighhouse.audit.Finding;
import weighhouse.audit.Gate;
import weighhouse.audit.Lapsed;
import weighhouse.audit.Severity;
import weighhouse.report.text.Visible;
import weighhouse.workbook.UnreadableWorkbookException;

/** Audits workbooks and says by its exit status whether they may pass. */
@Command(
    name = "gate",
    description = "Audits workbooks and holds those with findings that are not accepted.",
    mixinStandardHelpOptions = true,
    footer = {
      "",
      "Exit status: 0 all pass; 1 one is held; 2 wrong use or a file that cannot be read; 3 less was",
      "analysed than the brief demands. The highest of 2, 3, 1, 0 in that order counts."
    })
final class GateCommand implements Callable<Integer> {
  private final Setting setting;
  private final Console console;

  @Parameters(
      arity = "1..*",
      paramLabel = "WORKBOOK",
      description = "Workbooks (.xlsx, .xlsm, .xls), or folders of them.")
  private List<Path> workbooks = new ArrayList<>();

  @Option(
      names = "--hold-at",
      paramLabel = "LEVEL",
      description =
          "Holds at findings of this level or graver: critical, major, minor or query. "
              + "The brief's level, or major, if not given.")
  private Severity holdAt;

  @Mixin private AuditInputs inputs;

  @Option(names = "--quiet", description = "Prints faults only.")
  private boolean quiet;

  GateCommand(Setting setting) {
    this.setting = setting;
    this.console = setting.console();
  }

  @Override
  public Integer call() throws Exception {
    Brief brief = inputs.brief();
    Map<String, Path> files = Workbooks.find(workbooks);
    Setting.Audits audits = setting.audits().apply(inputs.options(brief, 0, 1));
    int status = Status.PASS;
    List<String> found = new ArrayList<>();
    for (Path file : files.values()) {
      status = Status.worst(status, gate(audits, file, demands(brief), found));
    }
    Lapsed.of(brief, found, LocalDate.now(ZoneId.systemDefault()))
        .forEach(sentence -> console.complain(Visible.text(sentence)));
    return status;
  }

  private Brief.Demands demands(Brief brief) {
    Brief.Demands demands = brief.demands();
    return holdAt == null
        ? demands
        : new Brief.Demands(holdAt, demands.leastCoverage(), demands.leastReproduction());
  }

  private int gate(Setting.Audits audits, Path file, Brief.Demands demands, List<String> found)
      throws java.io.IOException {
    try {
      AuditResult result = audits.audit(file);
      Gate gate = Gate.of(result, demands);
      result.findings().forEach(finding -> found.add(finding.id()));
      if (!quiet) {
        say(result, gate);
      }
      if (gate.incomplete()) {
        return Status.INCOMPLETE;
      }
      return gate.held() ? Status.HELD : Status.PASS;
    } catch (UnreadableWorkbookException e) {
      console.complain(e.getMessage());
      return Status.UNUSABLE;
    }
  }

  private void say(AuditResult result, Gate gate) {
    String name = Visible.text(result.workbook().fileName());
    String word = gate.held() ? "HELD" : gate.incomplete() ? "INCOMPLETE" : "PASSED";
    Console.Paint paint = word.equals("PASSED") ? Console.Paint.GREEN : Console.Paint.RED;
    console.say(console.paint(paint, word) + "  " + name);
    gate.shortfalls().forEach(sentence -> console.say("  " + sentence));
    for (Finding finding : gate.holding()) {
      console.say(
          "  "
              + finding.severity().text()
              + "  "
              + Visible.text(result.workbook().show(finding.cells().get(0)))
              + "  "
              + Visible.text(finding.rule().title())
              + "  ["
              + Visible.text(finding.id())
              + "]");
    }
    if (gate.held()) {
      console.say("  Mend these, or accept them in a brief by the id in brackets.");
    }
  }
}
