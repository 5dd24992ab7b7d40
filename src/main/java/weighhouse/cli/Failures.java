package weighhouse.cli;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import picocli.CommandLine;
import weighhouse.report.text.Visible;
import weighhouse.rules.RuleFaultsException;
import weighhouse.workbook.UnreadableWorkbookException;

/** One sentence for whatever went wrong; a stack trace only where it was asked for. */
final class Failures {
  /** What is said of a fault that no one foresaw. */
  static final String UNEXPECTED =
      "Weighhouse failed on this input; please report it with the file, if you may share it.";

  private Failures() {}

  static int wrongUse(CommandLine.ParameterException e, Console console) {
    console.complain(e.getMessage());
    String command = e.getCommandLine().getCommandSpec().qualifiedName();
    console.complain("Try: " + command + " --help");
    return Status.UNUSABLE;
  }

  static int failed(Exception e, Console console, boolean trace) {
    if (e instanceof UnusableException || e instanceof UnreadableWorkbookException) {
      console.complain(e.getMessage());
    } else if (e instanceof RuleFaultsException) {
      console.complain(e.getMessage());
      console.complain("Mend these rule files, then run: weighhouse rules --check DIR");
    } else if (e instanceof IOException io) {
      console.complain(sentence(io));
    } else {
      return unexpected(e, console, trace);
    }
    if (trace) {
      e.printStackTrace(console.err());
    }
    return Status.UNUSABLE;
  }

  static int unexpected(Throwable e, Console console, boolean trace) {
    console.complain(
        e instanceof OutOfMemoryError
            ? "Memory ran out: give Java more with -Xmx, or audit fewer workbooks at once."
            : UNEXPECTED);
    if (trace) {
      e.printStackTrace(console.err());
    }
    return Status.UNUSABLE;
  }

  /** What happened to a file, and what to do. */
  static String sentence(IOException e) {
    if (e instanceof AccessDeniedException denied) {
      return Visible.text(denied.getFile()) + " cannot be written or read: check its permissions.";
    }
    if (e instanceof FileSystemException file) {
      String reason = file.getReason() == null ? "not possible" : file.getReason();
      return Visible.text(file.getFile()) + ": " + reason + "; check the path and the disk.";
    }
    return "A file could not be read or written: " + Visible.text(e.getMessage());
  }
}
