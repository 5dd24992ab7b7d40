package weighhouse.cli;

import java.io.PrintWriter;
import java.io.StringWriter;

/** A terminal that keeps what was written, and runs commands with audits that never took place. */
final class Terminal {
  final StringWriter out = new StringWriter();
  final StringWriter err = new StringWriter();
  private final Setting setting;

  Terminal(Setting.Audits audits) {
    Console console = new Console(new PrintWriter(out), new PrintWriter(err), false, false, false);
    setting = new Setting(console, options -> audits);
  }

  int run(String... args) {
    return Main.run(args, setting);
  }
}
