package weighhouse.cli;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Function;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** All commands by name. Only the one that is called is built; help builds them all. */
final class Commands {
  private static final Map<String, Function<Setting, Object>> ALL = new LinkedHashMap<>();

  static {
    ALL.put("audit", AuditCommand::new);
    ALL.put("gate", GateCommand::new);
    ALL.put("correct", CorrectCommand::new);
    ALL.put("compare", CompareCommand::new);
    ALL.put("draft", DraftCommand::new);
    ALL.put("rules", RulesCommand::new);
  }

  private Commands() {}

  @Command(
      name = "weighhouse",
      description = "Audits the effect measures of health-economic model workbooks.",
      mixinStandardHelpOptions = true,
      versionProvider = Version.class,
      synopsisSubcommandLabel = "COMMAND")
  private static final class Root implements Runnable {
    @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

    @Override
    public void run() {
      throw new CommandLine.ParameterException(spec.commandLine(), "Give a command.");
    }
  }

  /** Reads the version from the jar. */
  static final class Version implements CommandLine.IVersionProvider {
    @Override
    public String[] getVersion() {
      String version = Commands.class.getPackage().getImplementationVersion();
      return new String[] {"weighhouse " + (version == null ? "(unpacked)" : version)};
    }
  }

  /** The command line for these arguments. */
  static CommandLine line(String[] args, Setting setting) {
    CommandLine root = new CommandLine(new Root());
    String called = args.length > 0 ? args[0] : "";
    ALL.forEach(
        (name, maker) -> {
          if (!ALL.containsKey(called) || name.equals(called)) {
            root.addSubcommand(name, maker.apply(setting));
          }
        });
    return root;
  }
}
