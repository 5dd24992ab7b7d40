package weighhouse.cli;

import java.util.Arrays;
import picocli.CommandLine;

/** Entry point of the command line. */
public final class Main {
  /** Prints the stack trace of a fault; for those who mend this program. */
  private static final String TRACE = "--trace";

  private Main() {}

  public static void main(String[] args) {
    System.exit(run(args, Setting.system()));
  }

  /** Runs a command and gives its exit status. */
  static int run(String[] args, Setting setting) {
    Console console = setting.console();
    boolean trace = Arrays.asList(args).contains(TRACE);
    String[] given = Arrays.stream(args).filter(arg -> !arg.equals(TRACE)).toArray(String[]::new);
    try {
      CommandLine line = Commands.line(given, setting);
      line.setOut(console.out());
      line.setErr(console.err());
      line.setColorScheme(console.colours());
      line.setCaseInsensitiveEnumValuesAllowed(true);
      line.setParameterExceptionHandler((e, all) -> Failures.wrongUse(e, console));
      line.setExecutionExceptionHandler((e, at, parsed) -> Failures.failed(e, console, trace));
      return line.execute(given);
    } catch (RuntimeException | Error e) {
      return Failures.unexpected(e, console, trace);
    } finally {
      console.flush();
    }
  }
}
