package weighhouse.cli;

import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;

/**
 * Where a command writes to people.
 *
 * @param out standard output
 * @param err standard error
 * @param interactive whether a person watches
 * @param coloured whether colour may be used
 * @param plain whether only ASCII can be shown
 */
record Console(
    PrintWriter out, PrintWriter err, boolean interactive, boolean coloured, boolean plain) {

  /** The terminal that the process runs in. */
  static Console system() {
    boolean interactive = watched();
    String noColour = System.getenv("NO_COLOR");
    boolean coloured =
        interactive
            && (noColour == null || noColour.isEmpty())
            && !"dumb".equals(System.getenv("TERM"));
    Charset charset = interactive ? nativeCharset() : StandardCharsets.UTF_8;
    boolean plain = !charset.newEncoder().canEncode('−');
    return new Console(
        writer(System.out, charset), writer(System.err, charset), interactive, coloured, plain);
  }

  /** From Java 22 on there is a console even where nobody watches, which then says so itself. */
  @SuppressWarnings("SystemConsoleNull")
  private static boolean watched() {
    java.io.Console console = System.console();
    if (console == null || Runtime.version().feature() < 22) {
      return console != null;
    }
    try {
      return (boolean) java.io.Console.class.getMethod("isTerminal").invoke(console);
    } catch (ReflectiveOperationException e) {
      return false;
    }
  }

  private static Charset nativeCharset() {
    String name = System.getProperty("native.encoding");
    return name != null && Charset.isSupported(name)
        ? Charset.forName(name)
        : Charset.defaultCharset();
  }

  private static PrintWriter writer(OutputStream stream, Charset charset) {
    return new PrintWriter(new OutputStreamWriter(stream, charset), false);
  }

  /** A line for the user; texts of a workbook in it must have been made visible. */
  void say(String line) {
    out.println(shown(line));
  }

  /** A line about a fault, on standard error. */
  void complain(String line) {
    out.flush();
    err.println(shown(line));
    err.flush();
  }

  /** A passing remark that the next one replaces; only where a person watches. */
  void passing(String remark) {
    if (interactive) {
      String line = shown(remark);
      err.print("\r" + line + " ".repeat(Math.max(0, 78 - line.length())) + "\r");
      err.flush();
    }
  }

  void flush() {
    out.flush();
    err.flush();
  }

  /** The text in that colour, where colours are allowed. */
  String paint(Paint paint, String text) {
    return coloured ? "\u001B[" + paint.code + "m" + text + "\u001B[0m" : text;
  }

  CommandLine.Help.ColorScheme colours() {
    return CommandLine.Help.defaultColorScheme(
        coloured ? CommandLine.Help.Ansi.ON : CommandLine.Help.Ansi.OFF);
  }

  private String shown(String line) {
    return plain
        ? line.replace('−', '-')
            .replace('–', '-')
            .replace("…", "...")
            .replace("∞", "infinite")
            .replace('‹', '<')
            .replace('›', '>')
        : line;
  }

  /** Colours of a terminal. */
  enum Paint {
    RED("31;1"),
    YELLOW("33"),
    GREEN("32;1"),
    BLUE("34"),
    FAINT("2");

    private final String code;

    Paint(String code) {
      this.code = code;
    }
  }
}
