package weighhouse.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import weighhouse.report.text.Visible;

/** Opens a page with the desktop's own program. */
final class Opener {
  private Opener() {}

  static void open(Path page, Console console) {
    String file = page.toAbsolutePath().toString();
    try {
      new ProcessBuilder(command(file))
          .redirectErrorStream(true)
          .redirectOutput(ProcessBuilder.Redirect.DISCARD)
          .start();
    } catch (IOException e) {
      console.complain("No program here opens pages; open it yourself: " + Visible.text(file));
    }
  }

  private static List<String> command(String file) {
    String system = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
    if (system.startsWith("windows")) {
      return List.of("rundll32", "url.dll,FileProtocolHandler", file);
    }
    return system.startsWith("mac") ? List.of("open", file) : List.of("xdg-open", file);
  }
}
